using Auditor.Documents;

namespace Auditor.Engine.RuleTests;

/// <summary>All wordings of the stage that changes rules to test their cases.</summary>
internal static class MutationMessages
{
    public const string ConditionDropped = "the condition is dropped";

    public const string PartDropped = "this part of the condition is dropped";

    public static Problem Unnoticed(Mutation mutation) => Problem.Warning(
        "mutation-unnoticed", $"no case of {mutation.Owner} notices when {mutation.Change}", mutation.Span, "add a case that decides otherwise then");

    public static string Turned(string from, string to) => $"`{from}` becomes `{to}`";

    public static string Shifted(string limit, string change) => $"`{limit}` is {change}";
}
