using Auditor.Documents;

namespace Auditor.Cli.Commands;

/// <summary>All wordings about arguments of the command line.</summary>
internal static class CommandMessages
{
    public static Problem OutputLost(string reason) => Problem.Error(
        "output-lost", $"standard output cannot be written: {reason.TrimEnd('.').ToLowerInvariant()}", null,
        "nothing that was printed counts as whole; make room where it goes, or send it elsewhere");

    public static Problem NoDesigns(string folder) => Problem.Error(
        "no-designs", $"there is no design file below `{folder}`", null, "design files are called `*.design.yaml`");

    public static Problem UnreadableFolder(string folder) => Problem.Error(
        "folder-unreadable", $"a folder in `{folder}` cannot be looked into, so that a design in it would be passed over", null, "check its permissions, or name the designs one by one");

    public static Problem NotDate(string text) => Problem.Error(
        "not-a-date", $"`{text}` is not a day of the calendar", null, "write `--as-of` as year, month and day, for example 2026-09-14");

    public static Problem UnknownSubject(string key, string? nearest) => Problem.Error(
        "unknown-subject", $"the design has no subject `{key}`", null, nearest is null ? "write board/circuit, or `-` for the installation" : $"did you mean `{nearest}`?");

    public static Problem NotAdjustable(string path, string? nearest, IEnumerable<string> known) => Problem.Error(
        "not-adjustable", $"the rule set has no adjustment of `{path}`", null,
        (nearest is null ? "" : $"did you mean `{nearest}`? ") + "adjustable: " + string.Join(", ", known));

    public static Problem UnknownLimitsFormat(string path, IEnumerable<string> endings) => Problem.Error(
        "unknown-report-format", $"`{path}` has no ending that names a format of limits", null, "known endings: " + string.Join(", ", endings));

    public static Problem UnknownRemediesFormat(string path, IEnumerable<string> endings) => Problem.Error(
        "unknown-report-format", $"`{path}` has no ending that names a format of remedies", null, "known endings: " + string.Join(", ", endings));

    public static Problem PatchOfMany(string path) => Problem.Error(
        "patch-of-many", $"`{path}` can hold the remedy of one finding only", null, "name the finding by its key, as `auditor remedies DESIGN` lists it");

    public static Problem UnknownFinding(string key, string? nearest) => Problem.Error(
        "unknown-finding", $"the audit has no finding `{key}`", null,
        nearest is null ? "write `rule:subject`, as the report does" : $"did you mean `{nearest}`?");

    public static Problem NothingToRemedy(string key, string verdict) => Problem.Error(
        "nothing-to-remedy", $"the finding `{key}` is {verdict}", null, "remedies are sought for what is nonconforming or unproven");

    public static Problem NoSuchRemedy(string key, int number, int count) => Problem.Error(
        "no-such-remedy", $"the finding `{key}` has no remedy number {number}", null,
        count == 0 ? "no proven remedy was found for it" : $"it has {count}: choose one with `--number`");

    public static Problem PatchNotProven(string key) => Problem.Error(
        "patch-not-proven", $"the audit of the patched design does not put `{key}` right, so no patch was written", null,
        "this is a fault of auditor; make the change by hand and audit again");

    public static Problem NotSamples(int samples, int most) => Problem.Error(
        "not-a-count", $"{samples} samples cannot be drawn", null, $"give `--sample` a number from 1 to {most}");

    public static Problem ManyIntoOne(string path) => Problem.Error(
        "many-designs-one-file", $"several designs cannot share one `{path}`", null,
        "name one design, or write `{name}` in the path: it stands for the path of each design without `.design.yaml`");

    public static Problem UnknownKey(string key, string? nearest) => Problem.Error(
        "unknown-key", $"the audit has neither a finding nor a quantity `{key}`", null,
        nearest is null ? "write `rule:subject` or `subject symbol`, as the report does" : $"did you mean `{nearest}`?");

    public static Problem UnknownRule(string id, string? nearest) => Problem.Error(
        "unknown-rule", $"the rule set has no rule `{id}`", null, nearest is null ? "see `auditor rules list`" : $"did you mean `{nearest}`?");

    public static Problem UnknownSchema(string name, IEnumerable<string> known) => Problem.Error(
        "unknown-schema", $"there is no schema `{name}`", null, "schemas: " + string.Join(", ", known));

    public static Problem UnreachableRuleSet(SourceSpan span, string path) => Problem.Error(
        "rule-set-outside", $"the rule set `{path}` lies outside the folder of the design and the folder auditor runs in, or is reached by a symbolic link", span,
        "keep the firm's set in the repository, or name it with --rules");
}
