using Newtonsoft.Json.Linq;

namespace Auditor.Documents;

/// <summary>Where to mark an error of the validator, and what to call the place.</summary>
internal static class SchemaPlaces
{
    /// <summary>The value itself where it is a word on a line; the key of a list, of a mapping, and of a value that is not there.</summary>
    public static SourceSpan SpanOf(JToken token)
    {
        if (token is JProperty property)
        {
            return KeySpanOf(property);
        }

        var node = NodeTokens.NodeOf(token);
        if (token.Parent is JProperty parent && (token is JContainer || node.Span.Length == 0))
        {
            return KeySpanOf(parent);
        }

        return node is MappingNode { Entries: [var first, ..] } ? first.Key.Span : node.Span;
    }

    /// <summary>What to call a value: by its key, as an item of a list, or as the file.</summary>
    public static string NameOf(JToken token) => token.Parent switch
    {
        JProperty property => ProblemText.Quote(property.Name),
        JArray { Parent: JProperty property } => $"an item of {ProblemText.Quote(property.Name)}",
        JArray => "an item",
        _ => "the file",
    };

    private static SourceSpan KeySpanOf(JProperty property)
        => ((MappingNode)NodeTokens.NodeOf(property.Parent!)).Entry(property.Name)!.Key.Span;
}
