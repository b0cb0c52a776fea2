using Auditor.Documents;

namespace Auditor.Cli.Starting;

/// <summary>All wordings about design files that are to be made.</summary>
internal static class StartMessages
{
    public static Problem IsThere(string path) => Problem.Error(
        "file-is-there", $"{ProblemText.Quote(path)} is there already, and stays as it is", null, "choose another name, or move the file away first");

    public static Problem UnknownPhases(int phases) => Problem.Error(
        "unknown-phases", $"a supply has 1 or 3 phases, not {phases}", null, "write `--phases 1` or `--phases 3`");
}
