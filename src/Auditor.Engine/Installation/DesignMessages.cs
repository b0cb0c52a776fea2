using Auditor.Documents;

namespace Auditor.Engine.Installation;

/// <summary>All wordings of the stage that makes the tree of a design.</summary>
internal static class DesignMessages
{
    public static Problem NotMapping(SourceSpan span) => Problem.Error(
        "design-not-mapping", "a design file holds keys and values", span, "start with `design-format: 1`");

    public static Problem SecondId(SourceSpan span, string what, string id, SourceSpan first) => Problem.Error(
        "duplicate-id", $"there are two {what} `{id}`", span, "give each an id of its own", new ProblemLabel(first, "the first stands here"));

    public static Problem ReservedId(SourceSpan span, string id) => Problem.Error(
        "reserved-id", $"no board may be called `{id}`", span, "findings name the installation or its bonding conductors so; give the board another id");

    public static Problem UnknownBoard(SourceSpan span, string id, string? nearest) => Problem.Error(
        "unknown-board", $"there is no board `{id}`", span, nearest is null ? "name the id of a board in this design" : $"did you mean `{nearest}`?");

    public static Problem FedTwice(SourceSpan span, string id, SourceSpan first) => Problem.Error(
        "board-fed-twice", $"board `{id}` is fed a second time", span, "a board has one supply", new ProblemLabel(first, "it is fed here already"));

    public static Problem FeedsItself(SourceSpan span, string loop) => Problem.Error(
        "feeds-in-a-circle", $"this supply runs in a circle: {loop}", span, "one of these boards must be fed from the origin");

    public static Problem Orphan(SourceSpan span, string id) => Problem.Error(
        "board-without-supply", $"nobody feeds board `{id}`", span, $"name it in the `feeds` of a circuit, or write `fed-from: origin`");

    public static Problem TooDeep(SourceSpan span, int most) => Problem.Error(
        "boards-too-deep", $"boards feed one another more than {most} deep", span, null);

    public static Problem UnknownType(SourceSpan span, string name, string list, string? nearest) => Problem.Error(
        "unknown-type", $"`types.{list}` has no `{name}`", span, nearest is null ? $"add it under `types.{list}`" : $"did you mean `{nearest}`?");

    public static Problem NoDate(SourceSpan span, string text) => Problem.Error(
        "not-a-date", $"`{text}` is not a day of the calendar", span, "write year, month and day as 2026-09-14");

    public static Problem EndsBeforeItBegins(SourceSpan span, SourceSpan date) => Problem.Error(
        "departure-ends-first", "the last day of this departure lies before the day on which it was agreed", span, "put one of the two days right",
        new ProblemLabel(date, "it was agreed here"));

    public static Problem CableAndLegs(SourceSpan span, SourceSpan legs) => Problem.Error(
        "cable-and-legs", "a circuit has either `cable` or `legs`", span, "keep the one that describes the run", new ProblemLabel(legs, "and here are the legs"));
}
