namespace Auditor.Reports.Schedules;

/// <summary>One column of the schedule of circuits.</summary>
/// <param name="Heading">Its heading.</param>
/// <param name="OfLegs">Whether the names are those of the legs of the cable run, not of the circuit.</param>
/// <param name="Names">Inputs and symbols to show, as formulas write them.</param>
public sealed record ScheduleColumn(string Heading, bool OfLegs, IReadOnlyList<string> Names);
