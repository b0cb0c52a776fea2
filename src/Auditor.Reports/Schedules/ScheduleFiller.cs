using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Formulas.Values;
using Auditor.Reports.Model;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Schedules;

/// <summary>Fills the schedule of circuits from an audit.</summary>
internal sealed class ScheduleFiller(AuditResult result, Schedule schedule)
{
    private readonly ILookup<DesignSubject, Finding> _findings = result.Findings.ToLookup(finding => CircuitOf(finding.Subject));

    public ScheduleTable Fill()
    {
        var circuits = result.Design.Subjects.Where(subject => subject.Shape == result.Rules.Schema.Shapes.Circuit);
        return new ScheduleTable([.. schedule.Columns.Select(column => column.Heading)], [.. circuits.Select(Row)]);
    }

    private static DesignSubject CircuitOf(DesignSubject subject) => subject.Shape.Name == "leg" ? subject.Parent! : subject;

    private ScheduleRow Row(DesignSubject circuit)
    {
        var findings = _findings[circuit].ToArray();
        var governing = findings.Where(finding => Margin(finding) is not null).MinBy(Margin);
        return new ScheduleRow(
            circuit.Key, SubjectText.OwnName(circuit) ?? "", [.. schedule.Columns.Select(column => Cell(circuit, column))],
            findings.Length == 0 ? "" : Gravest(findings).Word(),
            governing is null ? "" : ValueText.ShowMargin(Margin(governing)!.Value), governing?.Rule.Id ?? "",
            findings.Min(Worst) is { } worst ? ValueText.ShowMargin(worst) : "");
    }

    private static double? Margin(Finding finding) => finding.Judgement.Margin?.Relative;

    private static double? Worst(Finding finding) => finding.WorstCase?.Margin?.Relative;

    private static Verdict Gravest(Finding[] findings) =>
        VerdictOrder.GravestFirst.First(verdict => Array.Exists(findings, finding => finding.Verdict == verdict));

    /// <summary>The legs of a run that say the same are said once; differing ones stand one after the other.</summary>
    private static string Cell(DesignSubject circuit, ScheduleColumn column) =>
        column.OfLegs ? string.Join(" / ", circuit.Legs.Select(leg => Text(leg, column)).Distinct()) : Text(circuit, column);

    /// <summary>Inputs that the design leaves out are left out; a quantity that cannot be computed is said to be unknown.</summary>
    private static string Text(DesignSubject subject, ScheduleColumn column) =>
        string.Join(' ', column.Names.Select(name => Text(subject, name)).Where(text => text.Length > 0));

    private static string Text(DesignSubject subject, string name)
    {
        if (subject.Shape.Quantity(name) is { } quantity)
        {
            return ValueText.Show(subject.Quantity(quantity.Index), quantity.Unit);
        }

        var input = subject.Shape.Input(name)!;
        var value = subject.Input(input.Index);
        return value.Kind == ValueKind.Missing ? "" : ValueText.Show(value, input.Unit);
    }
}
