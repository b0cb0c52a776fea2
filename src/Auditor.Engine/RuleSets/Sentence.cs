using Auditor.Formulas;

namespace Auditor.Engine.RuleSets;

/// <summary>The sentence of a rule: fixed text and formulas in turn.</summary>
/// <param name="Parts">Its parts.</param>
public sealed record Sentence(IReadOnlyList<Sentence.Part> Parts)
{
    /// <summary>A part: fixed text, or a formula, or the value or the limit of the finding.</summary>
    /// <param name="Text">Fixed text; the word <c>value</c> or <c>limit</c>; null for a formula.</param>
    /// <param name="IsPlace">Whether the text stands for the value or the limit.</param>
    /// <param name="Formula">The formula; null for text.</param>
    public sealed record Part(string? Text, bool IsPlace, Formula? Formula);
}
