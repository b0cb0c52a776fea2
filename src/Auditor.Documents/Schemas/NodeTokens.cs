using Newtonsoft.Json.Linq;

namespace Auditor.Documents;

/// <summary>Gives a tree the form that the schema validator takes, each token keeping the node that it was made from.</summary>
internal static class NodeTokens
{
    /// <summary>Whole numbers up to this size are exact in a double.</summary>
    private const double ExactWhole = 9007199254740992;

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

    private static JValue Number(double number)
        => Math.Abs(number) <= ExactWhole && double.IsInteger(number) ? new JValue((long)number) : new JValue(number);

    /// <summary>
    /// An array that does not look for the index of an item when the path of the item is asked for. The validator asks for the path
    /// of every item that has alternatives, and looking for it would take a time that grows with the square of the length.
    /// </summary>
    private sealed class UnindexedArray(IEnumerable<JToken> items) : JArray(items), IList<JToken>
    {
        int IList<JToken>.IndexOf(JToken item) => 0;
    }
}
