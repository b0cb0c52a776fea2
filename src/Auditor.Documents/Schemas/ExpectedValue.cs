using Newtonsoft.Json.Linq;
using NJsonSchema;

namespace Auditor.Documents;

/// <summary>Says in words what a schema wants.</summary>
internal static class ExpectedValue
{
    private const int MostWords = 20;
    private const int DeepestChoice = 4;

    private static readonly (JsonObjectType Type, string Noun)[] Nouns =
    [
        (JsonObjectType.Object, "a mapping of keys"),
        (JsonObjectType.Array, "a list"),
        (JsonObjectType.String, "a text"),
        (JsonObjectType.Number, "a number"),
        (JsonObjectType.Integer, "a whole number"),
        (JsonObjectType.Boolean, "`true` or `false`"),
        (JsonObjectType.Null, "nothing"),
    ];

    /// <summary>What a schema wants, as nouns: "a length such as `25 m` or a mapping of keys".</summary>
    public static string Of(JsonSchema schema)
        => string.Join(" or ", Parts(schema, DeepestChoice).Distinct(StringComparer.Ordinal).DefaultIfEmpty("another value"));

    /// <summary>What a value is, as a noun.</summary>
    public static string NounOf(JToken token) => token.Type switch
    {
        JTokenType.Object => "a mapping of keys",
        JTokenType.Array => "a list",
        JTokenType.Integer => "a number",
        JTokenType.Float => double.IsInteger(token.Value<double>()) ? "a number" : "a number with decimals",
        JTokenType.Boolean => "a `true` or `false`",
        JTokenType.Null => "nothing",
        _ => "a text",
    };

    /// <summary>How to add a missing key: with an example value where the schema gives one away.</summary>
    public static string ToAdd(string key, JsonSchema? property)
    {
        if (property is null)
        {
            return $"add `{key}`";
        }

        var schema = property.ActualSchema;
        var text = KindOf(schema) is { } kind
            ? $"add `{key}`, for example `{key}: {kind.Example}`"
            : schema.Enumeration.Count > 0 ? $"add `{key}` with {(schema.Enumeration.Count == 1 ? "the value" : "one of:")} {List(Words(schema))}" : $"add `{key}`";
        return (property.Description ?? schema.Description) is { } description ? $"{text} ({Sentence(description)})" : text;
    }

    /// <summary>The words that a schema lists.</summary>
    public static IReadOnlyList<string> Words(JsonSchema schema)
        => [.. schema.Enumeration.Select(word => word switch { null => "null", bool flag => flag ? "true" : "false", _ => word.ToString()! })];

    /// <summary>Lists words for people, the first twenty of many.</summary>
    public static string List(IReadOnlyList<string> words) => words.Count <= MostWords
        ? string.Join(", ", words)
        : $"{string.Join(", ", words.Take(MostWords))} and {words.Count - MostWords} more";

    /// <summary>The first sentence of a description, without its full stop and starting small where it starts with an ordinary word.</summary>
    public static string Sentence(string description)
    {
        var end = description.IndexOf(". ", StringComparison.Ordinal);
        var first = (end < 0 ? description : description[..end]).TrimEnd('.', ' ');
        return first.Length > 1 && (char.IsLower(first[1]) || first[1] == ' ') ? char.ToLowerInvariant(first[0]) + first[1..] : first;
    }

    private static IEnumerable<string> Parts(JsonSchema written, int depth)
    {
        var schema = written.ActualSchema;
        if (KindOf(schema) is { } kind)
        {
            return [$"{kind.Noun} such as `{kind.Example}`"];
        }

        if (schema.Enumeration.Count > 0)
        {
            return [schema.Enumeration.Count == 1 ? $"`{Words(schema)[0]}`" : $"one of the words {List(Words(schema))}"];
        }

        var choices = schema.OneOf.Concat(schema.AnyOf).ToList();
        return schema.Type != JsonObjectType.None || choices.Count == 0 || depth == 0
            ? Nouns.Where(noun => schema.Type.HasFlag(noun.Type)).Select(noun => noun.Noun)
            : choices.SelectMany(choice => Parts(choice, depth - 1));
    }

    private static QuantityKind? KindOf(JsonSchema schema)
        => schema.ExtensionData is { } keywords && keywords.TryGetValue("quantity", out var name) ? QuantityKind.Find(name as string ?? "") : null;
}
