using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Fuzz.Tests;

/// <summary>Good files of the checkout, and what is read of them once for all inputs.</summary>
internal static class Corpus
{
    private static readonly Lazy<RuleSet> Shipped = new(() => Load("united-kingdom", Repository.Root));

    public static RuleHome Home { get; } = new(Repository.PathOf("rules"), "rules");

    /// <summary>The shipped rule set that audits use.</summary>
    public static RuleSet Rules => Shipped.Value;

    /// <summary>Loads a rule set that is without problems.</summary>
    public static RuleSet Load(string name, string folder)
    {
        var problems = new Problems();
        return RuleSetLoader.Load(Home, name, folder, null, problems) ?? throw new InvalidOperationException(ProblemText.Render(problems.All));
    }

    /// <summary>An example that is without problems.</summary>
    public static Design Design(string path, RuleSet rules)
    {
        var problems = new Problems();
        var file = DesignFile.Read(Repository.PathOf(path), path, problems);
        return file is not null && DesignBuilder.Build(file, new Evaluator(rules), problems) is { } design
            ? design
            : throw new InvalidOperationException(ProblemText.Render(problems.All));
    }

    /// <summary>What the files of a folder hold, in order of path.</summary>
    /// <param name="folder">Folder of the checkout.</param>
    /// <param name="pattern">Which files, in the folders below as well.</param>
    /// <param name="every">One file of so many.</param>
    public static IEnumerable<byte[]> Files(string folder, string pattern, int every = 1) =>
        Directory.EnumerateFiles(Repository.PathOf(folder), pattern, SearchOption.AllDirectories).Order(StringComparer.Ordinal)
            .Where((_, index) => index % every == 0).Select(File.ReadAllBytes);

    /// <summary>The scalars of a document.</summary>
    public static IEnumerable<ScalarNode> Scalars(Node node) => node switch
    {
        MappingNode mapping => mapping.Entries.SelectMany(entry => Scalars(entry.Value)),
        SequenceNode sequence => sequence.Items.SelectMany(Scalars),
        _ => [(ScalarNode)node],
    };

    /// <summary>Reads a document that is without problems.</summary>
    public static Node Read(byte[] content)
    {
        var problems = new Problems();
        return YamlReader.Read(new SourceText("good.yaml", System.Text.Encoding.UTF8.GetString(content)), problems)
            ?? throw new InvalidOperationException(ProblemText.Render(problems.All));
    }
}
