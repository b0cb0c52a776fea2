using Auditor.Documents;

namespace Auditor.Reports.Json;

/// <summary>Checks of a findings file what its schema cannot say: that each thing is listed once, and findings are of what is listed.</summary>
internal static class FindingsCheck
{
    /// <summary>Checks a file that its schema has accepted.</summary>
    public static void Run(MappingNode root, Problems problems)
    {
        EachOnce(root.Mappings("inputs"), "path", "input file", problems);
        EachOnce(root.Mapping("ruleSet")!.Mappings("parameters"), "name", "parameter", problems);
        EachOnce(root.Mappings("findings"), "key", "finding", problems);
        var subjects = EachOnce(root.Mappings("subjects"), "key", "subject", problems);
        foreach (var finding in root.Mappings("findings"))
        {
            var subject = finding.Scalar("subject")!;
            if (!subjects.Contains(subject.Text))
            {
                problems.Add(FindingsMessages.UnknownSubject(subject.Span, subject.Text));
            }
        }
    }

    private static HashSet<string> EachOnce(IEnumerable<MappingNode> nodes, string key, string what, Problems problems)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (var name in nodes.Select(node => node.Scalar(key)!).Where(name => !seen.Add(name.Text)))
        {
            problems.Add(FindingsMessages.ListedTwice(name.Span, what, name.Text));
        }

        return seen;
    }
}
