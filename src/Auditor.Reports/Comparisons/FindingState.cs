namespace Auditor.Reports.Comparisons;

/// <summary>A finding in one revision. Texts that do not apply are empty.</summary>
/// <param name="Verdict">The verdict, with the assumption that it hangs on; where there is none, why.</param>
/// <param name="Value">The value compared.</param>
/// <param name="Limit">The limit, with its sense.</param>
/// <param name="Margin">The margin, relative where there is one.</param>
/// <param name="Missing">What would have to be known; empty unless undetermined.</param>
/// <param name="Place">Where in the design to look.</param>
public sealed record FindingState(string Verdict, string Value, string Limit, string Margin, IReadOnlyList<string> Missing, string Place)
{
    /// <summary>Verdict, value, limit and margin in one line; of an undetermined finding, what is missing.</summary>
    public string Text
    {
        get
        {
            if (Missing.Count > 0)
            {
                return $"{Verdict} for want of {string.Join(", ", Missing)}";
            }

            var compared = Value.Length == 0 ? "" : $": {Value}{(Limit.Length == 0 ? "" : $" against {Limit}")}";
            return Verdict + compared + (Margin.Length == 0 ? "" : $", margin {Margin}");
        }
    }
}
