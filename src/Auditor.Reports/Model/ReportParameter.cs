namespace Auditor.Reports.Model;

/// <summary>A choice that the standards leave open, as the rule set settles it.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Value">The value in force, as written.</param>
/// <param name="About">What it decides.</param>
/// <param name="Clause">Clause that leaves it open; empty where none does.</param>
/// <param name="Source">Where the value comes from.</param>
/// <param name="Trust">How far it may be trusted; empty where it is a choice and not a figure.</param>
/// <param name="File">Set file that gave the value.</param>
public sealed record ReportParameter(string Name, string Value, string About, string Clause, string Source, string Trust, string File);
