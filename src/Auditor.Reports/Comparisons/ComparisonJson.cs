using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Reports.Json;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Comparisons;

/// <summary>Writes comparisons for programs, as <c>comparison.schema.json</c> describes them.</summary>
public static class ComparisonJson
{
    /// <summary>Version of the comparison format.</summary>
    private const int Format = 1;

    /// <summary>Writes a comparison file.</summary>
    /// <param name="comparison">The comparison.</param>
    /// <returns>Indented JSON in UTF-8 without a byte order mark; lines end with LF.</returns>
    public static byte[] Write(RevisionComparison comparison)
    {
        using var stream = new MemoryStream();
        using (var output = new JsonOutput(stream))
        {
            output.Object(null, () => Write(output, comparison));
        }

        stream.WriteByte((byte)'\n');
        return stream.ToArray();
    }

    private static void Write(JsonOutput output, RevisionComparison comparison)
    {
        output.Whole("format", Format);
        output.Object("tool", () =>
        {
            output.Text("name", ThisTool.Name);
            output.Text("version", ThisTool.Version);
        });
        output.Object("before", () => Revision(output, comparison.Before));
        output.Object("after", () => Revision(output, comparison.After));
        output.Flag("inputsKnown", comparison.KnowsInputs);
        output.Flag("causesKnown", comparison.KnowsCauses);
        output.Object("counts", () =>
        {
            output.Whole("newOrWorse", comparison.CountNewOrWorse);
            foreach (var kind in Enum.GetValues<FindingChangeKind>())
            {
                output.Whole(ChangeWords.Word(kind), comparison.Of(kind).Count());
            }
        });
        var causes = new CauseNumbers(comparison);
        output.Array("findings", comparison.Findings, change => output.Object(null, () => Finding(output, change, causes)));
        output.Array("inputs", comparison.Inputs, change => output.Object(null, () => Input(output, change)));
        output.Array("subjects", comparison.Subjects, change => output.Object(null, () => Subject(output, change)));
        output.Array("departures", comparison.Departures, change => output.Object(null, () =>
        {
            output.Nullable("before", change.Before, departure => Departure(output, departure));
            output.Nullable("after", change.After, departure => Departure(output, departure));
        }));
        output.Object("ruleSet", () =>
        {
            output.Flag("same", comparison.RuleSet.IsSame);
            output.Flag("fullyKnown", comparison.RuleSet.IsFullyKnown);
            output.Array("changes", comparison.RuleSet.Changes, change => output.Object(null, () => Rule(output, change)));
        });
    }

    private static void Revision(JsonOutput output, Revision revision)
    {
        output.Text("name", revision.Name);
        output.TextOrNull("revision", revision.Mark);
        output.Array("inputs", revision.Inputs, file => output.Object(null, () =>
        {
            output.Text("path", file.Path);
            output.Text("sha256", file.Sha256);
        }));
        output.Object("ruleSet", () =>
        {
            output.Text("name", revision.Rules.Id);
            output.TextOrNull("edition", revision.Rules.Edition);
            output.Text("sha256", revision.Rules.Sha256);
        });
    }

    private static void Finding(JsonOutput output, FindingChange change, CauseNumbers causes)
    {
        output.Text("change", ChangeWords.Word(change.Kind));
        output.Text("key", change.Finding.Key);
        output.Text("rule", change.Finding.Rule);
        output.Text("title", change.Finding.Title);
        output.Text("subject", change.Finding.Subject);
        output.Flag("newOrWorse", change.IsNewOrWorse);
        output.Flag("limitMoved", change.HasOtherLimit);
        output.Texts("movedBy", ChangeWords.Words(change.MovedBy));
        output.Object("causes", () =>
        {
            output.Array("inputs", change.Causes.OfType<InputChange>(), input => output.Whole(null, causes.Of(input)));
            output.Array("subjects", change.Causes.OfType<SubjectChange>(), subject => output.Whole(null, causes.Of(subject)));
            output.Array("ruleSet", change.Causes.OfType<RuleChange>(), rule => output.Whole(null, causes.Of(rule)));
        });
        output.Nullable("before", change.Before, finding => State(output, finding));
        output.Nullable("after", change.After, finding => State(output, finding));
    }

    private static void State(JsonOutput output, RevisionFinding finding)
    {
        output.Text("key", finding.Key);
        output.Text("verdict", Engine.Findings.VerdictWords.Word(finding.Verdict));
        output.Flag("onAssumption", finding.OnAssumption);
        output.Text("provision", finding.IsRequirement ? "requirement" : "recommendation");
        output.Text("value", finding.Value?.Text);
        output.TextOrNull("limit", finding.LimitShown);
        output.Number("relativeMargin", finding.RelativeMargin);
        output.TextOrNull("absoluteMargin", finding.MarginShown);
        output.Text("message", finding.Message);
        output.Texts("missing", finding.Missing);
        Place(output, finding.Place);
    }

    private static void Input(JsonOutput output, InputChange change)
    {
        output.Text("subject", change.SubjectAfter);
        output.Text("subjectBefore", change.SubjectBefore);
        output.Text("input", change.Path);
        output.Nullable("before", change.Before, input => Stated(output, input));
        output.Nullable("after", change.After, input => Stated(output, input));
    }

    private static void Stated(JsonOutput output, RevisionInput input)
    {
        output.Text("text", input.Text);
        output.Text("from", input.From);
        Place(output, input.Place);
    }

    private static void Subject(JsonOutput output, SubjectChange change)
    {
        output.Text("change", ChangeWords.State(change));
        output.Flag("renamed", change.IsRenamed);
        output.Flag("moved", change.IsMoved);
        output.Text("recognisedBy", ChangeWords.Word(change.By));
        output.Text("kind", change.Subject.Kind);
        output.Text("name", change.Subject.Name);
        output.Text("before", change.Before?.Key);
        output.Text("after", change.After?.Key);
        Place(output, change.Subject.Place);
    }

    private static void Departure(JsonOutput output, RevisionDeparture departure)
    {
        output.Text("rule", departure.Rule);
        output.Text("subject", departure.Subject);
        output.Text("reason", departure.Reason);
        output.Text("agreedBy", departure.AgreedBy);
        output.Text("date", departure.Date);
        output.Text("until", departure.Until);
        output.Text("state", TailJson.State(departure.State));
        Place(output, departure.Place);
    }

    private static void Rule(JsonOutput output, RuleChange change)
    {
        output.Text("change", ChangeWords.State(change.IsAdded, change.IsRemoved));
        output.Text("item", ChangeWords.Word(change.Item));
        output.Text("name", change.Name);
        output.TextOrNull("title", change.Title);
        output.Array("details", change.Details, detail => output.Object(null, () =>
        {
            output.Text("what", detail.What);
            output.Text("before", detail.Before);
            output.Text("after", detail.After);
        }));
    }

    private static void Place(JsonOutput output, Place? place)
    {
        if (place is null)
        {
            output.Null("location");
        }
        else
        {
            output.Location(place.File, new Location(place.Line, place.Column));
        }
    }
}
