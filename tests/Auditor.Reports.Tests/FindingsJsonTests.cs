using System.Text;
using System.Text.Json;
using Auditor.Documents;
using Auditor.Reports.Json;
using Auditor.Testing;

namespace Auditor.Reports.Tests;

public class FindingsJsonTests
{
    private static readonly Schema Findings =
        Schema.Parse(new SourceText("findings.schema.json", File.ReadAllText(Repository.PathOf("rules/schema/findings.schema.json"))));

    [Theory]
    [InlineData("garden", false)]
    [InlineData("garden", true)]
    [InlineData("hostile", true)]
    [InlineData("small", true)]
    public void Findings_keep_their_schema(string design, bool evidence)
    {
        var problems = new Problems();

        // JSON is YAML, so that the reader of designs reads it, and the schema says where it is wrong.
        Findings.Validate(YamlReader.Read(new SourceText("findings.json", Write(design, evidence)), problems)!, problems);

        Assert.Equal("", ProblemText.Render(problems.All));
    }

    [Fact]
    public void The_schema_would_find_a_slip()
    {
        var problems = new Problems();
        var text = Write("garden", evidence: true).Replace("\"worstCase\":null", "\"worstCase\":\"none\"", StringComparison.Ordinal);

        Findings.Validate(YamlReader.Read(new SourceText("findings.json", text), problems)!, problems);

        Assert.True(problems.HasErrors);
    }

    [Fact]
    public void The_file_is_UTF8_without_a_mark_and_its_lines_end_with_LF()
    {
        var bytes = Sheds.Json(Sheds.Audit("garden"), new FindingsOptions());
        var text = Encoding.UTF8.GetString(bytes);

        Assert.Equal((byte)'{', bytes[0]);
        Assert.EndsWith("}\n", text, StringComparison.Ordinal);
        Assert.DoesNotContain('\r', text);
        Assert.Contains("\"unit\":\"mm²\"", text, StringComparison.Ordinal);
        Assert.DoesNotContain("\\u", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Hostile_text_comes_back_as_it_was()
    {
        using var json = Parse("hostile", evidence: false);

        Assert.Equal("A|B/`1`", json.RootElement.GetProperty("subjects")[2].GetProperty("key").GetString());
        Assert.Equal("</details><script>alert(1)</script>", json.RootElement.GetProperty("subjects")[1].GetProperty("name").GetString());
    }

    [Fact]
    public void Numbers_have_twelve_significant_digits()
    {
        using var json = Parse("small", evidence: true);
        var circuit = json.RootElement.GetProperty("quantities").GetProperty("A/1");

        Assert.Equal("3.33333333333", circuit.GetProperty("third").GetProperty("value").GetRawText());
        Assert.Equal("20", circuit.GetProperty("Iz").GetProperty("value").GetRawText());
    }

    [Fact]
    public void Evidence_is_there_for_the_asking_only()
    {
        using var without = Parse("garden", evidence: false);
        using var with = Parse("garden", evidence: true);

        Assert.False(without.RootElement.TryGetProperty("stated", out _));
        Assert.False(without.RootElement.TryGetProperty("quantities", out _));
        Assert.Equal(12, with.RootElement.GetProperty("stated").EnumerateObject().Count());
        Assert.Equal(12, with.RootElement.GetProperty("quantities").EnumerateObject().Count());
    }

    [Theory]
    [InlineData("A/1/leg 1", "csa", "1.5 mm²", "designed", "type", "garden.design.yaml:16:18")]
    [InlineData("A/1/leg 1", "length", "12 m ± 2 m, assumed", "assumed", "subject", "garden/circuits.yaml:5:34")]
    [InlineData("A/1/leg 1", "ambient", "30 °C", "designed", "defaults", "garden.design.yaml:27:26")]
    [InlineData("A/2/leg 2", "length", "14 m, measured", "measured", "subject", "garden/circuits.yaml:13:31")]
    [InlineData("A/1", "serves", "lighting", "designed", "subject", "garden/circuits.yaml:6:13")]
    [InlineData("-", "supply.phases", "1", "designed", "subject", "garden.design.yaml:9:33")]
    public void What_the_design_states_is_told_with_where_it_was_said(
        string subject, string input, string text, string standing, string from, string place)
    {
        using var json = Parse("garden", evidence: true);
        var stated = json.RootElement.GetProperty("stated").GetProperty(subject).GetProperty(input);

        Assert.Equal(
            (text, standing, from),
            (stated.GetProperty("text").GetString(), stated.GetProperty("standing").GetString(), stated.GetProperty("from").GetString()));
        Assert.Equal(place, PlaceOf(stated));
    }

    [Fact]
    public void A_quantity_tells_its_formula_and_what_it_was_computed_from()
    {
        using var json = Parse("garden", evidence: true);
        var capacity = json.RootElement.GetProperty("quantities").GetProperty("A/2/leg 2").GetProperty("It");

        Assert.Equal("capacity ?? table('shed-capacity', csa)", capacity.GetProperty("formula").GetString());
        Assert.Equal("(not known) ?? (30 A)", capacity.GetProperty("withNumbers").GetString());
        Assert.Equal("rules/sheets/shed.yaml:8:14", PlaceOf(capacity));
        Assert.Equal(
            [
                "input A/2/leg 2 capacity = null A [none] , ",
                "input A/2/leg 2 csa = 4 mm² [garden/circuits.yaml:13:16] , ",
                "table  Shed table 1, row 4 = 30 A [rules/tables/shed-capacity/shed-capacity.yaml:10:1] The Shed Book, page 3, memory",
            ],
            capacity.GetProperty("from").EnumerateArray().Select(Shown));
    }

    [Fact]
    public void A_quantity_that_cannot_be_computed_tells_what_is_missing()
    {
        using var json = Parse("garden", evidence: true);
        var run = json.RootElement.GetProperty("quantities").GetProperty("A/4").GetProperty("run");

        Assert.Equal(JsonValueKind.Null, run.GetProperty("value").ValueKind);
        var gap = Assert.Single(run.GetProperty("missing").EnumerateArray());
        Assert.Equal(
            ("A/4/leg 1", "length", "`length` is not given"),
            (gap.GetProperty("subject").GetString(), gap.GetProperty("name").GetString(), gap.GetProperty("reason").GetString()));
    }

    private static string Write(string design, bool evidence) =>
        Encoding.UTF8.GetString(Sheds.Json(Sheds.Audit(design), new FindingsOptions(evidence)));

    private static JsonDocument Parse(string design, bool evidence) => JsonDocument.Parse(Write(design, evidence));

    private static string PlaceOf(JsonElement owner) => owner.GetProperty("location") is { ValueKind: JsonValueKind.Object } place
        ? $"{place.GetProperty("file").GetString()}:{place.GetProperty("line").GetInt32()}:{place.GetProperty("column").GetInt32()}"
        : "none";

    private static string Shown(JsonElement from) =>
        $"{from.GetProperty("kind").GetString()} {from.GetProperty("subject").GetString()} {from.GetProperty("name").GetString()} = "
        + $"{from.GetProperty("value").GetRawText()} {from.GetProperty("unit").GetString()} [{PlaceOf(from)}] "
        + $"{from.GetProperty("source").GetString()}, {from.GetProperty("trust").GetString()}";
}
