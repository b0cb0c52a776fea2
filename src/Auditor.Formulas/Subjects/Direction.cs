namespace Auditor.Formulas.Subjects;

/// <summary>Which way a formula looks from its own subject; decides whether a chain of formulas can run in a circle.</summary>
[Flags]
public enum Direction
{
    /// <summary>At the same subject.</summary>
    Same = 0,

    /// <summary>Towards the origin.</summary>
    Up = 1,

    /// <summary>Towards the loads.</summary>
    Down = 2,
}
