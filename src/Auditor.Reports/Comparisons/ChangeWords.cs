using Auditor.Engine.Comparisons;
using Auditor.Engine.Departures;

namespace Auditor.Reports.Comparisons;

/// <summary>All words of comparisons.</summary>
internal static class ChangeWords
{
    /// <summary>The word of a kind of change in files.</summary>
    public static string Word(FindingChangeKind kind) => kind.ToString().ToLowerInvariant();

    /// <summary>The heading over findings of a kind.</summary>
    public static string Heading(FindingChangeKind kind) => kind switch
    {
        FindingChangeKind.New => "New nonconformities",
        FindingChangeKind.Worse => "Nonconformities that became worse",
        FindingChangeKind.Undetermined => "Cannot be judged now",
        FindingChangeKind.Accepted => "Accepted by a departure now",
        FindingChangeKind.Changed => "Changed with the same verdict and margin",
        FindingChangeKind.Closer => "Conforming, and closer to the limit",
        FindingChangeKind.Ceased => "Conformed, and the rule no longer applies",
        FindingChangeKind.Better => "Nonconformities that became smaller",
        FindingChangeKind.Settled => "Could not be judged, and are settled now",
        FindingChangeKind.Gone => "Nonconformities that are gone",
        FindingChangeKind.Further => "Conforming, and further from the limit",
        FindingChangeKind.Started => "Conforming, where nothing was judged before",
        _ => "Open as before",
    };

    /// <summary>What moved a finding, in words; empty where nothing did.</summary>
    public static string Text(MovedBy by, FindingChangeKind kind)
    {
        if (kind == FindingChangeKind.Unchanged)
        {
            return "";
        }

        var words = Words(by).Select(word => word == "ruleSet" ? "rule set" : word).ToArray();
        return words.Length == 0 ? "not told by the files compared" : string.Join(" and ", words);
    }

    /// <summary>What moved a finding, as files say it.</summary>
    public static IEnumerable<string> Words(MovedBy by)
    {
        if (by.HasFlag(MovedBy.Design))
        {
            yield return "design";
        }

        if (by.HasFlag(MovedBy.RuleSet))
        {
            yield return "ruleSet";
        }

        if (by.HasFlag(MovedBy.Departure))
        {
            yield return "departure";
        }
    }

    /// <summary>By what a subject was recognised, in words; empty for one that came or went.</summary>
    public static string Text(Recognition? by) => by switch
    {
        Recognition.Declared => "declared under `formerly`",
        Recognition.Content => "same name and same inputs",
        Recognition.Name => "a name that no other has",
        Recognition.Key => "same id",
        _ => "",
    };

    /// <summary>By what a subject was recognised, as files say it; null for one that came or went.</summary>
    public static string? Word(Recognition? by) => by?.ToString().ToLowerInvariant();

    /// <summary>A part of the rule set, in words and as files say it.</summary>
    public static string Word(RuleItem item) => item.ToString().ToLowerInvariant();

    /// <summary>What became of a part of the rule set or a subject.</summary>
    public static string State(bool isAdded, bool isRemoved) => (isAdded, isRemoved) switch
    {
        (true, _) => "added",
        (_, true) => "removed",
        _ => "changed",
    };

    /// <summary>What became of a subject.</summary>
    public static string State(SubjectChange change) => change switch
    {
        { IsAdded: true } => "added",
        { IsRemoved: true } => "removed",
        { IsMoved: true } => "moved",
        _ => "renamed",
    };

    /// <summary>The state of a departure, in words.</summary>
    public static string Text(DepartureState state) => state switch
    {
        DepartureState.InForce => "in force",
        DepartureState.NotNeeded => "not needed",
        DepartureState.Expired => "expired",
        DepartureState.Forbidden => "forbidden by the rule",
        _ => "matches no finding",
    };

    /// <summary>A change as the cause of another, in one line.</summary>
    public static string Cause(Change change) => change switch
    {
        InputChange input => $"{input.SubjectAfter} {input.Path}: {Stated(input.Before)} → {Stated(input.After)}",
        SubjectChange { IsAdded: false, IsRemoved: false } subject => $"{subject.Subject.Kind} {subject.Before!.Key} {State(subject)} to {subject.After!.Key}",
        SubjectChange subject => $"{subject.Subject.Kind} {subject.Subject.Key} {State(subject)}",
        RuleChange { Item: RuleItem.Parameter, IsAdded: false, IsRemoved: false } rule => $"parameter {rule.Name}: {rule.Details[0].Before} → {rule.Details[0].After}",
        RuleChange rule => $"{Word(rule.Item)} {rule.Name} {State(rule.IsAdded, rule.IsRemoved)}",
        _ => "",
    };

    /// <summary>What is stated of an input, as written.</summary>
    public static string Stated(RevisionInput? input) => input?.Text ?? "not given";
}
