using Auditor.Documents;
using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Tables;
using Auditor.Quantities;

namespace Auditor.Reports.Json;

/// <summary>Writes the full evidence of a findings file: every input stated and every quantity computed.</summary>
internal static class EvidenceJson
{
    public static void Write(JsonOutput output, AuditResult result)
    {
        output.Object("stated", () =>
        {
            foreach (var subject in result.Design.Subjects)
            {
                output.Object(subject.Key, () => Stated(output, subject));
            }
        });
        var evidence = new EvidenceBuilder(result.Rules);
        output.Object("quantities", () =>
        {
            foreach (var subject in result.Design.Subjects)
            {
                output.Object(subject.Key, () => Quantities(output, subject, result.Rules, evidence));
            }
        });
    }

    private static void Stated(JsonOutput output, DesignSubject subject)
    {
        foreach (var input in StatedInput.Of(subject))
        {
            output.Record(input.Slot.Path, () =>
            {
                output.Text("text", input.Text);
                output.Text("standing", StandingWord(input.Standing));
                output.Text("from", input.From);
                output.Location(input.Span);
            });
        }
    }

    private static string StandingWord(Standing standing) => standing switch
    {
        Standing.Assumed => "assumed",
        Standing.Declared => "declared",
        Standing.Measured => "measured",
        _ => "designed",
    };

    private static void Quantities(JsonOutput output, DesignSubject subject, RuleSet rules, EvidenceBuilder evidence)
    {
        foreach (var slot in subject.Shape.Quantities)
        {
            var definition = rules.Quantity(subject.Shape, slot.Index);
            var value = subject.Quantity(slot.Index);
            var derivation = evidence.Of(subject, slot);
            output.Record(slot.Symbol, () =>
            {
                output.Text("name", definition.Name);
                output.Value("value", value, slot.Unit);
                output.Text("unit", slot.Unit?.Symbol);
                output.Text("formula", derivation.Formula);
                output.Text("withNumbers", derivation.WithNumbers);
                FindingJson.Clause(output, definition.Clause);
                var readings = Readings.Of(definition.Formula, subject);
                output.Array("from", readings, antecedent => output.Object(null, () => From(output, antecedent, rules)));
                FindingJson.Gaps(output, value.IsMissing ? value.Absences : null, subject.Key);
                output.Location(definition.Formula.Source.Span);
            });
        }
    }

    private static void From(JsonOutput output, Antecedent antecedent, RuleSet rules)
    {
        var parameter = antecedent.Parameter is { } slot ? rules.Parameters[slot.Index] : null;
        var table = antecedent.Cell?.Table ?? antecedent.Curve?.Source;
        output.Text("kind", antecedent.Kind);
        output.Text("subject", antecedent.Subject?.Key);
        output.Text("name", parameter?.Id ?? antecedent.Name);
        output.Value("value", antecedent.Value, antecedent.Unit);
        output.Text("unit", antecedent.Unit?.Symbol);
        output.TextOrNull("source", table is null ? parameter?.Source ?? "" : string.Join("; ", table.Sources));
        output.Text("trust", (antecedent.Cell?.Trust ?? parameter?.Trust)?.Word());
        if (antecedent.Cell is { } cell)
        {
            output.Location(cell.Table.Path, new Location(cell.Line, 1));
        }
        else
        {
            output.Location(Span(antecedent, parameter, rules));
        }
    }

    private static SourceSpan? Span(Antecedent antecedent, Parameter? parameter, RuleSet rules) => antecedent switch
    {
        { Input: { } input, Subject: DesignSubject holder } => holder.Source(input)?.Span,
        { Quantity: { } quantity, Subject: { } holder } => rules.Quantity(holder.Shape, quantity.Index).Formula.Source.Span,
        _ => parameter?.Span,
    };
}
