using Newtonsoft.Json.Linq;

namespace Auditor.Documents;

/// <summary>Gives a tree the form that the schema validator takes, each token keeping the node that it was made from.</summary>
internal static class NodeTokens
{
    private const double LargestWhole = 9e18;

    public static JToken From(Node node)
    {
        JToken token = node switch
        {
            MappingNode mapping => new JObject(mapping.Entries.Select(entry => new JProperty(entry.Key.Value, From(entry.Value)))),
            SequenceNode sequence => new UnindexedArray(sequence.Items.Select(From)),
            ScalarNode { Kind: ScalarKind.Number } number => Number(number.Number),
            ScalarNode { Kind: ScalarKind.Flag } flag => new JValue(flag.Flag),
            ScalarNode { Kind: ScalarKind.Text } text => JValue.CreateString(text.Text),
            _ => JValue.CreateNull(),
        };
        token.AddAnnotation(node);
        return token;
    }

    /// <summary>Returns the node that a token was made from.</summary>
    public static Node NodeOf(JToken token) => token.Annotation<Node>() ?? throw new ArgumentException("the token was made from no node", nameof(token));

    /// <summary>
    /// By the standard a number is whole by its value, however it is written and however large it is. Whole numbers too large for the
    /// validator become the largest that it takes; no limit of a schema lies beyond.
    /// </summary>
    private static JValue Number(double number) => double.IsInteger(number)
        ? new JValue((long)Math.Clamp(number, -LargestWhole, LargestWhole))
        : new JValue(number);

    /// <summary>
    /// An array that does not look for the index of an item when the path of the item is asked for. The validator asks for the path
    /// of every item that has alternatives, and looking for it would take a time that grows with the square of the length.
    /// </summary>
    private sealed class UnindexedArray(IEnumerable<JToken> items) : JArray(items), IList<JToken>
    {
        int IList<JToken>.IndexOf(JToken item) => 0;
    }
}
