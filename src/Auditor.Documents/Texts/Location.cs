using System.Runtime.InteropServices;

namespace Auditor.Documents;

/// <summary>A place in a text as people name it.</summary>
/// <param name="Line">The line, counted from 1. CR, LF and CR LF each end a line.</param>
/// <param name="Column">The column, counted from 1 in UTF-16 code units; a tab is one column.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct Location(int Line, int Column)
{
    /// <summary>Returns the place as <c>line:column</c>.</summary>
    public override string ToString() => $"{Line}:{Column}";
}
