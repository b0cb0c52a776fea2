namespace Auditor.Documents;

/// <summary>Something that the tool could not read, check or make sense of. Never a verdict on the installation.</summary>
/// <param name="Code">A stable kebab-case word for the kind of problem.</param>
/// <param name="Severity">How grave it is.</param>
/// <param name="Message">What is wrong, in one sentence without a full stop.</param>
/// <param name="Span">Where it is wrong; null when it concerns no place in a file.</param>
/// <param name="Help">What to do about it; null when the message says it all.</param>
/// <param name="Labels">Further places that belong to the problem, in the order to show them.</param>
public sealed record Problem(
    string Code, Severity Severity, string Message, SourceSpan? Span, string? Help, IReadOnlyList<ProblemLabel> Labels)
{
    /// <summary>Makes an error.</summary>
    public static Problem Error(string code, string message, SourceSpan? span, string? help = null, params IReadOnlyList<ProblemLabel> labels)
        => new(code, Severity.Error, message, span, help, labels);

    /// <summary>Makes a warning.</summary>
    public static Problem Warning(string code, string message, SourceSpan? span, string? help = null, params IReadOnlyList<ProblemLabel> labels)
        => new(code, Severity.Warning, message, span, help, labels);
}
