using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Model;

/// <summary>
/// Unfolds findings down to the lines of the design and the cells of the tables. Each quantity is told once, whichever findings rest on
/// it. The findings that most need it come first, until the report has got as large as it may.
/// </summary>
internal sealed class WorkingsBuilder
{
    /// <summary>Sums over many circuits rest on more inputs than anyone reads in one place; the workings name them all.</summary>
    private const int MostListed = 24;

    private readonly AuditResult _result;
    private readonly EvidenceBuilder _evidence;
    private readonly Dictionary<string, Derivation> _told = new(StringComparer.Ordinal);
    private readonly Dictionary<string, string> _anchors = new(StringComparer.Ordinal);
    private readonly Dictionary<Finding, ReportDerivation> _derivations = [];
    private readonly Leaves _leaves;
    private readonly SourceReader _sources;
    private readonly PageBudget _budget;
    private readonly Places _places;

    /// <summary>Unfolds the findings of an audit.</summary>
    /// <param name="result">The audit.</param>
    /// <param name="places">Names places.</param>
    /// <param name="pictures">Characters of the pictures on the same page.</param>
    public WorkingsBuilder(AuditResult result, Places places, int pictures)
    {
        _result = result;
        _places = places;
        _evidence = new EvidenceBuilder(result.Rules);
        _leaves = new Leaves(_told);
        _sources = new SourceReader(places, _anchors);
        _budget = PageBudget.For(result.Findings.Count, pictures);
        foreach (var finding in result.Findings.OrderBy(Need.OfDerivation).TakeWhile(_ => _budget.IsLeft))
        {
            _derivations.Add(finding, Unfold(finding));
        }
    }

    /// <summary>The derivation of a finding; null where the report has no room for it.</summary>
    public ReportDerivation? Of(Finding finding) => _derivations.GetValueOrDefault(finding);

    /// <summary>The workings that the derivations rest on.</summary>
    public ReportWorkings All()
    {
        var definitions = new DefinitionList(_result.Rules, _places);
        var bySubject = _anchors.Keys.Select(label => _told[label]).ToLookup(derivation => derivation.Subject, StringComparer.Ordinal);
        SubjectWorkings[] subjects = [.. _result.Design.Subjects.Where(subject => bySubject.Contains(subject.Key)).Select(Workings)];
        return new ReportWorkings(subjects, definitions.All, _derivations.Count, _result.Findings.Count - _derivations.Count);

        SubjectWorkings Workings(DesignSubject subject, int index) => new(
            $"s{index}", SubjectText.Label(subject),
            [.. bySubject[subject.Key].OrderBy(derivation => subject.Shape.Quantity(derivation.Symbol)!.Index)
                .Select(derivation => Working(derivation, definitions.AnchorOf(subject, derivation.Symbol)))]);
    }

    private ReportDerivation Unfold(Finding finding)
    {
        var parts = _evidence.Of(finding);
        foreach (var source in parts.SelectMany(part => part.From))
        {
            Remember(source);
        }

        Show(parts);
        var condition = parts.FirstOrDefault(part => part.Symbol == "applies");
        var leaves = _leaves.Of(parts.Where(part => part != condition)).ToLookup(leaf => leaf.Kind == EvidenceKind.Input);
        var quantities = parts.SelectMany(part => part.From).Where(source => source.Kind == EvidenceKind.Quantity).DistinctBy(source => source.Label);
        var derivation = new ReportDerivation(
            condition is null ? "" : $"{condition.Formula} = {condition.WithNumbers}", [.. quantities.Select(_sources.Read)],
            [.. leaves[true].Take(MostListed).Select(_sources.Read)], Math.Max(0, leaves[true].Count() - MostListed),
            [.. leaves[false].Take(MostListed).Select(_sources.Read)], Math.Max(0, leaves[false].Count() - MostListed));
        _budget.Spend(derivation);
        return derivation;
    }

    private void Remember(EvidenceSource source)
    {
        if (source.Derivation is { } derivation)
        {
            _told.Add(source.Label, derivation);
            foreach (var inner in derivation.From)
            {
                Remember(inner);
            }
        }
    }

    /// <summary>Takes the quantities behind a finding into the report, the nearest first, as far as its share of the room goes.</summary>
    private void Show(IReadOnlyList<Derivation> parts)
    {
        var share = _budget.ShareOfOne;
        var open = new Queue<EvidenceSource>(parts.SelectMany(part => part.From));
        while (share > 0 && open.TryDequeue(out var source))
        {
            if (source.Kind != EvidenceKind.Quantity || _anchors.ContainsKey(source.Label) || !_told.TryGetValue(source.Label, out var derivation))
            {
                continue;
            }

            _anchors.Add(source.Label, $"w{_anchors.Count}");
            share -= _budget.Spend(derivation);
            derivation.From.ToList().ForEach(open.Enqueue);
        }
    }

    private ReportWorking Working(Derivation derivation, string definition)
    {
        var saysMore = derivation.WithNumbers != derivation.Formula && derivation.WithNumbers.Trim('(', ')') != derivation.Value;
        return new ReportWorking(
            _anchors[$"{derivation.Subject} {derivation.Symbol}"], derivation.Symbol, derivation.Name, derivation.Value, derivation.Formula,
            saysMore ? derivation.WithNumbers : "", definition, [.. derivation.From.Select(_sources.Read)]);
    }
}
