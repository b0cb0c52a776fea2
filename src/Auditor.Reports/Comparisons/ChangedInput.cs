namespace Auditor.Reports.Comparisons;

/// <summary>An input that changed, for all subjects for which the same place of the design says so.</summary>
/// <param name="Path">Path of the input.</param>
/// <param name="Subjects">Keys of the subjects, in the order of the design.</param>
/// <param name="Before">What the earlier revision states.</param>
/// <param name="After">What the later revision states.</param>
/// <param name="PlaceBefore">Where, in the earlier revision; empty for nowhere.</param>
/// <param name="PlaceAfter">Where, in the later revision; empty for nowhere.</param>
public sealed record ChangedInput(string Path, IReadOnlyList<string> Subjects, string Before, string After, string PlaceBefore, string PlaceAfter);
