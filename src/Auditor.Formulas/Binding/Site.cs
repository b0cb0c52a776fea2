using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Binding;

/// <summary>Where a part of a formula looks from while it is bound.</summary>
/// <param name="Shape">Shape of the subject whose bare names are meant.</param>
/// <param name="Route">How to get there from the formula's own subject; null at that subject.</param>
/// <param name="Outer">Site outside the aggregate; null at the top.</param>
internal sealed record Site(SubjectShape Shape, Route? Route, Site? Outer)
{
    /// <summary>Set when something inside an aggregate reaches out of it.</summary>
    public bool UsesOuter { get; set; }

    /// <summary>The site at the end of a way.</summary>
    public Site At(Way way, SubjectShape target) => new(target, new Route(Route, Shape, way, null), null);

    /// <summary>The site of the items of a collection.</summary>
    public Site In(SubjectList list) => new(list.Items, new Route(Route, Shape, null, list), this);
}
