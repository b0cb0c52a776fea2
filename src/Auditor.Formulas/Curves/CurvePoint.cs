using System.Runtime.InteropServices;

namespace Auditor.Formulas.Curves;

/// <summary>A point of a time-current curve.</summary>
/// <param name="Current">Multiple of the rated current, or amperes, as the curve says.</param>
/// <param name="Time">Seconds.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct CurvePoint(double Current, double Time);
