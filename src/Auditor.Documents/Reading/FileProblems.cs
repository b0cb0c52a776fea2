namespace Auditor.Documents;

/// <summary>The wording of all problems of files and of including one in another.</summary>
internal static class FileProblems
{
    public static Problem Missing(SourceSpan span)
        => Problem.Error("file-missing", "there is no such file", span, "check the spelling of the path, letter case included");

    public static Problem Unreadable(SourceSpan span)
        => Problem.Error("file-unreadable", "the file cannot be opened for reading", span, "check its permissions, and that no other program holds it");

    public static Problem IsFolder(SourceSpan span)
        => Problem.Error("file-is-folder", "this is a folder, not a file", span, "name the file in it that is meant");

    public static Problem TooLarge(SourceSpan span, long limit)
        => Problem.Error("too-large", $"the file, with what it includes, is larger than {limit / 1024.0 / 1024.0:0.###} MiB", span,
            "divide the installation into several designs");

    public static Problem IsUtf16(SourceSpan span)
        => Problem.Error("not-utf-8", "the file is written in UTF-16", span, "save it as UTF-8");

    public static Problem NotUtf8(SourceSpan span, byte value)
        => Problem.Error("not-utf-8", $"the byte 0x{value:X2} here is not UTF-8", span, "save the file as UTF-8; `²`, `Ω` and `°` in another encoding are the usual cause");

    public static Problem IncludeIsNoPath(SourceSpan span)
        => Problem.Error("include-path", "`include` takes the path of one file", span, "write for example `include: boards/pontoon.board.yaml`");

    public static Problem IncludeBackslash(SourceSpan span, string path)
        => Problem.Error("include-path", $"the path `{path}` has backslashes", span, $"write `{path.Replace('\\', '/')}`");

    public static Problem IncludeAbsolute(SourceSpan span, string path)
        => Problem.Error("include-outside", $"the path `{path}` does not start from this file's folder", span,
            "write the path relative to the file that it stands in");

    public static Problem IncludeOutside(SourceSpan span, string path)
        => Problem.Error("include-outside", $"`{path}` leads out of the folder of the top file", span,
            "move the file into that folder or below; a link or `..` must not lead out of it either");

    public static Problem IncludeMissing(SourceSpan span, string path)
        => Problem.Error("include-missing", $"there is no file `{path}` to include", span,
            "check the spelling, letter case included; the path is relative to the file that it stands in");

    public static Problem IncludesItself(SourceSpan span, string path)
        => Problem.Error("include-loop", $"the file includes itself by `{path}`", span, "remove the `include`");

    public static Problem IncludeLoop(SourceSpan span, string path, IReadOnlyList<ProblemLabel> way)
        => Problem.Error("include-loop", $"`{path}` is already being included: the files include each other", span, "remove one of the `include` keys of the loop", way);

    public static Problem IncludeTooDeep(SourceSpan span, int limit)
        => Problem.Error("include-too-deep", $"files include one another more than {limit} deep", span, "include the file from higher up");

    public static Problem TooManyFiles(SourceSpan span, int limit)
        => Problem.Error("too-many-files", $"more than {limit:N0} files are included", span, "divide the installation into several designs");

    public static Problem IncludedIsNoMapping(SourceSpan span, SourceSpan root)
        => Problem.Error("include-no-mapping", "the included file does not hold keys that could stand here", span,
            "an included file is a list of `key: value` lines", new ProblemLabel(root, "the included file starts here"));

    public static Problem KeyAlsoIncluded(Located<string> key, SourceSpan included, SourceSpan include)
        => Problem.Error("duplicate-key", $"the key `{key.Value}` is said here and in the included file", key.Span, "keep one of the two",
            new ProblemLabel(include, "included here"), new ProblemLabel(included, "also said here"));
}
