using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Binding;

/// <summary>Where a part of a formula looks from while it is bound.</summary>
/// <param name="Shape">Shape of the subject whose bare names are meant.</param>
/// <param name="Direction">Way taken so far from the formula's own subject.</param>
/// <param name="Outer">Site outside the aggregate; null at the top.</param>
internal sealed record Site(SubjectShape Shape, Direction Direction, Site? Outer)
{
    /// <summary>Set when something inside an aggregate reaches out of it.</summary>
    public bool UsesOuter { get; set; }
}
