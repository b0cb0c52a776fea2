using System.Globalization;
using Auditor.Engine.Installation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Departures;

/// <summary>Makes subjects of the departures of a design, so that rules can judge the record itself.</summary>
internal static class DepartureSubjects
{
    private const string Prefix = "departure/";

    /// <summary>One subject for each departure, in their order; a second one of the same rule and subject gets a number behind its key.</summary>
    public static IEnumerable<DesignSubject> Of(Design design, IReadOnlyList<Departure> departures, DateOnly asOf)
    {
        var used = new Dictionary<string, int>(StringComparer.Ordinal);
        foreach (var departure in departures)
        {
            var key = $"{Prefix}{departure.Rule}:{departure.Subject}";
            used[key] = used.GetValueOrDefault(key) + 1;
            yield return new DesignSubject(
                design, design.Evaluator.Rules.Schema.Shapes.Departure, used[key] == 1 ? key : $"{key} ({used[key]})", departure.Node, design.Evaluator)
            {
                Parent = design.Installation,
                Told = new Dictionary<string, Value>(StringComparer.Ordinal)
                {
                    [Shapes.State] = Value.Of(departure.State.Word()),
                    [Shapes.AsOf] = Value.Of(asOf.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture)),
                },
            };
        }
    }
}
