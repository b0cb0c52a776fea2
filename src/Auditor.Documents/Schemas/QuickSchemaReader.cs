using System.Text.Json;
using System.Text.RegularExpressions;

namespace Auditor.Documents;

/// <summary>Makes a schema ready for quick looks. What a reference refers to is made ready once.</summary>
/// <param name="root">The whole schema, which <see cref="SchemaKeywords"/> has let pass.</param>
internal sealed class QuickSchemaReader(JsonElement root)
{
    private readonly Dictionary<string, QuickSchema> _references = new(StringComparer.Ordinal);

    /// <summary>Makes the whole schema ready.</summary>
    /// <exception cref="InvalidDataException">It asks for something that means nothing, or refers to nothing.</exception>
    public QuickSchema Read() => Read(root);

    private QuickSchema Read(JsonElement json)
    {
        var schema = new QuickSchema();
        if (json.TryGetProperty("$ref", out var reference))
        {
            schema.Reference = Refer(reference.GetString()!);
            return schema;
        }

        foreach (var keyword in json.EnumerateObject())
        {
            Take(schema, keyword.Name, keyword.Value);
        }

        schema.Quantity = QuantityRule.From(name => json.TryGetProperty(name, out var value) ? (true, SchemaKeywords.ValueOf(value)) : (false, null));
        return schema;
    }

    private QuickSchema Refer(string path)
    {
        if (_references.TryGetValue(path, out var known))
        {
            return known;
        }

        var target = root;
        foreach (var key in path.Split('/').Skip(1))
        {
            if (target.ValueKind != JsonValueKind.Object || !target.TryGetProperty(key.Replace("~1", "/", StringComparison.Ordinal).Replace("~0", "~", StringComparison.Ordinal), out target))
            {
                throw new InvalidDataException($"`$ref` refers to `{path}`, which is not there");
            }
        }

        var schema = new QuickSchema();
        _references.Add(path, schema);
        schema.Reference = Read(target);
        return schema;
    }

    private void Take(QuickSchema schema, string keyword, JsonElement value)
    {
        switch (keyword)
        {
            case "type":
                schema.Types = value.ValueKind == JsonValueKind.Array
                    ? value.EnumerateArray().Aggregate(NodeTypes.Any, (types, name) => types | TypeOf(name.GetString()!))
                    : TypeOf(value.GetString()!);
                break;
            case "enum":
                schema.Words = [.. value.EnumerateArray().Select(WordOf)];
                break;
            case "pattern":
                schema.Pattern = new Regex(value.GetString()!, RegexOptions.None, Regex.InfiniteMatchTimeout);
                break;
            case "format":
                schema.IsDate = true;
                break;
            case "uniqueItems":
                schema.HasUniqueItems = value.GetBoolean();
                break;
            case "required":
                schema.Required = [.. value.EnumerateArray().Select(key => key.GetString()!)];
                break;
            case "items":
                schema.Items = Read(value);
                break;
            case "oneOf":
                schema.OneOf.AddRange(value.EnumerateArray().Select(Read));
                break;
            case "properties":
                TakeProperties(schema, value);
                break;
            case "patternProperties":
                schema.PatternProperties.AddRange(value.EnumerateObject().Select(property => (new Regex(property.Name, RegexOptions.None, Regex.InfiniteMatchTimeout), Read(property.Value))));
                break;
            case "additionalProperties" when value.ValueKind == JsonValueKind.Object:
                schema.Others = Read(value);
                break;
            case "additionalProperties":
                schema.RefusesOthers = !value.GetBoolean();
                break;
            default:
                TakeLimit(schema, keyword, value);
                break;
        }
    }

    private void TakeProperties(QuickSchema schema, JsonElement properties)
    {
        foreach (var property in properties.EnumerateObject())
        {
            schema.Properties.Add(property.Name, Read(property.Value));
        }
    }

    private static void TakeLimit(QuickSchema schema, string keyword, JsonElement value)
    {
        switch (keyword)
        {
            case "minimum":
                schema.Limits = schema.Limits with { Least = value.GetDouble() };
                break;
            case "exclusiveMinimum":
                schema.Limits = schema.Limits with { Above = value.GetDouble() };
                break;
            case "maximum":
                schema.Limits = schema.Limits with { Most = value.GetDouble() };
                break;
            case "exclusiveMaximum":
                schema.Limits = schema.Limits with { Below = value.GetDouble() };
                break;
            case "minItems" or "minProperties":
                schema.Count = schema.Count with { Least = value.GetDouble() };
                break;
            case "maxItems" or "maxProperties":
                schema.Count = schema.Count with { Most = value.GetDouble() };
                break;
            case "minLength" when value.GetDouble() <= 1:
                schema.IsNotEmpty = value.GetDouble() > 0;
                break;
            default:
                schema.IsUnsure |= keyword is "anyOf" or "allOf" or "not" or "multipleOf" or "minLength" or "maxLength";
                break;
        }
    }

    private static NodeTypes TypeOf(string name) => name switch
    {
        "object" => NodeTypes.Object,
        "array" => NodeTypes.Array,
        "string" => NodeTypes.String,
        "number" => NodeTypes.Number,
        "integer" => NodeTypes.Integer,
        "boolean" => NodeTypes.Boolean,
        "null" => NodeTypes.Null,
        _ => throw new InvalidDataException($"`{name}` is not a type"),
    };

    private static object WordOf(JsonElement word) => word.ValueKind switch
    {
        JsonValueKind.String => word.GetString()!,
        JsonValueKind.True => true,
        JsonValueKind.False => false,
        JsonValueKind.Number => word.GetDouble(),
        _ => DBNull.Value,
    };
}
