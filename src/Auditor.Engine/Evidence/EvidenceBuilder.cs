using System.Runtime.CompilerServices;
using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Evidence;

/// <summary>
/// Tells how a value came about, by evaluating its formula once more with somebody listening. Costs nothing where nobody asks.
/// </summary>
/// <param name="rules">The rule set.</param>
/// <param name="unfolds">Whether the quantities that a formula rests on are derived as well, and theirs in turn, or only named.</param>
public sealed class EvidenceBuilder(RuleSet rules, bool unfolds = true)
{
    private readonly HashSet<(ISubject Subject, string Symbol)> _told = [];

    /// <summary>How a quantity of a subject was computed, down to design lines and table cells; each quantity is unfolded once.</summary>
    public Derivation Of(ISubject subject, QuantitySlot slot)
    {
        var definition = rules.Quantity(subject.Shape, slot.Index);
        _told.Add((subject, slot.Symbol));
        var about = new Heading(slot.Symbol, definition.Name, slot.Unit, definition.Clause.References, definition.Note);
        return Derive(subject, definition.Formula, about);
    }

    /// <summary>What a finding rests on: its condition, its value and its limits.</summary>
    public IReadOnlyList<Derivation> Of(Finding finding)
    {
        var rule = finding.Rule;
        var derivations = new List<Derivation>();
        if (rule.When is { } when)
        {
            derivations.Add(Derive(finding.Subject, when, new Heading("applies", "the rule applies", null, [], "")));
        }

        var isPlain = rule.Check.How == CheckKind.Require;
        derivations.Add(Derive(
            finding.Subject, rule.Check.Value,
            new Heading(isPlain ? "holds" : "value", isPlain ? rule.Title : "the value compared", rule.Check.Unit, rule.Clause.References, "")));
        derivations.AddRange(rule.Check.Limits.Select(limit =>
            Derive(finding.Subject, limit, new Heading("limit", "the limit", rule.Check.Unit, rule.Clause.References, ""))));
        return derivations;
    }

    private Derivation Derive(ISubject subject, Formula formula, Heading about)
    {
        var tracer = new Tracer();
        var value = formula.Evaluate(new Scope(subject, null, tracer));
        var written = NumbersPutIn.OneLine(formula.Text);
        return new Derivation(
            subject.Key, about.Symbol, about.Name, ValueText.Show(value, about.Unit ?? formula.Unit), written, NumbersPutIn.Write(formula, tracer.Readings),
            about.References, formula.Source.Span.ToString(), about.Note, Sources(tracer, value));
    }

    private List<EvidenceSource> Sources(Tracer tracer, in Value value)
    {
        var sources = new List<EvidenceSource>();
        var seen = new HashSet<(object, string)>();
        foreach (var reading in tracer.Readings)
        {
            foreach (var source in SourcesOf(reading, seen))
            {
                sources.Add(source);
            }
        }

        if (value.IsMissing)
        {
            // What an input or a quantity lacks is told with it.
            var told = tracer.Readings.Where(reading => reading.Value.IsMissing && (reading.Input is not null || reading.Quantity is not null))
                .SelectMany(reading => reading.Value.Absences.Items).ToHashSet();
            sources.AddRange(value.Absences.Items
                .Where(absence => !told.Contains(absence))
                .Select(absence => new EvidenceSource(EvidenceKind.Missing, absence.Name, ValueText.Unknown, "", absence.ToString(), null)));
        }

        return sources;
    }

    private IEnumerable<EvidenceSource> SourcesOf(Tracer.Reading reading, HashSet<(object, string)> seen)
    {
        if (reading is { Input: { } input, Subject: { } holder } && seen.Add((holder, input.Name)))
        {
            yield return InputSource(holder, input, reading.Value);
        }
        else if (reading is { Quantity: { } quantity, Subject: { } subject } && seen.Add((subject, quantity.Symbol)))
        {
            var derivation = !unfolds || _told.Contains((subject, quantity.Symbol)) || !RuntimeHelpers.TryEnsureSufficientExecutionStack() ? null : Of(subject, quantity);
            yield return new EvidenceSource(
                EvidenceKind.Quantity, $"{subject.Key} {quantity.Symbol}", ValueText.Show(reading.Value, quantity.Unit), "", derivation is null ? "told elsewhere" : "", derivation);
        }
        else if (reading.Parameter is { } slot && seen.Add(("param", slot.Name)))
        {
            var parameter = rules.Parameters[slot.Index];
            yield return new EvidenceSource(EvidenceKind.Parameter, "param." + slot.Name, parameter.Text, parameter.Span.ToString(), parameter.Source, null);
        }
        else if (reading.Curve is { } curve && seen.Add(("curve", curve.Source.Id + reading.CurveReading)))
        {
            var remark = $"{string.Join("; ", curve.Source.Sources)}";
            yield return new EvidenceSource(
                EvidenceKind.Curve, $"{curve.Source.Title}, {reading.CurveReading}", ValueText.Show(reading.Value, reading.Unit), curve.Source.Path, remark, null);
        }

        foreach (var cell in reading.Cells)
        {
            if (seen.Add((cell.Table.Id, $"{cell.Row}|{cell.Column}")))
            {
                yield return CellSource(cell, reading.Lookup!);
            }
        }
    }

    private static EvidenceSource InputSource(ISubject holder, InputSlot input, in Value value)
    {
        var statement = (holder as DesignSubject)?.Statement(input);
        return new EvidenceSource(
            value.IsMissing ? EvidenceKind.Missing : EvidenceKind.Input, $"{holder.Key} {input.Path}",
            (statement as ScalarNode)?.Text ?? ValueText.Show(value, input.Unit), statement?.Span.ToString() ?? "", value.IsMissing ? "not given in the design" : "", null);
    }

    private static EvidenceSource CellSource(TableCell cell, Lookup lookup)
    {
        var column = cell.Column.Length == 0 ? "" : $", column {cell.Column}";
        var text = cell.Word ?? (double.IsNaN(cell.Number) ? "no figure" : ValueText.ShowNumber(cell.Number, lookup.Unit ?? Unit.One));
        var remark = $"{cell.Trust.Word()}: {string.Join("; ", cell.Table.Sources)}";
        return new EvidenceSource(EvidenceKind.Cell, $"{cell.Table.Title}, row {cell.Row}{column}", text, $"{cell.Table.Path}:{cell.Line}", remark, null);
    }

    private sealed record Heading(string Symbol, string Name, Unit? Unit, IReadOnlyList<string> References, string Note);
}
