using System.Runtime.CompilerServices;
using Auditor.Documents;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>A rule: when it applies, what it compares, and what it says. Two are equal only where they are the same.</summary>
public sealed record Rule
{
    /// <summary>Stable id; also its file name.</summary>
    public required string Id { get; init; }

    /// <summary>What is right when it conforms.</summary>
    public required string Title { get; init; }

    /// <summary>Rows of the register that it decides.</summary>
    public required IReadOnlyList<string> Covers { get; init; }

    /// <summary>Clause type and references.</summary>
    public required Clause Clause { get; init; }

    /// <summary>Requirement or recommendation.</summary>
    public required Provision Provision { get; init; }

    /// <summary>Kind of subject.</summary>
    public required SubjectShape Shape { get; init; }

    /// <summary>Condition under which it applies; null for always.</summary>
    public required Formula? When { get; init; }

    /// <summary>What it compares.</summary>
    public required Check Check { get; init; }

    /// <summary>The sentence of a finding.</summary>
    public required Sentence Says { get; init; }

    /// <summary>Why it matters, in plain words.</summary>
    public required string Why { get; init; }

    /// <summary>Inputs that can put a nonconformity right, as the design file names them.</summary>
    public required IReadOnlyList<string> PutRightBy { get; init; }

    /// <summary>Whether a departure from it may be recorded.</summary>
    public required bool AllowsDepartures { get; init; }

    /// <summary>Earlier ids, still understood.</summary>
    public required IReadOnlyList<string> Formerly { get; init; }

    /// <summary>Its file.</summary>
    public required MappingNode Node { get; init; }

    /// <summary>Display path of its file.</summary>
    public string Path => Node.Span.Source.Path;

    /// <inheritdoc/>
    public bool Equals(Rule? other) => ReferenceEquals(this, other);

    /// <inheritdoc/>
    public override int GetHashCode() => RuntimeHelpers.GetHashCode(this);
}
