using System.Text;
using Auditor.Testing;

namespace Auditor.Documents.Tests;

public class PreparedNodeTests
{
    [Fact]
    public void Every_shipped_rule_file_comes_back_node_by_node_with_its_places()
    {
        var files = Directory.GetFiles(Repository.PathOf("rules"), "*.yaml", SearchOption.AllDirectories);

        Assert.True(files.Length > 500);
        Assert.All(files, file => AssertComesBack(File.ReadAllText(file)));
    }

    [Theory]
    [InlineData("a")]
    [InlineData("'it''s': \"q\\u0041\"\nb: [~, null, true, False, 0x10, 1e3, .5, '1']\n")]
    [InlineData("a: |\n  two\n  lines\nb: >-\n  folded\n  text\nc: {}\nd: []\n")]
    [InlineData("größe: 2.5 mm²\n\"\\x41\": ∆\n")]
    public void Texts_of_every_style_come_back(string text) => AssertComesBack(text);

    private static void AssertComesBack(string text)
    {
        var source = new SourceText("a.yaml", text);
        var node = YamlReader.Read(source, new Problems())!;
        using var bytes = new MemoryStream();
        using (var output = new BinaryWriter(bytes, Encoding.UTF8, leaveOpen: true))
        {
            new NodeWriter(output).Write(node);
        }

        AssertSame(node, new NodeReader(source, bytes.ToArray()).Read());
    }

    private static void AssertSame(Node expected, Node actual)
    {
        Assert.Equal(expected.Span, actual.Span);
        switch (expected, actual)
        {
            case (MappingNode one, MappingNode other):
                Assert.Equal(one.Entries.Select(entry => (entry.Key.Value, entry.Key.Span)), other.Entries.Select(entry => (entry.Key.Value, entry.Key.Span)));
                Assert.All(one.Entries.Zip(other.Entries), pair => AssertSame(pair.First.Value, pair.Second.Value));
                break;
            case (SequenceNode one, SequenceNode other):
                Assert.Equal(one.Items.Count, other.Items.Count);
                Assert.All(one.Items.Zip(other.Items), pair => AssertSame(pair.First, pair.Second));
                break;
            default:
                var (scalar, again) = ((ScalarNode)expected, Assert.IsType<ScalarNode>(actual));
                Assert.Equal((scalar.Text, scalar.Kind), (again.Text, again.Kind));
                Assert.True(scalar.Kind != ScalarKind.Number || scalar.Number.Equals(again.Number));
                break;
        }
    }
}
