using System.Globalization;

namespace Auditor.Reports.Reading;

/// <summary>Keeps the culture of the calling thread out of reports: sentences and numbers are put together only when they are asked for.</summary>
internal static class Invariantly
{
    /// <summary>Does something under the invariant culture, and leaves the thread as it was.</summary>
    public static void Do(Action act) => Make(() =>
    {
        act();
        return true;
    });

    /// <summary>Makes something under the invariant culture, and leaves the thread as it was.</summary>
    public static T Make<T>(Func<T> make)
    {
        var callers = CultureInfo.CurrentCulture;
        CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;
        try
        {
            return make();
        }
        finally
        {
            CultureInfo.CurrentCulture = callers;
        }
    }
}
