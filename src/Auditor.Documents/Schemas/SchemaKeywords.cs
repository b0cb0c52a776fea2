using System.Text.Json;

namespace Auditor.Documents;

/// <summary>Refuses schemas that ask for what the validator would silently not check.</summary>
internal static class SchemaKeywords
{
    private static readonly string[] Unchecked =
    [
        "const", "if", "then", "else", "propertyNames", "dependencies", "dependentRequired", "dependentSchemas", "contains", "prefixItems",
        "unevaluatedProperties", "unevaluatedItems", "$dynamicRef", "$recursiveRef",
    ];

    /// <summary>Checks a schema and all schemas in it.</summary>
    /// <exception cref="InvalidDataException">A keyword is not supported, or has a value that means nothing.</exception>
    public static void Check(JsonElement schema) => Check(schema, "");

    private static void Check(JsonElement schema, string path)
    {
        if (schema.ValueKind != JsonValueKind.Object)
        {
            return;
        }

        if (Fault(schema) is { } fault)
        {
            throw new InvalidDataException($"{(path.Length == 0 ? "$" : path)}: {fault}");
        }

        foreach (var (child, step) in Children(schema))
        {
            Check(child, path.Length == 0 ? step : $"{path}.{step}");
        }
    }

    private static string? Fault(JsonElement schema)
    {
        if (Unchecked.FirstOrDefault(keyword => schema.TryGetProperty(keyword, out _)) is { } unsupported)
        {
            return $"the keyword `{unsupported}` is not supported";
        }

        if (schema.TryGetProperty("items", out var items) && items.ValueKind == JsonValueKind.Array)
        {
            return "`items` takes one schema for all items";
        }

        if (schema.TryGetProperty("format", out var format) && format.ValueKind == JsonValueKind.String && format.GetString() != "date")
        {
            return "`format` knows `date` only";
        }

        if (schema.TryGetProperty("enum", out var words) && words.ValueKind == JsonValueKind.Array
            && words.EnumerateArray().Any(word => word.ValueKind is JsonValueKind.Object or JsonValueKind.Array))
        {
            return "`enum` lists single values only";
        }

        if (schema.TryGetProperty("$ref", out var reference) && reference.ValueKind == JsonValueKind.String && !reference.GetString()!.StartsWith('#'))
        {
            return "`$ref` refers to the same file only";
        }

        try
        {
            QuantityRule.From(keyword => schema.TryGetProperty(keyword, out var value) ? (true, ValueOf(value)) : (false, null));
            return null;
        }
        catch (InvalidDataException fault)
        {
            return fault.Message;
        }
    }

    /// <summary>The value of a keyword as the quantity rule takes it: a text, a flag, or nothing for all else.</summary>
    public static object? ValueOf(JsonElement value) => value.ValueKind switch
    {
        JsonValueKind.String => value.GetString(),
        JsonValueKind.True => true,
        JsonValueKind.False => false,
        _ => null,
    };

    private static IEnumerable<(JsonElement Schema, string Step)> Children(JsonElement schema) => schema.EnumerateObject().SelectMany(keyword => (keyword.Name, keyword.Value.ValueKind) switch
    {
        ("properties" or "patternProperties" or "definitions" or "$defs", JsonValueKind.Object) =>
            keyword.Value.EnumerateObject().Select(property => (property.Value, $"{keyword.Name}.{property.Name}")),
        ("oneOf" or "anyOf" or "allOf", JsonValueKind.Array) => keyword.Value.EnumerateArray().Select((choice, index) => (choice, $"{keyword.Name}[{index}]")),
        ("items" or "additionalProperties" or "not", _) => [(keyword.Value, keyword.Name)],
        _ => Enumerable.Empty<(JsonElement, string)>(),
    });
}
