using Auditor.Documents;
using Auditor.Engine.Departures;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Findings;

/// <summary>What one rule says of one subject of a design.</summary>
public sealed class Finding
{
    internal Finding(Rule rule, DesignSubject subject, Judgement judgement)
    {
        Rule = rule;
        Subject = subject;
        Judgement = judgement;
        Scope = subject.Scope;
    }

    /// <summary>The rule.</summary>
    public Rule Rule { get; }

    /// <summary>The subject.</summary>
    public DesignSubject Subject { get; }

    /// <summary>Value, limits, margin and what is missing.</summary>
    public Judgement Judgement { get; }

    /// <summary>The departure in force that accepts it; null for none.</summary>
    public Departure? Departure { get; internal init; }

    /// <summary>The worst case within the tolerances that it depends on; null where it depends on none.</summary>
    public WorstCase? WorstCase { get; internal init; }

    /// <summary>In how many random designs within the tolerances the rule is kept; null where none were drawn.</summary>
    public SampleShare? Share { get; internal init; }

    /// <summary>The verdict.</summary>
    public Verdict Verdict => Departure is not null ? Verdict.Departed : IsUnproven ? Verdict.Unproven : Judgement.Verdict!.Value;

    /// <summary>Stable key: it depends on the rule and the subject alone.</summary>
    public string Key => $"{Rule.Id}:{Subject.Key}";

    /// <summary>Whether the verdict hangs on an input marked as assumed.</summary>
    public bool OnAssumption => Judgement.Marks.HasFlag(Marks.Assumed);

    /// <summary>Whether the verdict hangs on a figure entered from memory.</summary>
    public bool FromMemory => (Judgement.Marks | (IsUnproven ? WorstCase!.Marks : Marks.None)).HasFlag(Marks.FromMemory);

    /// <summary>The verdict in words, with the assumption that it hangs on.</summary>
    public string VerdictText => Verdict == Verdict.Conforms && OnAssumption ? "conforms, on assumption" : Verdict.Word();

    /// <summary>The value as shown; empty where nothing is compared.</summary>
    public string ValueShown => Rule.Check.How == CheckKind.Require ? "" : ValueText.Show(Judgement.Value, Rule.Check.Unit);

    /// <summary>The limit as shown, with its sense; empty where nothing is compared.</summary>
    public string LimitShown => LimitText.Show(Rule.Check, Judgement);

    /// <summary>Distance to the limit in the unit of the value; null where nothing was measured.</summary>
    public string? MarginShown => Judgement.Margin is { } margin ? ValueText.ShowNumber(margin.Absolute, MarginUnit.Of(Rule.Check.Unit!)) : null;

    /// <summary>The sentence of the finding.</summary>
    public string Message => SentenceWriter.Write(this);

    /// <summary>Whether it is kept as stated, but not in the worst case, and guarded acceptance asks for that.</summary>
    internal bool IsUnproven { get; init; }

    /// <summary>Whether the rule applies as stated, and not only somewhere within the tolerances.</summary>
    internal bool AppliesAsStated => Scope == Subject.Scope;

    /// <summary>Where the formulas of its sentence are evaluated: the design as stated, or the worst case where the rule applies only there.</summary>
    internal Scope Scope { get; init; }

    /// <summary>Where in the design to look: the first input that can put it right, else the subject itself.</summary>
    public SourceSpan Location => FindingPlace.Of(this);

    /// <summary>The same finding with a departure that accepts it.</summary>
    internal Finding With(Departure departure) => new(Rule, Subject, Judgement)
    {
        Departure = departure,
        WorstCase = WorstCase,
        Share = Share,
        IsUnproven = IsUnproven,
        Scope = Scope,
    };
}
