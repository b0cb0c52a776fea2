using Auditor.Documents;

namespace Auditor.Reports.Json;

/// <summary>All wordings of the stage that reads findings files.</summary>
internal static class FindingsMessages
{
    private const string Help = "write the file anew with `auditor audit … --write`";

    public static Problem ListedTwice(SourceSpan span, string what, string name) => Problem.Error(
        "findings-listed-twice", $"this file lists the {what} {ProblemText.Quote(name)} a second time", span, Help);

    public static Problem UnknownSubject(SourceSpan span, string subject) => Problem.Error(
        "findings-unknown-subject", $"this file does not list the subject {ProblemText.Quote(subject)}", span, Help);
}
