namespace Auditor.Engine.Limits;

/// <summary>A stretch of values at which a rule is kept.</summary>
/// <param name="Least">Where it begins; null where it begins with the least value that the input may take.</param>
/// <param name="Most">Where it ends; null where it ends with the greatest.</param>
public sealed record KeptRange(LimitEdge? Least, LimitEdge? Most);
