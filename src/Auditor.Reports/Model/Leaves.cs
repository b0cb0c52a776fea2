using Auditor.Engine.Evidence;

namespace Auditor.Reports.Model;

/// <summary>What values rest on in the end and can be looked up: lines of the design, cells of tables, curves and parameters.</summary>
/// <param name="workings">Derivations of quantities, by subject and symbol.</param>
internal sealed class Leaves(IReadOnlyDictionary<string, Derivation> workings)
{
    private readonly Dictionary<string, IReadOnlyList<EvidenceSource>> _known = new(StringComparer.Ordinal);

    /// <summary>The leaves of some derivations, each once, in the order in which they are met.</summary>
    public IReadOnlyList<EvidenceSource> Of(IEnumerable<Derivation> derivations) => Distinct(derivations.SelectMany(Of));

    private IReadOnlyList<EvidenceSource> Of(Derivation derivation) => Distinct(derivation.From.SelectMany(Of));

    private IReadOnlyList<EvidenceSource> Of(EvidenceSource source)
    {
        if (source.Kind != EvidenceKind.Quantity)
        {
            return source.Kind == EvidenceKind.Missing || source.Place.Length == 0 ? [] : [source];
        }

        if (!_known.TryGetValue(source.Label, out var known))
        {
            known = workings.TryGetValue(source.Label, out var derivation) ? Of(derivation) : [];
            _known.Add(source.Label, known);
        }

        return known;
    }

    private static List<EvidenceSource> Distinct(IEnumerable<EvidenceSource> sources) =>
        [.. sources.DistinctBy(source => (source.Kind, source.Label))];
}
