using System.CommandLine;
using System.Globalization;
using Auditor.Documents;

namespace Auditor.Cli.Commands;

/// <summary>The day on which departures are judged: the only place where the program looks at a clock.</summary>
internal static class AsOfOption
{
    public static Option<string?> Make() => new("--as-of")
    {
        Description = "Day on which departures must be in force; today when left out.",
        HelpName = "DATE",
    };

    /// <summary>The day named, or today.</summary>
    public static DateOnly Read(string? text, Problems problems)
    {
        if (text is null)
        {
            return DateOnly.FromDateTime(TimeProvider.System.GetLocalNow().Date);
        }

        if (!DateOnly.TryParseExact(text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var date))
        {
            problems.Add(CommandMessages.NotDate(text));
        }

        return date;
    }
}
