using Auditor.Documents;

namespace Auditor.Reports.Files;

/// <summary>All wordings of the stage that writes report files.</summary>
internal static class FileMessages
{
    public static Problem UnknownEnding(string path, IEnumerable<string> endings) => Problem.Error(
        "unknown-report-format", $"{ProblemText.Quote(path)} has no ending that names a report format", null,
        "known endings: " + string.Join(", ", endings));

    public static Problem NeedsAudit(string ending, string name) => Problem.Error(
        "report-needs-audit", $"{ending} is written of an audit, and {ProblemText.Quote(name)} is a findings file", null, "name the design file");

    public static Problem IsFolder(string path) => NotWritten(path, "it is a folder", "give the name of a file");

    public static Problem NoFolder(string path) => NotWritten(path, "its folder does not exist", "make the folder first");

    public static Problem Failed(string path, string reason) =>
        NotWritten(path, reason, "write to another folder, or put right what stands in the way");

    private static Problem NotWritten(string path, string reason, string? help) => Problem.Error(
        "report-not-written", $"{ProblemText.Quote(path)} cannot be written: {reason}; what was there is unchanged", null, help);
}
