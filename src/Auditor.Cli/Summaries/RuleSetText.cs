using Auditor.Cli.Commands;
using Auditor.Engine.HouseSets;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Summaries;

/// <summary>Writes a rule set as it is in force: each thing on a line with the file it comes from, then what house sets change.</summary>
internal static class RuleSetText
{
    /// <summary>Writes a rule set.</summary>
    public static void Write(TextWriter output, RuleSet set)
    {
        output.WriteLine($"{set.Title.Id}: {set.Title.Text}");
        output.WriteLine($"edition: {set.Title.Edition}");
        output.WriteLine($"built from: {string.Join(" → ", set.Title.Chain)}");
        output.WriteLine();
        Rules(output, set.Rules);
        Part(output, set.Parameters.Select(parameter => $"param {parameter.Id,-40} {parameter.Text,-12} {parameter.Span}"));
        var tables = set.World.Lookups.Values.SelectMany(lookup => lookup.Cells().Select(entry => (lookup.Name, entry.Cell.Table.Path))).Distinct();
        Part(output, tables.OrderBy(table => table.Name, StringComparer.Ordinal).ThenBy(table => table.Path, StringComparer.Ordinal)
            .Select(table => $"table {table.Name,-40} {table.Path}"));
        Part(output, set.World.Curves.All.Select(curve => curve.Source).OrderBy(curve => curve.Id, StringComparer.Ordinal).Select(curve => $"curve {curve.Id,-40} {curve.Path}"));
        Part(output, set.Quantities.Select(quantity => $"quantity {quantity.Shape.Name,-12} {quantity.Slot.Symbol,-24} {quantity.Node.Span.Source.Path}"));
        Part(output, set.Templates.OrderBy(entry => entry.Key, StringComparer.Ordinal).Select(entry => $"template {entry.Key,-6} {entry.Value.DisplayPath}"));
        Part(output, set.Changes.Select(change =>
            $"{(change.Loosens ? "loosened" : "tightened"),-9} {change.What.Word()} {change.Name}: {change.Before} → {change.After} ({change.How}) {change.Span}"));
        output.WriteLine();
        Rules(output, set.RecordRules);
    }

    private static void Rules(TextWriter output, IEnumerable<Rule> rules)
    {
        foreach (var rule in rules)
        {
            output.WriteLine($"{rule.Id,-40} {rule.Shape.Name,-12} {RulesListCommand.ProvisionWord(rule),-14} {rule.Clause.Type,-26} {rule.Path}");
        }
    }

    private static void Part(TextWriter output, IEnumerable<string> lines)
    {
        var all = lines.ToArray();
        if (all.Length > 0)
        {
            output.WriteLine();
            Array.ForEach(all, output.WriteLine);
        }
    }
}
