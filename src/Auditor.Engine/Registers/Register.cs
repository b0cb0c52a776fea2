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
        var reader = new RuleFileReader(home, problems, PreparedRules.Open(home), RuleFileReader.OfRegister);
        var paths = Directory.EnumerateFiles(Path.Combine(home.Folder, "register"), "*.yaml").Order(StringComparer.Ordinal)
            .Select(path => (path, $"{home.Display}/register/{Path.GetFileName(path)}")).ToList();
        return new Register([.. reader.Read(paths).Where(file => file.Kind == "register").SelectMany(file => RowsOf(file.Root))]);
    }

    /// <summary>The rows that no rule of the set decides.</summary>
    public IReadOnlyList<RegisterRow> NotCovered(RuleSet rules)
    {
        var covered = Covered(rules);
        return [.. Rows.Where(row => !covered.Contains(row.Id))];
    }

    /// <summary>Ids of the rows that rules of the set say they decide.</summary>
    public static IReadOnlySet<string> Covered(RuleSet rules) => rules.Rules.SelectMany(rule => rule.Covers).ToHashSet(StringComparer.Ordinal);

    private static IEnumerable<RegisterRow> RowsOf(MappingNode root) => root.Mappings("rows").Select(row =>
        new RegisterRow(row.Text("id") ?? "", root.Text("register")!, row.Text("requirement") ?? "", row.Text("decidable") ?? "judgement"));
}
