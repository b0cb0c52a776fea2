namespace Auditor.Reports.Model;

/// <summary>What one rule says of one subject, ready to be shown. Texts that do not apply are empty.</summary>
public sealed record ReportFinding
{
    /// <summary>Stable key: rule and subject.</summary>
    public required string Key { get; init; }

    /// <summary>Id of the rule.</summary>
    public required string Rule { get; init; }

    /// <summary>What is right when it conforms.</summary>
    public required string Title { get; init; }

    /// <summary>Key of the subject.</summary>
    public required string Subject { get; init; }

    /// <summary>The subject as people name it: key and name.</summary>
    public required string SubjectLabel { get; init; }

    /// <summary>The verdict, with the assumption that it hangs on.</summary>
    public required string Verdict { get; init; }

    /// <summary>The verdict in one word: nonconforming, unproven, undetermined, departed or conforms.</summary>
    public required string VerdictWord { get; init; }

    /// <summary>Id of the finding within the report.</summary>
    public required string Anchor { get; init; }

    /// <summary>Key of the board that it belongs to; empty for the installation as a whole.</summary>
    public required string Board { get; init; }

    /// <summary>Whether the rule is a requirement ("shall"); otherwise it is a recommendation ("should").</summary>
    public required bool IsRequirement { get; init; }

    /// <summary>Type of the clause.</summary>
    public required string ClauseType { get; init; }

    /// <summary>Clauses of the standards.</summary>
    public required IReadOnlyList<string> References { get; init; }

    /// <summary>What more there is to say of the clause.</summary>
    public required string ClauseNote { get; init; }

    /// <summary>The value compared, with its unit.</summary>
    public required string Value { get; init; }

    /// <summary>The limit with its sense and unit.</summary>
    public required string Limit { get; init; }

    /// <summary>Distance to the limit: as a share of it where that means something, and in the unit.</summary>
    public required string Margin { get; init; }

    /// <summary>Distance to the limit as a share of it, with sign; empty where such a share means nothing, as with temperatures.</summary>
    public required string RelativeMargin { get; init; }

    /// <summary>Distance to the limit in the unit of the value.</summary>
    public required string AbsoluteMargin { get; init; }

    /// <summary>Margin in the worst case within the tolerances, as a share of the limit, with sign.</summary>
    public required string WorstMargin { get; init; }

    /// <summary>What tolerances make of it, one line each, the greatest effect first; empty where they make no difference.</summary>
    public required IReadOnlyList<string> WithinTolerances { get; init; }

    /// <summary>
    /// Relative margin in twentieths of the limit, for drawing: from -20 (as far again beyond the limit, or more) to 20; 0 where nothing
    /// was measured.
    /// </summary>
    public required int MarginSteps { get; init; }

    /// <summary>The sentence.</summary>
    public required string Sentence { get; init; }

    /// <summary>Why the rule matters.</summary>
    public required string Why { get; init; }

    /// <summary>Inputs that can put it right, as the design file names them.</summary>
    public required IReadOnlyList<string> PutRightBy { get; init; }

    /// <summary>The nearest proven remedy, or that there is none; empty where nobody asked.</summary>
    public required string Remedy { get; init; }

    /// <summary>Where to look in the design, as path:line:column.</summary>
    public required string Location { get; init; }

    /// <summary>Assumed inputs and figures from memory that the result rests on, one line each.</summary>
    public required IReadOnlyList<string> RestsOn { get; init; }

    /// <summary>The formulas of value and limit.</summary>
    public required IReadOnlyList<FormulaLine> Formulas { get; init; }

    /// <summary>What would have to be known, one line each; empty unless undetermined.</summary>
    public required IReadOnlyList<string> Missing { get; init; }

    /// <summary>Why the departure in force accepts it; null where none does.</summary>
    public required ReportDeparture? Departure { get; init; }

    /// <summary>What it comes down to, line by line; null where the report has no room for that.</summary>
    public ReportDerivation? Derivation => Unfolding?.Value;

    /// <summary>Makes the derivation when it is asked for.</summary>
    internal Lazy<ReportDerivation?>? Unfolding { get; init; }
}
