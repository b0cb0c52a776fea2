namespace Auditor.Reports.Model;

/// <summary>One thing that is missing, wherever it is missing, and how many findings wait for it.</summary>
/// <param name="Name">Input as the design file writes it, or the table or curve without a fitting entry.</param>
/// <param name="Why">What is wrong.</param>
/// <param name="Help">What to give instead; empty where the name says it all.</param>
/// <param name="Subjects">Keys of the subjects that lack it, in the order of the design.</param>
/// <param name="Findings">Keys of the findings that wait for it.</param>
public sealed record MissingThing(string Name, string Why, string Help, IReadOnlyList<string> Subjects, IReadOnlyList<string> Findings);
