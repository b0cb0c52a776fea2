using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Findings;

/// <summary>Shows the limits of a check.</summary>
internal static class LimitText
{
    /// <summary>The limit with its sense, such as "at most 1.37 Ω".</summary>
    public static string Show(Check check, Judgement judgement) => check.How switch
    {
        CheckKind.AtMost => "at most " + Plain(check, judgement),
        CheckKind.AtLeast => "at least " + Plain(check, judgement),
        CheckKind.Within => "from " + Plain(check, judgement),
        CheckKind.Equal => "exactly " + Plain(check, judgement),
        CheckKind.OneOf => "one of " + Plain(check, judgement),
        _ => "",
    };

    /// <summary>The limit alone.</summary>
    public static string Plain(Check check, Judgement judgement)
    {
        var shown = judgement.Limits.Select(limit => ValueText.Show(limit, check.Unit)).ToArray();
        return shown.Length == 0 ? ValueText.Unknown : string.Join(check.How == CheckKind.Within ? " to " : ", ", shown);
    }
}
