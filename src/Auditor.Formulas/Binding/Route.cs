using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Binding;

/// <summary>How a formula gets from its own subject to one that it reads: one way or one collection after another.</summary>
/// <param name="Before">The steps before this one; null where it is the first.</param>
/// <param name="From">Shape of the subject that the step is taken from.</param>
/// <param name="Way">The way taken; null for a collection.</param>
/// <param name="List">The collection gone through; null for a way.</param>
public sealed record Route(Route? Before, SubjectShape From, Way? Way, SubjectList? List)
{
    /// <summary>Towards the origin, towards the loads, or both in one chain.</summary>
    public Direction Direction => (Before?.Direction ?? Direction.Same) | (Way?.Direction ?? Direction.Down);
}
