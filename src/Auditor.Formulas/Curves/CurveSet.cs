using Auditor.Formulas.Values;

namespace Auditor.Formulas.Curves;

/// <summary>All curves of a rule set; a later set's curve goes before an earlier one's.</summary>
public sealed class CurveSet
{
    private readonly List<Curve> _curves = [];

    /// <summary>All curves.</summary>
    public IReadOnlyList<Curve> All => _curves;

    /// <summary>Adds a curve in front of those already there.</summary>
    public void Add(Curve curve) => _curves.Insert(0, curve);

    /// <summary>The curve for a device, or null.</summary>
    public Curve? Find(string standard, string type) =>
        _curves.Find(curve => curve.Standards.Contains(standard) && (curve.Type is null || curve.Type == type));

    /// <summary>The value that stands for a curve that is not held.</summary>
    public static Value None(string standard, string type) =>
        Value.Missing(new Absence(
            AbsenceKind.Curve, "", standard, $"no time-current curve is held for {standard}{(type == "any" ? "" : " type " + type)}", "give the maker's own figure"));
}
