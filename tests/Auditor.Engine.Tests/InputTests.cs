using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Tests;

public class InputTests
{
    private static readonly Design House = Small.Design("house");

    [Theory]
    [InlineData("DB1/1/leg 1", "csa", "2.5 mm²")]
    [InlineData("DB1/1/leg 1", "cpc", "1.5 mm²")]
    [InlineData("DB1/1/leg 2", "cpc", "2.5 mm²")]
    [InlineData("DB1/1/leg 1", "method", "C")]
    [InlineData("DB1/2/leg 1", "method", "100")]
    [InlineData("DB1/2/leg 1", "cpc", "1 mm²")]
    [InlineData("DB1/shed/leg 1", "cpc", "4 mm²")]
    [InlineData("DB2/1/leg 1", "method", "C")]
    [InlineData("DB2/1/leg 1", "ambient", "not known")]
    [InlineData("DB1/1", "device.rating", "32 A")]
    [InlineData("DB1/2", "device.rating", "10 A")]
    [InlineData("DB1/2", "device.curve", "B")]
    [InlineData("DB2/1", "device.rating", "16 A")]
    [InlineData("DB2/2", "device.rating", "not known")]
    public void An_input_is_the_subjects_own_else_that_of_its_type_else_the_boards_default(string key, string input, string value) =>
        Assert.Equal(value, Shown(House, key, input));

    [Theory]
    [InlineData("DB1", "method")]
    [InlineData("DB1/1", "method")]
    public void A_default_for_cables_is_no_input_of_board_or_circuit(string key, string input) => Assert.Null(House.Find(key)!.Shape.Input(input));

    [Theory]
    [InlineData("loop-impedance: 0.35 ohm", "0.35 Ω", "not known", "not known")]
    [InlineData("loop-impedance: { resistance: 0.3 ohm, reactance: 0.4 ohm }", "not known", "0.3 Ω", "0.5 Ω")]
    [InlineData("phases: 1", "not known", "not known", "not known")]
    public void The_loop_impedance_is_one_figure_or_two_parts(string line, string whole, string resistance, string ze)
    {
        var phases = line.Contains("phases") ? "" : "phases: 1";
        var design = Small.Build(
            $$"""
            design-format: 1
            supply:
              earthing: TN-S
              voltage: 230 V
              {{line}}
              {{phases}}
            boards:
              - id: A
            """);

        Assert.Equal(whole, Shown(design, "-", "supply.loop_impedance"));
        Assert.Equal(resistance, Shown(design, "-", "supply.loop_impedance.resistance"));
        Assert.Equal(ze == "not known" ? whole : ze, Computed(design, "-", "Zs"));
    }

    [Theory]
    [InlineData("rcd", "DB1/1", true)]
    [InlineData("rcd", "DB1/2", false)]
    [InlineData("device", "DB1/1", true)]
    [InlineData("device", "DB2/2", false)]
    [InlineData("load", "DB1/1", false)]
    public void A_group_of_inputs_is_there_or_not(string group, string key, bool isThere)
    {
        var subject = House.Find(key)!;

        Assert.Equal(!isThere, subject.Input(subject.Shape.Input(group)!.Index).IsMissing);
    }

    [Theory]
    [InlineData("load: { power-factor: 0.9 }", "load.power_factor", "0.9", Marks.None)]
    [InlineData("load: { power-factor: 90 % }", "load.power_factor", "0.9", Marks.None)]
    [InlineData("load: { current: \"5 A, assumed\" }", "load.current", "5 A", Marks.Assumed)]
    [InlineData("load: { current: 5 A ± 10 %, declared }", "load.current", "5 A", Marks.None)]
    [InlineData("load: { current: \"5000 mA, measured\" }", "load.current", "5 A", Marks.None)]
    [InlineData("points: 6", "points", "6", Marks.None)]
    [InlineData("serves: [lighting, cooker]", "serves", "lighting, cooker", Marks.None)]
    [InlineData("serves: []", "serves", "", Marks.None)]
    [InlineData("supplementary-bonding: true", "supplementary_bonding", "yes", Marks.None)]
    [InlineData("supplementary-bonding: false", "supplementary_bonding", "no", Marks.None)]
    [InlineData("name: \"true\"", "name", "true", Marks.None)]
    [InlineData("rcd: { residual-current: 30 mA }", "rcd.residual_current", "30 mA", Marks.None)]
    public void An_input_is_read_as_what_the_schema_says_it_is(string line, string input, string value, Marks marks)
    {
        var written = line.Replace("5 A ± 10 %, declared", "\"5 A ± 10 %, declared\"");
        var design = Small.Build(
            $$"""
            design-format: 1
            supply: { earthing: TN-S, phases: 1, voltage: 230 V }
            boards:
              - id: A
                circuits:
                  - id: 1
                    {{written}}
            """);
        var circuit = design.Find("A/1")!;

        Assert.Equal(value, Shown(design, "A/1", input));
        Assert.Equal(marks, circuit.Input(circuit.Shape.Input(input)!.Index).Marks);
    }

    [Fact]
    public void What_is_not_given_is_told_with_its_path_in_the_file()
    {
        var circuit = House.Find("DB2/2")!;
        var value = circuit.Input(circuit.Shape.Input("device.breaking_capacity")!.Index);

        Assert.Equal("DB2/2: `device.breaking-capacity` is not given", Assert.Single(value.Absences.Items).ToString());
    }

    [Theory]
    [InlineData("DB1/1/leg 2", "cpc", "2.5 mm²", 33)]
    [InlineData("DB1/1/leg 2", "csa", "2.5 mm²", 15)]
    [InlineData("DB1/2/leg 1", "cpc", "1.0 mm²", 23)]
    [InlineData("DB1/2", "device.rating", "10 A", 36)]
    [InlineData("-", "supply.loop_impedance", "0.35 ohm, assumed", 6)]
    public void The_place_of_an_input_is_where_it_was_said(string key, string input, string text, int line)
    {
        var subject = House.Find(key)!;
        var source = subject.Source(subject.Shape.Input(input)!)!;

        Assert.Equal(text, source.Text);
        Assert.Equal(line, source.Span.StartLocation.Line);
    }

    private static string Shown(Design design, string key, string input)
    {
        var subject = design.Find(key)!;
        var slot = subject.Shape.Input(input)!;
        return ValueText.Show(subject.Input(slot.Index), slot.Unit);
    }

    private static string Computed(Design design, string key, string symbol)
    {
        var subject = design.Find(key)!;
        var slot = subject.Shape.Quantity(symbol)!;
        return ValueText.Show(subject.Quantity(slot.Index), slot.Unit);
    }
}
