using Newtonsoft.Json.Linq;

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
    public static void Check(JToken schema)
    {
        if (schema is not JObject keywords)
        {
            return;
        }

        var unsupported = Unchecked.FirstOrDefault(keywords.ContainsKey);
        if (unsupported is not null)
        {
            throw Fault(keywords, $"the keyword `{unsupported}` is not supported");
        }

        if (keywords["items"] is JArray)
        {
            throw Fault(keywords, "`items` takes one schema for all items");
        }

        if (keywords["format"] is JValue format && format.Value as string != "date")
        {
            throw Fault(keywords, "`format` knows `date` only");
        }

        if (keywords["enum"] is JArray words && words.Any(word => word is JContainer))
        {
            throw Fault(keywords, "`enum` lists single values only");
        }

        if (keywords["$ref"] is JValue { Type: JTokenType.String } reference && !reference.Value<string>()!.StartsWith('#'))
        {
            throw Fault(keywords, "`$ref` refers to the same file only");
        }

        try
        {
            QuantityRule.From(keywords.Properties().ToDictionary(property => property.Name, property => (property.Value as JValue)?.Value));
        }
        catch (InvalidDataException fault)
        {
            throw Fault(keywords, fault.Message);
        }

        foreach (var child in Children(keywords))
        {
            Check(child);
        }
    }

    private static IEnumerable<JToken> Children(JObject schema) => schema.Properties().SelectMany(keyword => keyword.Name switch
    {
        "properties" or "patternProperties" or "definitions" or "$defs" => keyword.Value.Children<JProperty>().Select(property => property.Value),
        "oneOf" or "anyOf" or "allOf" => keyword.Value.Children(),
        "items" or "additionalProperties" or "not" => [keyword.Value],
        _ => Enumerable.Empty<JToken>(),
    });

    private static InvalidDataException Fault(JObject schema, string message) => new($"{(schema.Path.Length == 0 ? "$" : schema.Path)}: {message}");
}
