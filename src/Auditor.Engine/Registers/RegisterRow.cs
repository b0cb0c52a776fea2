namespace Auditor.Engine.Registers;

/// <summary>One checkable requirement of the wiring rules, in words of our own.</summary>
/// <param name="Id">Lasting id, named by rules that decide it.</param>
/// <param name="Part">Part of the wiring rules.</param>
/// <param name="Requirement">What must or should hold.</param>
/// <param name="Decidable"><c>quantitative</c>, <c>categorical</c>, or <c>judgement</c>: only a person can decide.</param>
public sealed record RegisterRow(string Id, string Part, string Requirement, string Decidable)
{
    /// <summary>Whether data alone can decide it.</summary>
    public bool IsDecidable => Decidable != "judgement";
}
