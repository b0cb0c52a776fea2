using System.Runtime.InteropServices;

namespace Auditor.Documents;

/// <summary>A value together with the place that states it. Two are equal when their values are equal, wherever they stand.</summary>
/// <typeparam name="T">The type of the value.</typeparam>
/// <param name="Value">The value.</param>
/// <param name="Span">Where it is stated.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct Located<T>(T Value, SourceSpan Span)
{
    /// <summary>Tells whether the values are equal; the places do not count.</summary>
    public bool Equals(Located<T> other) => EqualityComparer<T>.Default.Equals(Value, other.Value);

    /// <inheritdoc/>
    public override int GetHashCode() => Value is null ? 0 : EqualityComparer<T>.Default.GetHashCode(Value);

    /// <summary>Returns the value as text.</summary>
    public override string ToString() => Value?.ToString() ?? "";
}
