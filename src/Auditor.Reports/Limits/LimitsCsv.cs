using System.Globalization;
using Auditor.Engine.Limits;
using Auditor.Formulas.Values;
using Auditor.Reports.Reading;
using CsvHelper;

namespace Auditor.Reports.Limits;

/// <summary>
/// Writes limits as comma-separated values (RFC 4180), for spreadsheets: one record for each input, numbers in the unit of the record and
/// not rounded. With a byte order mark, without which spreadsheets take the text for something other than UTF-8, and an apostrophe before
/// any text that they would run as a formula.
/// </summary>
public static class LimitsCsv
{
    private static readonly string[] Headings =
    [
        "Subject", "Name", "Input", "What", "Unit", "Stated", "Expected", "Least", "Least by rule", "Most", "Most by rule",
        "Least with uncertainty", "Most with uncertainty", "Notes",
    ];

    /// <summary>Writes the limits.</summary>
    /// <returns>A header and one record for each input; lines end with CR LF.</returns>
    public static byte[] Write(LimitResult result)
    {
        using var stream = new MemoryStream();
        var options = CsvWriterOptions.Default with { Injection = CsvInjection.Escape, WriteByteOrderMark = true };
        using (var csv = CsvWriter.Create(stream, options, leaveOpen: true))
        {
            csv.WriteRecord(Headings);
            foreach (var limit in result.Inputs)
            {
                Record(csv, limit);
            }
        }

        return stream.ToArray();
    }

    private static void Record(CsvWriter csv, InputLimit limit)
    {
        var (subject, adjustment) = (limit.Input.Subject, limit.Input.Adjustment);
        csv.WriteField(subject.Key);
        csv.WriteField(SubjectText.OwnName(subject) ?? "");
        csv.WriteField(adjustment.Path);
        csv.WriteField(adjustment.Label);
        csv.WriteField(adjustment.Slot.Unit?.Symbol ?? "");
        Field(csv, limit, limit.Input.Stated);
        Field(csv, limit, limit.Expected);
        Field(csv, limit, limit.Around?.Least?.Edge);
        csv.WriteField(LimitText.Rule(limit.Around?.Least, subject));
        Field(csv, limit, limit.Around?.Most?.Edge);
        csv.WriteField(LimitText.Rule(limit.Around?.Most, subject));
        Field(csv, limit, limit.Guarded?.Least?.Edge);
        Field(csv, limit, limit.Guarded?.Most?.Edge);
        csv.WriteField(string.Join("; ", LimitNotes.Of(limit)));
        csv.EndRecord();
    }

    private static void Field(CsvWriter csv, InputLimit limit, LimitEdge? edge)
    {
        if (edge is null)
        {
            csv.WriteField("");
        }
        else
        {
            Field(csv, limit, edge.Value);
        }
    }

    /// <summary>A number goes as one, to nine digits: beyond lies the slack of comparisons.</summary>
    private static void Field(CsvWriter csv, InputLimit limit, in Value value)
    {
        switch (value.Kind)
        {
            case ValueKind.Quantity:
                var shown = limit.Input.Adjustment.Slot.Unit!.FromCoherent(value.Number);
                csv.WriteField(decimal.Parse(shown.ToString("E8", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture));
                break;
            case ValueKind.Missing:
                csv.WriteField("");
                break;
            default:
                csv.WriteField(value.Text);
                break;
        }
    }
}
