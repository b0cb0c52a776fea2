using Auditor.Documents;
using Auditor.Engine.Departures;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Findings;

/// <summary>What one rule says of one subject of a design.</summary>
public sealed class Finding
{
    private string? _message;

    internal Finding(Rule rule, DesignSubject subject, Judgement judgement, Departure? departure = null)
    {
        Rule = rule;
        Subject = subject;
        Judgement = judgement;
        Departure = departure;
        Verdict = departure is null ? judgement.Verdict!.Value : Verdict.Departed;
    }

    /// <summary>The rule.</summary>
    public Rule Rule { get; }

    /// <summary>The subject.</summary>
    public DesignSubject Subject { get; }

    /// <summary>Value, limits, margin and what is missing.</summary>
    public Judgement Judgement { get; }

    /// <summary>The departure in force that accepts it; null for none.</summary>
    public Departure? Departure { get; }

    /// <summary>The verdict.</summary>
    public Verdict Verdict { get; }

    /// <summary>Stable key: it depends on the rule and the subject alone.</summary>
    public string Key => $"{Rule.Id}:{Subject.Key}";

    /// <summary>Whether the verdict hangs on an input marked as assumed.</summary>
    public bool OnAssumption => Judgement.Marks.HasFlag(Marks.Assumed);

    /// <summary>Whether the verdict hangs on a figure entered from memory.</summary>
    public bool FromMemory => Judgement.Marks.HasFlag(Marks.FromMemory);

    /// <summary>The verdict in words, with the assumption that it hangs on.</summary>
    public string VerdictText => Verdict == Verdict.Conforms && OnAssumption ? "conforms, on assumption" : Verdict.Word();

    /// <summary>The value as shown; empty where nothing is compared.</summary>
    public string ValueShown => Rule.Check.How == CheckKind.Require ? "" : ValueText.Show(Judgement.Value, Rule.Check.Unit);

    /// <summary>The limit as shown, with its sense; empty where nothing is compared.</summary>
    public string LimitShown => LimitText.Show(Rule.Check, Judgement);

    /// <summary>Distance to the limit in the unit of the value; null where nothing was measured.</summary>
    public string? MarginShown => Judgement.Margin is { } margin ? ValueText.ShowNumber(margin.Absolute, MarginUnit.Of(Rule.Check.Unit!)) : null;

    /// <summary>The sentence of the finding.</summary>
    public string Message => _message ??= SentenceWriter.Write(this);

    /// <summary>Where in the design to look: the first input that can put it right, else the subject itself.</summary>
    public SourceSpan Location => FindingPlace.Of(this);
}
