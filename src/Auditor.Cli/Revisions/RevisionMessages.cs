using Auditor.Documents;

namespace Auditor.Cli.Revisions;

/// <summary>All wordings of the stage that reads what is to be compared.</summary>
internal static class RevisionMessages
{
    public static Problem NoGit(string argument) => Problem.Error(
        "git-missing", $"{ProblemText.Quote(argument)} names a revision, and there is no git program to read it with", null,
        "install git, or name a design or findings file");

    public static Problem NoRepository(string argument) => Problem.Error(
        "git-no-repository", $"{ProblemText.Quote(argument)} names a revision, and the current folder belongs to no git repository that may be read", null,
        "run auditor in the folder of the repository; `git status` tells what git thinks of it");

    public static Problem UnknownRevision(string revision) => Problem.Error(
        "unknown-revision", $"the repository has no revision {ProblemText.Quote(revision)}", null,
        "name a branch, a tag or a commit, as in `main:site.design.yaml`; `git log --oneline` lists commits");

    public static Problem UnknownPath(string revision, string path, string? nearest) => Problem.Error(
        "unknown-path", $"there is no file {ProblemText.Quote(path)} in revision {ProblemText.Quote(revision)}", null,
        nearest is null
            ? "paths count from the top of the repository, or from the current folder when they start with `./`"
            : $"did you mean {ProblemText.Quote(nearest)}?");

    public static Problem TooMuch(string revision, int files, long megabytes) => Problem.Error(
        "revision-too-large", $"revision {ProblemText.Quote(revision)} holds more than {files} YAML and JSON files, or more than {megabytes} MiB of them", null,
        "check the revision out, and name the design file there");

    public static Problem NotRead(string revision) => Problem.Error(
        "revision-unreadable", $"git cannot read the files of revision {ProblemText.Quote(revision)}", null, "`git fsck` tells what is wrong with the repository");

    public static Problem NotWritten(string revision) => Problem.Error(
        "revision-unwritten", $"the files of revision {ProblemText.Quote(revision)} cannot be put into a temporary folder", null,
        "make room in the folder for temporary files, or name another with TMPDIR");
}
