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
        var rules = EachOnce(root.Mappings("rules"), "id", "rule", problems);
        foreach (var finding in root.Mappings("findings"))
        {
            Listed(finding.Scalar("subject")!, subjects, "subject", problems);
            Listed(finding.Scalar("rule")!, rules, "rule", problems);
        }
    }

    private static void Listed(ScalarNode name, HashSet<string> known, string what, Problems problems)
    {
        if (!known.Contains(name.Text))
        {
            problems.Add(FindingsMessages.NotListed(name.Span, what, name.Text));
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
