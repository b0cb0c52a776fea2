namespace Auditor.Documents.Tests;

/// <summary>Short ways to read a text in a test.</summary>
internal static class Yaml
{
    public static Node? Read(string text, out Problems problems)
    {
        problems = new Problems();
        return YamlReader.Read(new SourceText("test.yaml", text), problems);
    }

    /// <summary>Reads a text that must be without problems.</summary>
    public static Node Read(string text)
    {
        var node = Read(text, out var problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return node!;
    }

    public static ScalarNode Scalar(string text) => Assert.IsType<ScalarNode>(Read(text));

    public static IReadOnlyList<string> Codes(this Problems problems) => [.. problems.All.Select(problem => problem.Code)];

    /// <summary>A node and all that lie in it.</summary>
    public static IEnumerable<Node> AndAllBelow(this Node node) => node switch
    {
        MappingNode mapping => mapping.Entries.SelectMany(entry => entry.Value.AndAllBelow()).Prepend(node),
        SequenceNode sequence => sequence.Items.SelectMany(AndAllBelow).Prepend(node),
        _ => [node],
    };
}
