using System.Globalization;
using Auditor.Engine.Findings;
using Auditor.Reports.Model;
using Auditor.Reports.Schedules;
using CsvHelper;

namespace Auditor.Reports.Csv;

/// <summary>
/// Writes the schedule of circuits as comma-separated values (RFC 4180), for spreadsheets: a byte order mark, without which they
/// take the text for something other than UTF-8, and an apostrophe before any text that they would run as a formula. After the
/// circuits comes what is on record about the audit and wants a look, each with the sentence of its finding for a name.
/// </summary>
public static class CsvSchedule
{
    /// <summary>Writes the schedule.</summary>
    /// <param name="result">The audit.</param>
    /// <param name="schedule">Columns of the schedule, between the name of the circuit and its verdict.</param>
    /// <returns>A header, one record for each circuit, and one for each finding on the record that does not conform; lines end with CR LF.</returns>
    public static byte[] Write(AuditResult result, Schedule schedule)
    {
        var table = new ScheduleFiller(result, schedule).Fill();
        using var stream = new MemoryStream();
        using (var csv = CsvWriter.Create(stream, CsvWriterOptions.Default with { Injection = CsvInjection.Escape, WriteByteOrderMark = true }, leaveOpen: true))
        {
            csv.WriteRecord([.. Headings(table)]);
            foreach (var row in table.Rows)
            {
                Record(csv, row);
            }

            foreach (var finding in result.Findings.Where(finding => result.Rules.Schema.Shapes.IsOnRecord(finding.Subject.Shape) && finding.Verdict != Verdict.Conforms))
            {
                string[] cells = [.. table.Headings.Select(_ => "")];
                Record(csv, new ScheduleRow(finding.Subject.Key, finding.Message, cells, finding.Verdict.Word(), "", finding.Rule.Id, ""));
            }
        }

        return stream.ToArray();
    }

    private static IEnumerable<string> Headings(ScheduleTable table) => ["Circuit", "Name", .. table.Headings, "Verdict", "Least margin in %", "Rule", "Worst within tolerances in %"];

    private static void Record(CsvWriter csv, ScheduleRow row)
    {
        csv.WriteField(row.Key);
        csv.WriteField(row.Name);
        foreach (var cell in row.Cells)
        {
            csv.WriteField(cell);
        }

        csv.WriteField(row.Verdict);
        Margin(csv, row.Margin);
        csv.WriteField(row.MarginRule);
        Margin(csv, row.WorstMargin);
        csv.EndRecord();
    }

    /// <summary>A margin goes as a number, by which a spreadsheet can sort, and not as text, whose sign would call for an apostrophe.</summary>
    private static void Margin(CsvWriter csv, string shown)
    {
        if (shown.Length == 0)
        {
            csv.WriteField("");
        }
        else
        {
            csv.WriteField(decimal.Parse(shown.AsSpan().TrimEnd("% "), NumberStyles.Number, CultureInfo.InvariantCulture));
        }
    }
}
