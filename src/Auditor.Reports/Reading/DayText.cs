using System.Globalization;

namespace Auditor.Reports.Reading;

/// <summary>Writes days of the calendar.</summary>
internal static class DayText
{
    /// <summary>Year, month and day, as in 2026-09-14.</summary>
    public static string Of(DateOnly day) => day.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);
}
