using System.Runtime.InteropServices;

namespace Auditor.Engine.RuleTests;

/// <summary>A stretch of the text of a formula.</summary>
/// <param name="Start">Index of its first character.</param>
/// <param name="Text">The stretch, without blanks around it.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct FormulaPart(int Start, string Text)
{
    /// <summary>Index after its last character.</summary>
    public int End => Start + Text.Length;

    /// <summary>The stretch of a text between two indices, blanks around it taken off.</summary>
    internal static FormulaPart Of(string text, int start, int end)
    {
        var from = start;
        while (from < end && char.IsWhiteSpace(text[from]))
        {
            from++;
        }

        return new FormulaPart(from, text[from..end].TrimEnd());
    }
}
