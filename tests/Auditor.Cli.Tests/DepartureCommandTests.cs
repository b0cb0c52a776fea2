using System.Text.Json;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>A circuit that is too long for its voltage drop, and what becomes of the exit code when somebody agrees to that.</summary>
public class DepartureCommandTests
{
    private const string Agreed = "reason: Nobody plugs in more than a lamp., agreed-by: T. Example, date: 2026-03-01";
    private const string Drop = $"rule: voltage-drop-other, subject: GO/1, {Agreed}, until: 2026-11-30";

    [Theory]
    [InlineData("2026-11-01", 0, null)]
    [InlineData("2026-11-30", 0, null)]
    [InlineData("2026-12-01", 1, "record-departure-in-date")]
    public void A_departure_holds_up_to_its_last_day_and_not_a_day_longer(string asOf, int code, string? told)
    {
        using var folder = new TemporaryFolder();
        Write(folder, "departures:", $"  - {{ {Drop} }}");

        var result = Audit(folder, asOf);

        Assert.Equal(code, result.Code);
        Assert.Empty(result.Error);
        Assert.Contains(told ?? " 1 departed", result.Output, StringComparison.Ordinal);
        Assert.Equal(told is null ? ["voltage-drop-other:GO/1 departed"] : ["voltage-drop-other:GO/1 nonconforming", $"{told}:departure/voltage-drop-other:GO/1 nonconforming"], Findings(folder));
    }

    [Theory]
    [InlineData("rule: voltage-drop-other, subject: \"GO/*\"", 0, null)]
    [InlineData("rule: voltage-drop-other, subject: GO/2", 1, "record-departure-matched")]
    [InlineData("rule: voltage-drop, subject: GO/1", 1, "record-departure-matched")]
    [InlineData("rule: neutral-identified, subject: GO/1", 1, "record-departure-matched")]
    public void A_departure_accepts_what_its_rule_and_pattern_name(string departure, int code, string? told)
    {
        using var folder = new TemporaryFolder();
        Write(folder, "departures:", $"  - {{ {departure}, {Agreed} }}");

        var result = Audit(folder, "2026-12-01");

        Assert.Equal(code, result.Code);
        Assert.Equal(told is not null, result.Output.Contains($"[{told}]", StringComparison.Ordinal));
        Assert.Equal(told is null, Findings(folder).Contains("voltage-drop-other:GO/1 departed"));
    }

    [Fact]
    public void A_departure_from_a_rule_that_allows_none_changes_nothing_and_is_a_finding_at_its_line()
    {
        using var folder = new TemporaryFolder();
        Write(folder, "departures:", $"  - rule: polarity", $"    subject: GO/1", "    reason: It looks sound.", "    agreed-by: T. Example", "    date: 2026-03-01");

        var result = Audit(folder, "2026-12-01");

        Assert.Equal(1, result.Code);
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        var finding = json.RootElement.GetProperty("findings").EnumerateArray().Single(each => each.GetProperty("rule").GetString() == "record-departure-permitted");
        Assert.Equal("nonconforming", finding.GetProperty("verdict").GetString());
        Assert.Equal(Text().Split('\n').Length + 1, finding.GetProperty("location").GetProperty("line").GetInt32());
        Assert.Equal("forbidden", json.RootElement.GetProperty("departures")[0].GetProperty("state").GetString());
        Assert.Contains("voltage-drop-other:GO/1 nonconforming", Findings(folder));
    }

    [Theory]
    [InlineData("date: 2026-13-01")]
    [InlineData("date: 2026-02-30")]
    [InlineData("date: tomorrow")]
    [InlineData("date: 2026-03-01, until: 2026-11-31")]
    [InlineData("date: 2026-03-01, until: 2026-02-28")]
    public void A_malformed_date_is_a_problem_at_its_line_and_nothing_is_audited(string dates)
    {
        using var folder = new TemporaryFolder();
        Write(folder, "departures:", $"  - {{ rule: voltage-drop-other, subject: GO/1, reason: None., agreed-by: T. Example, {dates} }}");

        var result = Audit(folder, "2026-12-01");

        Assert.Equal(2, result.Code);
        Assert.Empty(result.Output);
        Assert.Contains($"a.design.yaml:{Text().Split('\n').Length + 1}:", result.Error, StringComparison.Ordinal);
        Assert.Contains(dates[(dates.LastIndexOf(' ') + 1)..], result.Error, StringComparison.Ordinal);
        Assert.False(File.Exists(folder.File("a.json")));
    }

