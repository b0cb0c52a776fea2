using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Findings;

/// <summary>Shows the limits of a check.</summary>
public static class LimitText
{
    /// <summary>Limits with their sense, such as "at most 1.37 Ω"; empty for a plain requirement.</summary>
    /// <param name="how">The comparison.</param>
    /// <param name="limits">The limits as shown.</param>
    public static string Show(CheckKind how, IReadOnlyList<string> limits) => how switch
    {
        CheckKind.AtMost => "at most " + Plain(how, limits),
        CheckKind.AtLeast => "at least " + Plain(how, limits),
        CheckKind.Within => "from " + Plain(how, limits),
        CheckKind.Equal => "exactly " + Plain(how, limits),
        CheckKind.OneOf => "one of " + Plain(how, limits),
        _ => "",
    };

    /// <summary>The limit of a finding with its sense.</summary>
    internal static string Show(Check check, Judgement judgement) => Show(check.How, Shown(check, judgement));

    /// <summary>The limit of a finding alone.</summary>
    internal static string Plain(Check check, Judgement judgement) => Plain(check.How, Shown(check, judgement));

    private static string Plain(CheckKind how, IReadOnlyList<string> limits) =>
        limits.Count == 0 ? ValueText.Unknown : string.Join(how == CheckKind.Within ? " to " : ", ", limits);

    private static string[] Shown(Check check, Judgement judgement) => [.. judgement.Limits.Select(limit => ValueText.Show(limit, check.Unit))];
}
