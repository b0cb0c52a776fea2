using System.Runtime.InteropServices;

namespace Auditor.Documents;

/// <summary>A second place that helps to understand a problem.</summary>
/// <param name="Span">The place.</param>
/// <param name="Text">What the place has to do with the problem.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct ProblemLabel(SourceSpan Span, string Text);
