using Auditor.Formulas.Values;

namespace Auditor.Formulas.Curves;

/// <summary>All curves of a rule set; a later set's curve goes before an earlier one's, a curve of a type before one of any type.</summary>
public sealed class CurveSet
{
    private readonly List<(Curve Curve, int Set)> _curves = [];

    /// <summary>All curves, those that go before others first.</summary>
    public IReadOnlyList<Curve> All => [.. _curves.Select(entry => entry.Curve)];

    /// <summary>Adds a curve: behind those of later sets; within a set, behind those of a given type when it is of any type.</summary>
    /// <param name="curve">The curve.</param>
    /// <param name="set">Number of its set in the chain.</param>
    /// <returns>A curve of the same set that is called the same or holds for the same devices; null, and the curve added, when there is none.</returns>
    public Curve? Add(Curve curve, int set)
    {
        var rival = _curves.Find(entry => entry.Set == set && IsRival(entry.Curve, curve)).Curve;
        if (rival is null)
        {
            var place = _curves.FindIndex(entry => entry.Set < set || (entry.Set == set && entry.Curve.Type is null && curve.Type is not null));
            _curves.Insert(place < 0 ? _curves.Count : place, (curve, set));
        }

        return rival;
    }

    /// <summary>The curves that go before one of an earlier set for some device, with that one and the number of their set.</summary>
    public IEnumerable<(Curve Later, Curve Earlier, int Set)> Hidden() =>
        from later in _curves
        from earlier in _curves
        where earlier.Set < later.Set && (later.Curve.Type is null || earlier.Curve.Type is null || later.Curve.Type == earlier.Curve.Type)
            && later.Curve.Standards.Intersect(earlier.Curve.Standards, StringComparer.Ordinal).Any()
        select (later.Curve, earlier.Curve, later.Set);

    /// <summary>The curve for a device, or null.</summary>
    public Curve? Find(string standard, string type)
    {
        foreach (var (curve, _) in _curves)
        {
            if ((curve.Type is null || curve.Type == type) && curve.Standards.Contains(standard))
            {
                return curve;
            }
        }

        return null;
    }

    private static bool IsRival(Curve a, Curve b) =>
        a.Source.Id == b.Source.Id || (a.Type == b.Type && a.Standards.Any(standard => b.Standards.Contains(standard)));

    /// <summary>The value that stands for a curve that is not held.</summary>
    public static Value None(string standard, string type) =>
        Value.Missing(new Absence(
            AbsenceKind.Curve, "", standard, $"no time-current curve is held for {standard}{(type == "any" ? "" : " type " + type)}", "give the maker's own figure"));
}
