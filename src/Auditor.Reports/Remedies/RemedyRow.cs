namespace Auditor.Reports.Remedies;

/// <summary>One proven remedy, ready to be shown.</summary>
/// <param name="Number">Its number among those of the finding, from 1: the least change first.</param>
/// <param name="Changes">The changes, one text each.</param>
/// <param name="Margins">The margin before and after; empty where nothing is measured.</param>
/// <param name="Besides">What it does besides, one text each.</param>
/// <param name="Inputs">Every input that differs, one text each.</param>
/// <param name="Rechecked">How many rules were judged again to prove it.</param>
public sealed record RemedyRow(
    int Number, IReadOnlyList<string> Changes, string Margins, IReadOnlyList<string> Besides, IReadOnlyList<string> Inputs, int Rechecked);
