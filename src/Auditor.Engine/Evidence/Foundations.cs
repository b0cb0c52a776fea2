using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Evidence;

/// <summary>
/// Finds the assumed inputs and the figures from memory that findings rest on. Each quantity is looked into once, whoever asks.
/// </summary>
/// <param name="result">The audit.</param>
public sealed class Foundations(AuditResult result)
{
    private readonly Dictionary<(ISubject, int), HashSet<Foundation>> _known = [];

    /// <summary>What a finding rests on, in the order of kind and name.</summary>
    public IReadOnlyList<Foundation> Of(Finding finding)
    {
        var found = new HashSet<Foundation>();
        if (finding.Verdict == Verdict.Unproven)
        {
            CollectUncertainties(finding.WorstCase!, found);
        }
        else if (finding.Judgement.Marks == Marks.None)
        {
            return [];
        }

        var check = finding.Rule.Check;
        foreach (var formula in check.Limits.Prepend(check.Value).Concat(finding.Rule.When is { } when ? [when] : []))
        {
            Collect(formula, finding.Subject, found);
        }

        return [.. found.OrderBy(item => item.Kind).ThenBy(item => item.Subject, StringComparer.Ordinal).ThenBy(item => item.Name, StringComparer.Ordinal)];
    }

    /// <summary>What is not proven for the uncertainty of an instrument rests on what that uncertainty rests on.</summary>
    private void CollectUncertainties(WorstCase worst, HashSet<Foundation> found)
    {
        foreach (var (subject, slot) in worst.Corner.Where(value => value.Input.Kind == ToleranceKind.Instrument).Select(value => value.Input.Input))
        {
            found.UnionWith(OfQuantity(subject, result.Rules.UncertaintyOf(subject.Shape, slot)!.Slot));
        }
    }

    private void Collect(Formula formula, ISubject subject, HashSet<Foundation> found)
    {
        var tracer = new Tracer();
        formula.Evaluate(new Scope(subject, null, tracer));
        foreach (var reading in tracer.Readings)
        {
            Collect(reading, found);
        }
    }

    private void Collect(Tracer.Reading reading, HashSet<Foundation> found)
    {
        if (reading is { Quantity: { } quantity, Subject: { } subject } && reading.Value.Marks != Marks.None)
        {
            found.UnionWith(OfQuantity(subject, quantity));
        }
        else if (reading is { Input: { } input, Subject: DesignSubject holder } && reading.Value.Marks.HasFlag(Marks.Assumed))
        {
            var source = holder.Source(input)!;
            found.Add(new Foundation(FoundationKind.AssumedInput, holder.Key, input.Path, source.Text, source.Span));
        }
        else if (reading.Parameter is { } slot && reading.Value.Marks != Marks.None)
        {
            var parameter = result.Rules.Parameters[slot.Index];
            found.Add(new Foundation(FoundationKind.FigureFromMemory, null, "param." + slot.Name, parameter.Text, parameter.Span));
        }
        else if (reading.Curve is { } curve && reading.Value.Marks != Marks.None)
        {
            found.Add(new Foundation(FoundationKind.FigureFromMemory, null, curve.Source.Title, "", null));
        }

        foreach (var cell in reading.Cells.Where(cell => cell.Trust.Mark() != Marks.None))
        {
            found.Add(new Foundation(FoundationKind.FigureFromMemory, null, cell.Table.Title, "", null));
        }
    }

    private HashSet<Foundation> OfQuantity(ISubject subject, QuantitySlot slot)
    {
        if (!_known.TryGetValue((subject, slot.Index), out var found))
        {
            found = [];
            _known.Add((subject, slot.Index), found);
            Collect(result.Rules.Quantity(subject.Shape, slot.Index).Formula, subject, found);
        }

        return found;
    }
}
