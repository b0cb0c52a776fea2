using Auditor.Documents;

namespace Auditor.Reports.Files;

/// <summary>All wordings of the stage that writes report files.</summary>
internal static class FileMessages
{
    public static Problem UnknownEnding(string path, IEnumerable<string> endings) => Problem.Error(
        "unknown-report-format", $"{ProblemText.Quote(path)} has no ending that names a report format", null, "known endings: " + string.Join(", ", endings));
}
