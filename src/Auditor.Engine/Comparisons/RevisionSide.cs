using Auditor.Engine.Evidence;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.Comparisons;

/// <summary>One audit while the causes of changes are looked for.</summary>
internal sealed class RevisionSide
{
    private readonly Dictionary<DesignSubject, RevisionSubject> _subjects = [];
    private readonly Dictionary<DesignSubject, DesignSubject> _partners = [];

    /// <summary>Makes a side.</summary>
    /// <param name="revision">The revision, with its audit.</param>
    /// <param name="partner">The subject of the other revision that a subject is.</param>
    /// <param name="isLater">Whether it is the later revision.</param>
    public RevisionSide(Revision revision, Func<RevisionSubject, RevisionSubject?> partner, bool isLater)
    {
        Rules = revision.Audit!.Rules;
        IsLater = isLater;
        foreach (var subject in revision.Subjects)
        {
            _subjects.Add(subject.Source!, subject);
            if (partner(subject)?.Source is { } other)
            {
                _partners.Add(subject.Source!, other);
            }
        }
    }

    /// <summary>The rule set.</summary>
    public RuleSet Rules { get; }

    /// <summary>Whether it is the later revision.</summary>
    public bool IsLater { get; }

    /// <summary>A subject as it is compared.</summary>
    public RevisionSubject Of(DesignSubject subject) => _subjects[subject];

    /// <summary>The subject of the other revision that a subject is; null for one that was added or removed.</summary>
    public DesignSubject? PartnerOf(DesignSubject subject) => _partners.GetValueOrDefault(subject);

    /// <summary>The definition of a quantity at a subject; null where the rule set has none.</summary>
    public QuantityDefinition? Definition(DesignSubject subject, string symbol) =>
        subject.Shape.Quantity(symbol) is { } slot ? Rules.Quantity(subject.Shape, slot.Index) : null;

    /// <summary>What a formula reads at a subject; nothing where there is no formula.</summary>
    public static IReadOnlyList<Tracer.Reading> Readings(Formula? formula, DesignSubject subject)
    {
        var tracer = new Tracer();
        formula?.Evaluate(new Scope(subject, null, tracer));
        return tracer.Readings;
    }
}
