using Auditor.Documents;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Comparisons;

/// <summary>One side of a comparison: what one audit found of one state of a design.</summary>
public sealed class Revision
{
    /// <summary>What reports call it: the path of a design or findings file, or <c>REVISION:path</c>.</summary>
    public required string Name { get; init; }

    /// <summary>Words by which the design calls its own revision; empty where it has none.</summary>
    public required string Mark { get; init; }

    /// <summary>The files of the design, with paths relative to its folder.</summary>
    public required IReadOnlyList<InputFile> Inputs { get; init; }

    /// <summary>The rule set.</summary>
    public required RevisionRules Rules { get; init; }

    /// <summary>The subjects, in the order of the design.</summary>
    public required IReadOnlyList<RevisionSubject> Subjects { get; init; }

    /// <summary>The findings: subjects in the order of the design, then rules by id.</summary>
    public required IReadOnlyList<RevisionFinding> Findings { get; init; }

    /// <summary>The departures, in the order of the design.</summary>
    public required IReadOnlyList<RevisionDeparture> Departures { get; init; }

    /// <summary>The audit itself; null when the revision was read from a findings file.</summary>
    public AuditResult? Audit { get; init; }

    /// <summary>Whether it is known what the design states.</summary>
    public bool StatesInputs => Subjects.All(subject => subject.Stated is not null);

    /// <summary>The revision that an audit found.</summary>
    /// <param name="name">What reports call it.</param>
    /// <param name="audit">The audit.</param>
    public static Revision Of(string name, AuditResult audit) => new RevisionBuilder(name, audit).Build();
}
