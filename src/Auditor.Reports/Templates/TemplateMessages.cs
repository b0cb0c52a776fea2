using Auditor.Documents;

namespace Auditor.Reports.Templates;

/// <summary>All wordings of the stage that writes reports from templates.</summary>
internal static class TemplateMessages
{
    public static Problem Syntax(SourceSpan span, string message) => Problem.Error(
        "template-syntax", Sentence(message), span, "templates are written in the Scriban language");

    public static Problem Fault(SourceSpan span, string message) =>
        message.Contains("limit", StringComparison.OrdinalIgnoreCase)
            ? Limit(span, Sentence(message))
            : Problem.Error("template-fault", Sentence(message), span);

    public static Problem TooMuch(SourceSpan span, long most) => Limit(span, $"this template evaluates more than {most} terms");

    public static Problem TooLong(SourceSpan span, TimeSpan most) => Limit(span, $"this template takes more than {most.TotalSeconds:0} s");

    public static Problem NoTextHere(SourceSpan span) => Problem.Error(
        "template-place", "text from a design cannot stand here: a browser would not take it for text", span,
        "insert it between tags, or in a quoted attribute that is no script, style or policy; an address must begin with #");

    public static Problem NoMarkupHere(SourceSpan span) => Problem.Error(
        "template-place", "markup cannot stand here", span, "insert it between tags, outside scripts, styles and comments");

    public static Problem NoFileHere(SourceSpan span) => Problem.Error(
        "template-place", "a file cannot stand here", span, "insert it between <style> and </style>, or <script> and </script>");

    public static Problem ClosesElement(SourceSpan span, string name) => Problem.Error(
        "template-place", $"{ProblemText.Quote(name)} holds an end tag or a comment of HTML", span, "write </ as <\\/ in a script, and leave out <!--");

    public static Problem UnknownMember(SourceSpan span, string name, string? nearest, IReadOnlyCollection<string> known) => Problem.Error(
        "template-unknown-name", $"there is no `{name}` here", span,
        (nearest is null ? "" : $"did you mean `{nearest}`? ") + (known.Count == 0 ? "it has no members" : "there are: " + string.Join(", ", known)));

    public static Problem UnknownVariable(SourceSpan span, string name, string? nearest) => Problem.Error(
        "template-unknown-name", $"`{name}` is not defined", span,
        nearest is null ? "everything to show is under `report`" : $"did you mean `{nearest}`?");

    public static Problem OutsideFolder(SourceSpan span, string name) => Problem.Error(
        "template-outside-folder", $"{ProblemText.Quote(name)} does not lie in the folder of the template", span,
        "include files of that folder by their relative path");

    public static Problem NotIncluded(SourceSpan span, string name) => Problem.Error(
        "template-not-included", $"{ProblemText.Quote(name)} cannot be included", span, "see the problem in that file");

    public static Problem Refused(SourceSpan span, string word) => Problem.Error(
        "template-refused", $"`{word}` is not available in report templates", span, "put the part into a file of its own and `include` it");

    public static Problem WithoutCaution(SourceSpan span) => Problem.Error(
        "template-without-caution", "this template leaves out the caution", span,
        "every report shows it: write {{ report.caution }} where it is read");

    public static Problem WithoutLoosened(SourceSpan span) => Problem.Error(
        "template-without-loosened", "this template leaves out what house rules loosen", span,
        "every report shows it where there is something: write {{ report.rule_set.loosened }} where it is read");

    private static Problem Limit(SourceSpan span, string message) => Problem.Error(
        "template-limit", message, span, "a template has bounds, so that none can hold up the program; show less, or loop over less");

    private static string Sentence(string message)
    {
        var trimmed = message.Trim().TrimEnd('.');
        return trimmed.Length == 0 ? trimmed : char.ToLowerInvariant(trimmed[0]) + trimmed[1..];
    }
}
