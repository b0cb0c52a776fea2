namespace Auditor.Quantities;

/// <summary>A tolerance as it was stated.</summary>
/// <param name="Below">The number after the minus sign, zero or more.</param>
/// <param name="Above">The number after the plus sign, zero or more; the same as <paramref name="Below"/> after ±.</param>
/// <param name="Unit">The unit of both; per cent for a share of the value.</param>
public readonly record struct WrittenTolerance(double Below, double Above, Unit Unit);
