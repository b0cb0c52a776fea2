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
    private readonly EvidenceBuilder _evidence = new(rules, unfolds: false);

    public IReadOnlyList<FormulaLine> Of(Finding finding) =>
        [.. _evidence.Of(finding)
            .Where(derivation => derivation.Symbol != "applies" && derivation.From.Count > 0)
            .Select(derivation => Line(finding, derivation))];

    private FormulaLine Line(Finding finding, Derivation derivation)
    {
        if (finding.Subject.Shape.Quantity(derivation.Formula) is not { } slot)
        {
            return Line(derivation, [derivation.Formula], derivation);
        }

        var quantity = _evidence.Of(finding.Subject, slot);
        return Line(derivation, [slot.Symbol, quantity.Formula], quantity);
    }

    private static FormulaLine Line(Derivation derivation, IReadOnlyList<string> defined, Derivation filled)
    {
        var saysMore = Bare(filled.WithNumbers) != Bare(defined[^1]) && Bare(filled.WithNumbers) != Bare(derivation.Value);
        return new FormulaLine(
            derivation.Symbol, Join([.. defined, filled.WithNumbers, derivation.Value]), Join(defined), saysMore ? Bare(filled.WithNumbers) : "");
    }

    private static string Join(IEnumerable<string> parts)
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
