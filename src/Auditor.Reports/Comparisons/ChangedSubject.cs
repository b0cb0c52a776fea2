namespace Auditor.Reports.Comparisons;

/// <summary>A subject that was added, removed, renamed or moved. Texts that do not apply are empty.</summary>
/// <param name="State">What became of it.</param>
/// <param name="Kind">Kind of subject.</param>
/// <param name="Name">Its name.</param>
/// <param name="Before">Its key in the earlier revision.</param>
/// <param name="After">Its key in the later revision.</param>
/// <param name="By">By what it was recognised.</param>
/// <param name="Place">Where it stands in the later revision, or in the earlier one where it was removed.</param>
public sealed record ChangedSubject(string State, string Kind, string Name, string Before, string After, string By, string Place);
