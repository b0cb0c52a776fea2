namespace Auditor.Engine.Limits;

/// <summary>A stretch of values at which several rules are all kept.</summary>
/// <param name="Least">What bounds it below; null for nothing.</param>
/// <param name="Most">What bounds it above; null for nothing.</param>
public sealed record AllowedRange(LimitBound? Least, LimitBound? Most)
{
    /// <summary>How far a place lies outside of it.</summary>
    internal double Distance(double position) =>
        Math.Max(0, Math.Max(Least is null ? 0 : Least.Edge.Position - position, Most is null ? 0 : position - Most.Edge.Position));
}
