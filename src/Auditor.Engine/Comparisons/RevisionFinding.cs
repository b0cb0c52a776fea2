using Auditor.Engine.Findings;

namespace Auditor.Engine.Comparisons;

/// <summary>A finding of one revision, as far as it can be compared.</summary>
public sealed class RevisionFinding
{
    /// <summary>Id of the rule.</summary>
    public required string Rule { get; init; }

    /// <summary>What is right when it conforms.</summary>
    public required string Title { get; init; }

    /// <summary>Key of the subject.</summary>
    public required string Subject { get; init; }

    /// <summary>The verdict.</summary>
    public required Verdict Verdict { get; init; }

    /// <summary>Whether the verdict hangs on an input marked as assumed.</summary>
    public required bool OnAssumption { get; init; }

    /// <summary>Whether the rule is a requirement; otherwise it is a recommendation.</summary>
    public required bool IsRequirement { get; init; }

    /// <summary>The value compared; null where it is missing or nothing is compared.</summary>
    public required Figure? Value { get; init; }

    /// <summary>The limits; empty where one is missing or nothing is compared.</summary>
    public required IReadOnlyList<Figure> Limits { get; init; }

    /// <summary>The limit as shown, with its sense; empty for none.</summary>
    public required string LimitShown { get; init; }

    /// <summary>Distance to the limit as a share of it, positive on the right side; null where there is none.</summary>
    public required double? RelativeMargin { get; init; }

    /// <summary>The same distance in coherent units; null where nothing was measured.</summary>
    public required double? AbsoluteMargin { get; init; }

    /// <summary>The same distance as shown, with its unit; empty where nothing was measured.</summary>
    public required string MarginShown { get; init; }

    /// <summary>The sentence.</summary>
    public required string Message { get; init; }

    /// <summary>Names of what would have to be known; empty unless undetermined.</summary>
    public required IReadOnlyList<string> Missing { get; init; }

    /// <summary>Where in the design to look; null where a findings file does not tell.</summary>
    public required Place? Place { get; init; }

    /// <summary>Stable key.</summary>
    public string Key => $"{Rule}:{Subject}";

    /// <summary>The margin to show: relative where there is one, else in the unit of the value; empty where nothing was measured.</summary>
    public string MarginText => RelativeMargin is { } relative ? ValueText.ShowMargin(relative) : MarginShown;

    /// <summary>The verdict in words, with the assumption that it hangs on.</summary>
    public string VerdictText => Verdict == Verdict.Conforms && OnAssumption ? "conforms, on assumption" : Verdict.Word();
}
