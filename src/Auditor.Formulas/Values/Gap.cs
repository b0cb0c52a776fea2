using System.Runtime.InteropServices;
using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Values;

/// <summary>One thing that is missing, before anybody asks to have it in words.</summary>
/// <param name="source">The absence; or the subject that does not give an input.</param>
/// <param name="slot">Slot number of that input; 0 with an absence.</param>
[StructLayout(LayoutKind.Auto)]
internal readonly struct Gap(object source, int slot) : IEquatable<Gap>
{
    private readonly object _source = source;
    private readonly int _slot = slot;

    /// <summary>The gap in words.</summary>
    public Absence Absence => _source as Absence ?? Absence.OfInput((ISubject)_source, _slot);

    public bool Equals(Gap other) =>
        _slot == other._slot && (ReferenceEquals(_source, other._source) || (_source is Absence absence && absence.Equals(other._source as Absence)));

    public override bool Equals(object? obj) => obj is Gap other && Equals(other);

    public override int GetHashCode() => HashCode.Combine(_source, _slot);
}
