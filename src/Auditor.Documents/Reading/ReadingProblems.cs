namespace Auditor.Documents;

/// <summary>The wording of all problems of reading a file and refusing what a design file may not use.</summary>
internal static class ReadingProblems
{
    public static Problem Empty(SourceText source)
        => Problem.Error("empty-file", "the file says nothing", new SourceSpan(source, 0, 0), "a document with at least one `key: value` line is expected; pipes and devices are not read");

    public static Problem ForbiddenCharacter(SourceSpan span)
        => Problem.Error("forbidden-character", $"the character U+{(int)span.Source.Text[span.Start]:X4} has no place in a text file", span,
            "delete it; only tab and line breaks are allowed besides what can be seen");

    public static Problem ForbiddenEscape(SourceSpan span, char character)
        => Problem.Error("forbidden-character", $"the text stands for the character U+{(int)character:X4}, which cannot be shown", span,
            "leave the escape out");

    public static Problem Directive(SourceSpan span)
        => Problem.Error("directive", "directives such as %YAML are not used here", span, "remove the line; files are read as YAML 1.2");

    public static Problem SecondDocument(SourceSpan span)
        => Problem.Error("second-document", "a second document starts here, but a file holds one", span,
            "move it to a file of its own, or remove the `---` or `...` line");

    public static Problem Anchor(SourceSpan span)
        => Problem.Error("anchor", $"anchors such as `{span.Text}` are not used here", span,
            "remove it; say a thing once as a named type, or in a file of its own that is included");

    public static Problem Alias(SourceSpan span)
        => Problem.Error("alias", $"aliases such as `{span.Text}` are not used here", span,
            "write the value out; say a thing once as a named type, or in a file of its own that is included");

    public static Problem MergeKey(SourceSpan span)
        => Problem.Error("merge-key", "the merge key `<<` is not used here", span,
            "write the keys out; say a thing once as a named type, or in a file of its own that is included");

    public static Problem ForeignTag(SourceSpan span)
        => Problem.Error("tag", $"the tag `{span.Text}` is not used here", span, "remove it; values are told apart by the way they are written");

    public static Problem TagDoesNotFit(SourceSpan span)
        => Problem.Error("tag", $"the tag `{span.Text}` does not fit the value", span, "remove it, or write a value of that kind");

    public static Problem KeyIsNoText(SourceSpan span)
        => Problem.Error("key-is-no-text", "a key must be a single word or text", span, "a list or a mapping cannot be a key");

    public static Problem DuplicateKey(Located<string> key, SourceSpan first)
        => Problem.Error("duplicate-key", $"the key `{key.Value}` is said twice", key.Span, "keep one of the two", new ProblemLabel(first, "first said here"));

    public static Problem TooDeep(SourceSpan span, int limit)
        => Problem.Error("too-deep", $"values lie more than {limit} deep in one another", span, "nothing that can be described here needs it: look for brackets that are not closed");

    public static Problem TooManyValues(SourceSpan span, int limit)
        => Problem.Error("too-large", $"the document states more than {limit:N0} values", span, "divide the installation into several designs");
}
