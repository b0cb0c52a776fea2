using System.Text;
using Auditor.Engine.Findings;
using Auditor.Reports.Csv;
using Microsoft.VisualBasic.FileIO;

namespace Auditor.Reports.Tests.Csv;

/// <summary>The schedule, read by a reader of comma-separated values of another make.</summary>
public class CsvScheduleTests
{
    [Fact]
    public void The_schedule_has_a_header_and_a_record_for_each_circuit()
    {
        var records = Read(Write(Sheds.Audit("garden")));

        Assert.Equal(["Circuit", "Name", "Device", "Conductors", "Ib", "Iz", "Verdict", "Least margin in %", "Rule", "Worst within tolerances in %"], records[0]);
        Assert.Equal(["A/2", "Pump", "EN 60898 C 20 A", "2.5 mm² / 4 mm²", "25 A", "24 A", "nonconforming", "-10.0", "run-sensible", ""], records[2]);
        // A/1 is 12 m ± 2 m long of at most 40 m: 14 m leave 65 %.
        Assert.Equal("65.0", records[1][^1]);
        Assert.Equal(["A/1", "A/2", "A/3", "A/4"], records[1..5].Select(record => record[0]));
    }

    [Fact]
    public void After_the_circuits_comes_what_is_on_record_and_does_not_conform()
    {
        var records = Read(Write(Sheds.Audit("garden")));

        Assert.Equal(
            ["departure/run-sensible:A/1", "departure/device-known:A/3", "departure/load-within-capacity:A/2", "departure/no-such-rule:A/9"],
            records[5..].Select(record => record[0]));
        Assert.Equal(
            ["`device-known` allows no departure; one is recorded at A/3, agreed by T. Example on 2026-03-02.", "", "", "", "", "nonconforming", "", "record-departure-permitted", ""],
            records[6][1..]);
    }

    [Fact]
    public void A_record_is_as_RFC_4180_has_it()
    {
        var text = Encoding.UTF8.GetString(Write(Sheds.Audit("garden")));

        Assert.StartsWith("\uFEFFCircuit,Name,", text, StringComparison.Ordinal);
        Assert.EndsWith("\r\n", text, StringComparison.Ordinal);
        Assert.Equal(9, text.Split("\r\n").Length - 1);
        Assert.DoesNotContain('\n', text.Replace("\r\n", "", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("=1+2", "'=1+2")]
    [InlineData("+44 lamps", "'+44 lamps")]
    [InlineData("-lamps", "'-lamps")]
    [InlineData("@SUM(A1)", "'@SUM(A1)")]
    [InlineData("a \"b\", c", "a \"b\", c")]
    [InlineData("1 = 2", "1 = 2")]
    public void A_text_that_a_spreadsheet_would_run_is_guarded(string name, string shown)
    {
        using var folder = new TemporaryFolder();
        var design = File.ReadAllText(Sheds.Data("designs/small.design.yaml")).Replace("- id: 1\n", $"- id: 1\n        name: '{name}'\n", StringComparison.Ordinal);

        var records = Read(Write(ExampleAudit.At(folder.Write("a.design.yaml", design), "a.design.yaml", Sheds.Rules)));

        Assert.Equal(shown, records[1][1]);
    }

    [Fact]
    public void Examples_have_as_many_cells_in_each_record()
    {
        var result = ExampleAudit.Of("workshop/workshop.design.yaml");
        var problems = new Documents.Problems();
        var schedule = Schedules.Schedule.For(null, result.Rules, problems);
        var records = Read(CsvSchedule.Write(result, schedule!));

        Assert.Empty(problems.All);
        Assert.True(records.Count > 10);
        Assert.All(records, record => Assert.Equal(records[0].Length, record.Length));
    }

    private static byte[] Write(AuditResult result) => CsvSchedule.Write(result, Sheds.Schedule("schedules/shed/any.scriban-md"));

    private static List<string[]> Read(byte[] bytes)
    {
        using var parser = new TextFieldParser(new MemoryStream(bytes), Encoding.UTF8) { TextFieldType = FieldType.Delimited, HasFieldsEnclosedInQuotes = true, TrimWhiteSpace = false };
        parser.SetDelimiters(",");
        var records = new List<string[]>();
        while (!parser.EndOfData)
        {
            records.Add(parser.ReadFields()!);
        }

        return records;
    }
}