    [Theory]
    [InlineData("rule")]
    [InlineData("subject")]
    [InlineData("reason")]
    [InlineData("agreed-by")]
    [InlineData("date")]
    public void A_departure_without_its_reason_its_giver_or_its_day_is_a_problem(string missing)
    {
        using var folder = new TemporaryFolder();
        Write(folder, ["departures:", "  - until: 2027-01-01", .. Drop.Split(", ").Where(part => !part.StartsWith(missing + ":", StringComparison.Ordinal) && !part.StartsWith("until", StringComparison.Ordinal)).Select(part => "    " + part)]);

        var result = Audit(folder, "2026-12-01");

        Assert.Equal(2, result.Code);
        Assert.Contains($"`{missing}`", result.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Departures_may_stand_in_a_file_of_their_own()
    {
        using var folder = new TemporaryFolder();
        Write(folder, "include: departures.yaml");
        File.WriteAllText(folder.File("departures.yaml"), $"departures:\n  - {{ {Drop} }}\n");

        Assert.Equal(0, Audit(folder, "2026-11-30").Code);
        Assert.Equal(1, Audit(folder, "2026-12-01").Code);
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        Assert.Equal("departures.yaml", json.RootElement.GetProperty("departures")[0].GetProperty("location").GetProperty("file").GetString());
        Assert.Equal(["a.design.yaml", "departures.yaml"], json.RootElement.GetProperty("inputs").EnumerateArray().Select(file => file.GetProperty("path").GetString()));
    }

    [Fact]
    public void Every_format_shows_the_accepted_finding_with_its_reason_and_an_expired_departure_as_a_finding()
    {
        using var folder = new TemporaryFolder();
        Write(folder, "departures:", $"  - {{ {Drop} }}");
        foreach (var (asOf, word) in new[] { ("2026-11-30", "Nobody plugs in more than a lamp."), ("2026-12-01", "record-departure-in-date") })
        {
            string[] reports = ["a.html", "a.md", "a.txt", "a.json", "a.sarif", "a.xml"];
            Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--as-of", asOf, .. reports.SelectMany(report => new[] { "--write", report }), "--write", "a.csv"]);

            Assert.All(reports, report => Assert.Contains(word, File.ReadAllText(folder.File(report)), StringComparison.Ordinal));
        }

        Assert.Contains("departure/voltage-drop-other:GO/1", File.ReadAllText(folder.File("a.csv")), StringComparison.Ordinal);
    }

    [Fact]
    public void A_departure_that_runs_out_is_told_by_a_comparison_as_just_that()
    {
        using var folder = new TemporaryFolder();
        Write(folder, "departures:", $"  - {{ {Drop} }}");
        Audit(folder, "2026-11-30");

        var result = Tool.RunIn(folder.Path, ["compare", "a.json", "a.design.yaml", "--as-of", "2026-12-01", "--fail-on", "nonconforming"]);

        Assert.Equal(1, result.Code);
        Assert.Contains("record-departure-in-date:", result.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("Subjects that came", result.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("Changed in the rule set", result.Output, StringComparison.Ordinal);
    }

    private static ToolResult Audit(TemporaryFolder folder, string asOf) =>
        Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--as-of", asOf, "--fail-on", "nonconforming", "--write", "a.json"]);

    private static string Text() => File.ReadAllText(Repository.PathOf("examples/one-circuit/one-circuit.design.yaml")).Replace("length: 18 m", "length: 60 m", StringComparison.Ordinal);

    private static void Write(TemporaryFolder folder, params IEnumerable<string> lines) =>
        File.WriteAllText(folder.File("a.design.yaml"), Text() + string.Join('\n', lines) + "\n");

    /// <summary>What is not kept, or accepted.</summary>
    private static string[] Findings(TemporaryFolder folder)
    {
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        return [.. json.RootElement.GetProperty("findings").EnumerateArray()
            .Select(finding => $"{finding.GetProperty("key").GetString()} {finding.GetProperty("verdict").GetString()}")
            .Where(finding => finding.EndsWith("nonconforming", StringComparison.Ordinal) || finding.EndsWith("departed", StringComparison.Ordinal))];
    }
}
