using Auditor.Documents;

namespace Auditor.Reports.Json;

/// <summary>All wordings of the stage that reads findings files.</summary>
internal static class FindingsMessages
{
    private const string Help = "write the file anew with `auditor audit … --write`";

    public static Problem ListedTwice(SourceSpan span, string what, string name) => Problem.Error(
        "findings-listed-twice", $"this file lists the {what} {ProblemText.Quote(name)} a second time", span, Help);

    public static Problem NotListed(SourceSpan span, string what, string name) => Problem.Error(
        "findings-not-listed", $"this file does not list the {what} {ProblemText.Quote(name)}", span, Help);
}
