namespace Auditor.Documents;

/// <summary>Short ways to read a mapping whose shape a schema has already vouched for.</summary>
public static class NodeReading
{
    /// <summary>The scalar under a key, or null.</summary>
    public static ScalarNode? Scalar(this MappingNode mapping, string key) => mapping.Find(key) as ScalarNode;

    /// <summary>The text under a key, or null.</summary>
    public static string? Text(this MappingNode mapping, string key) => mapping.Scalar(key)?.Text;

    /// <summary>The mapping under a key, or null.</summary>
    public static MappingNode? Mapping(this MappingNode mapping, string key) => mapping.Find(key) as MappingNode;

    /// <summary>The items of the list under a key; a single value counts as a list of one; empty when the key is absent.</summary>
    public static IReadOnlyList<Node> Items(this MappingNode mapping, string key) => mapping.Find(key) switch
    {
        SequenceNode sequence => sequence.Items,
        null => [],
        var single => [single],
    };

    /// <summary>The texts of the list under a key.</summary>
    public static IReadOnlyList<string> Texts(this MappingNode mapping, string key) =>
        [.. mapping.Items(key).OfType<ScalarNode>().Select(scalar => scalar.Text)];

    /// <summary>The mappings of the list under a key.</summary>
    public static IEnumerable<MappingNode> Mappings(this MappingNode mapping, string key) => mapping.Items(key).OfType<MappingNode>();
}
