using System.Runtime.InteropServices;

namespace Auditor.Engine.Remedies;

/// <summary>A stretch of a text and what takes its place.</summary>
/// <param name="Start">Where the stretch begins.</param>
/// <param name="Length">How long it is; 0 to put something in.</param>
/// <param name="Text">What takes its place.</param>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct TextEdit(int Start, int Length, string Text);
