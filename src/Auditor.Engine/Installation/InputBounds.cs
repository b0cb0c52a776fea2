using System.Runtime.InteropServices;

namespace Auditor.Engine.Installation;

/// <summary>Between which values a quantity may lie by the design schema, in coherent units; infinite where the schema sets no bound.</summary>
/// <param name="Least">The least value.</param>
/// <param name="Most">The greatest value.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct InputBounds(double Least, double Most)
{
    /// <summary>No bounds.</summary>
    public static InputBounds None { get; } = new(double.NegativeInfinity, double.PositiveInfinity);

    /// <summary>The allowed value nearest to a number.</summary>
    public double Clamp(double number) => Math.Clamp(number, Least, Most);
}
