using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Model;

/// <summary>
/// Writes the formulas behind findings. Where a rule names a quantity of its subject, the formula shown is that of the quantity; one that
/// reads nothing is left out, for the finding shows what it gives.
/// </summary>
internal sealed class FormulaLines(RuleSet rules)
{
    /// <summary>Shared by all findings, so that each quantity is unfolded once only: of the unfolding, the lines need none.</summary>
    private readonly EvidenceBuilder _evidence = new(rules);

    public IReadOnlyList<FormulaLine> Of(Finding finding) =>
        [.. _evidence.Of(finding)
            .Where(derivation => derivation.Symbol != "applies" && derivation.From.Count > 0)
            .Select(derivation => new FormulaLine(derivation.Symbol, Line(finding, derivation)))];

    private string Line(Finding finding, Derivation derivation)
    {
        if (finding.Subject.Shape.Quantity(derivation.Formula) is not { } slot)
        {
            return Join(derivation.Formula, derivation.WithNumbers, derivation.Value);
        }

        var quantity = _evidence.Of(finding.Subject, slot);
        return Join(slot.Symbol, quantity.Formula, quantity.WithNumbers, derivation.Value);
    }

    private static string Join(params IEnumerable<string> parts)
    {
        var said = new List<string>();
        foreach (var part in parts.Select(Bare).Where(part => said.Count == 0 || said[^1] != part))
        {
            said.Add(part);
        }

        return string.Join(" = ", said);
    }

    /// <summary>A formula that is one value in brackets says no more than the value.</summary>
    private static string Bare(string part) => part is ['(', .. var inner, ')'] && !inner.AsSpan().ContainsAny('(', ')') ? inner : part;
}
