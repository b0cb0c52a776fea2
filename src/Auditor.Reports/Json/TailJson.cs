using Auditor.Engine.Departures;
using Auditor.Engine.Findings;
using Auditor.Engine.Registers;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Json;

/// <summary>Writes what a findings file says after its findings: what they rest on, what was accepted, what was not looked at.</summary>
internal static class TailJson
{
    public static void Write(JsonOutput output, AuditResult result, Register register)
    {
        output.Records("assumptions", new Supports(result).Assumed, assumed =>
        {
            output.Text("subject", assumed.Input.Subject.Key);
            output.Text("input", assumed.Input.Slot.Path);
            output.Text("text", assumed.Input.Text);
            output.Texts("findings", assumed.Findings);
            output.Location(assumed.Input.Span);
        });
        output.Records("departures", result.Departures, departure => Departure(output, departure));
        output.Texts("neverApplied", result.NotApplied.Select(rule => rule.Id));
        output.Records("notCovered", register.NotCovered(result.Rules), row =>
        {
            output.Text("id", row.Id);
            output.Text("part", row.Part);
            output.Text("requirement", row.Requirement);
            output.Text("decidable", row.Decidable);
        });
    }

    private static void Departure(JsonOutput output, Departure departure)
    {
        output.Text("rule", departure.Rule);
        output.Text("subject", departure.Subject);
        output.Text("reason", departure.Reason);
        output.Text("agreedBy", departure.AgreedBy);
        output.Text("date", DayText.Of(departure.Date));
        output.Text("until", departure.Until is { } day ? DayText.Of(day) : null);
        output.Text("state", State(departure.State));
        output.Location(departure.Span);
    }

    /// <summary>The word for the state of a departure.</summary>
    public static string State(DepartureState state) => state switch
    {
        DepartureState.InForce => "inForce",
        DepartureState.NotNeeded => "notNeeded",
        DepartureState.Expired => "expired",
        DepartureState.Forbidden => "forbidden",
        _ => "unmatched",
    };
}
