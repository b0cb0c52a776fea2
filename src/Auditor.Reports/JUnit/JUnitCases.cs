using System.Xml;
using Auditor.Engine.Findings;
using Auditor.Reports.Reading;

namespace Auditor.Reports.JUnit;

/// <summary>Writes findings as test cases.</summary>
/// <param name="xml">Where to write.</param>
/// <param name="places">How places are shown.</param>
internal sealed class JUnitCases(XmlWriter xml, Places places)
{
    /// <summary>Writes one finding.</summary>
    public void Write(Finding finding)
    {
        xml.WriteStartElement("testcase");
        xml.Attribute("name", finding.Rule.Id);
        xml.Attribute("classname", finding.Subject.Key);
        switch (finding.Outcome())
        {
            case JUnitOutcome.Failure:
                Outcome("failure", finding);
                break;
            case JUnitOutcome.Error:
                Outcome("error", finding);
                break;
            case JUnitOutcome.Skipped:
                xml.WriteStartElement("skipped");
                xml.Text($"{Headline(finding)}\n{Details(finding)}");
                xml.WriteEndElement();
                break;
        }

        xml.WriteEndElement();
    }

    private void Outcome(string element, Finding finding)
    {
        xml.WriteStartElement(element);
        xml.Attribute("message", Headline(finding));
        xml.Attribute("type", finding.Verdict.Word());
        xml.Text(Details(finding));
        xml.WriteEndElement();
    }

    private static string Headline(Finding finding) => (finding.Verdict, finding.Departure) switch
    {
        (_, { } departure) => $"Departed: {departure.Reason} Agreed by {departure.AgreedBy} on {DayText.Of(departure.Date)}.",
        (Verdict.Undetermined, _) => $"Cannot be judged: {string.Join("; ", finding.Judgement.Absences?.Items ?? [])}.",
        _ => finding.Message,
    };

    private string Details(Finding finding)
    {
        var rule = finding.Rule;
        var margin = finding.Judgement.Margin?.Relative is { } relative ? ValueText.ShowMargin(relative) : "";
        var worst = finding.WorstCase?.Margin?.Relative is { } least ? ValueText.ShowMargin(least) : "";
        (string Label, string Text)[] lines =
        [
            ("finding", finding.Message),
            ("rule", rule.Title),
            ("clause", $"{rule.Provision.Word()}, {rule.Clause.Type}{(rule.Clause.References.Count == 0 ? "" : ": ")}{string.Join(", ", rule.Clause.References)}"),
            ("value", finding.ValueShown),
            ("limit", finding.LimitShown),
            ("margin", margin),
            ("margin in the worst case within the tolerances", worst),
            ("where", places.Text(finding.Location)),
            ("can be put right by", string.Join(", ", rule.PutRightBy)),
        ];
        return string.Join('\n', lines.Where(line => line.Text.Length > 0).Select(line => $"{line.Label}: {line.Text}"));
    }
}
