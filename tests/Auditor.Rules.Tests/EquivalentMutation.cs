using Auditor.Documents;
using Auditor.Engine.RuleTests;
using Auditor.Testing;

namespace Auditor.Rules.Tests;

/// <summary>A change that gives the same values as before, so that no case can notice it.</summary>
/// <param name="Owner">Whose formula it changes.</param>
/// <param name="Change">The change in words.</param>
/// <param name="Before">The formula just before the place of the change.</param>
/// <param name="Reason">Why it changes nothing.</param>
internal sealed record EquivalentMutation(string Owner, string Change, string Before, string Reason)
{
    private const string File = "tests/Auditor.Rules.Tests/equivalent-mutations.yaml";

    public static IEnumerable<EquivalentMutation> All()
    {
        var problems = new Problems();
        var root = (MappingNode)YamlReader.Read(SourceReader.Read(Repository.PathOf(File), File, problems)!, problems)!;
        return root.Mappings("equivalent-mutations").Select(node =>
            new EquivalentMutation(node.Text("owner")!, node.Text("change")!, node.Text("before")!, node.Text("reason")!));
    }

    public bool Is(Mutation mutation) =>
        mutation.Owner == Owner && mutation.Change == Change && TextBefore(mutation.Span).EndsWith(Before, StringComparison.Ordinal);

    private static string TextBefore(SourceSpan span) => span.Source.Text[..span.Start].TrimEnd();
}
