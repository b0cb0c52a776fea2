using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Registers;

/// <summary>The register of requirements: what an audit could be asked, so that a report can say what it did not look at.</summary>
/// <param name="Rows">All rows, by part and then in the order of the file.</param>
public sealed record Register(IReadOnlyList<RegisterRow> Rows)
{
    /// <summary>Reads the shipped register.</summary>
    /// <param name="home">Where the rule data stand.</param>
    /// <param name="problems">Receives what is wrong with its files.</param>
    public static Register Load(RuleHome home, Problems problems)
    {
        var folder = Path.Combine(home.Folder, "register");
        var schema = home.Schema("register");
        var rows = new List<RegisterRow>();
        foreach (var file in Directory.EnumerateFiles(folder, "*.yaml").Order(StringComparer.Ordinal))
        {
            var display = $"{home.Display}/register/{Path.GetFileName(file)}";
            if (SourceReader.Read(file, display, problems) is { } source && YamlReader.Read(source, problems) is MappingNode root && root.Find("register") is not null)
            {
                schema.Validate(root, problems);
                rows.AddRange(root.Mappings("rows").Select(row =>
                    new RegisterRow(row.Text("id") ?? "", root.Text("register")!, row.Text("requirement") ?? "", row.Text("decidable") ?? "judgement")));
            }
        }

        return new Register(rows);
    }

    /// <summary>The rows that no rule of the set decides.</summary>
    public IReadOnlyList<RegisterRow> NotCovered(RuleSet rules)
    {
        var covered = Covered(rules);
        return [.. Rows.Where(row => !covered.Contains(row.Id))];
    }

    /// <summary>Ids of the rows that rules of the set say they decide.</summary>
    public static IReadOnlySet<string> Covered(RuleSet rules) => rules.Rules.SelectMany(rule => rule.Covers).ToHashSet(StringComparer.Ordinal);
}
