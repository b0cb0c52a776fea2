using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Tests;

/// <summary>Where the files of a design lie, and what the schema says of its inputs.</summary>
public class DesignFileTests
{
    [Theory]
    [InlineData("plans/site.design.yaml", "site.design.yaml")]
    [InlineData("plans/parts/types.yaml", "parts/types.yaml")]
    [InlineData("plans/other.yaml", "plans/other.yaml")]
    [InlineData("rules/sets/iec-base.yaml", "rules/sets/iec-base.yaml")]
    [InlineData("common/types.yaml", "common/types.yaml")]
    public void A_file_of_the_design_is_shown_relative_to_its_folder_and_any_other_as_it_is(string path, string shown)
    {
        var file = new DesignFile(
            "plans/site.design.yaml", Root("design-format: 1\n"),
            [new InputFile("plans/site.design.yaml", ""), new InputFile("plans/parts/types.yaml", ""), new InputFile("common/types.yaml", "")]);

        Assert.Equal(shown, file.Shown(path));
    }

    [Theory]
    [InlineData("circuit", "load.power-factor", 0, 1)]
    [InlineData("installation", "basis.test-temperature", -40, 90)]
    [InlineData("leg", "length", 0, 10_000)]
    [InlineData("circuit", "load.current", 0, 6300)]
    [InlineData("circuit", "name", double.NegativeInfinity, double.PositiveInfinity)]
    public void The_schema_tells_between_which_values_an_input_lies(string shape, string path, double least, double most)
    {
        var schema = Small.LoadSound("small/small.yaml").Schema;
        var kind = schema.Shapes.Find(shape)!;
        var bounds = schema.BoundsOf(kind, kind.Inputs.Single(input => input.Path == path));

        Assert.Equal((least, most), (Math.Round(bounds.Least, 9), Math.Round(bounds.Most, 9)));
    }

    [Fact]
    public void A_short_circuit_current_is_shown_in_the_unit_that_the_schema_asks_for()
    {
        var design = Small.Build(
            "design-format: 1\nsupply: { earthing: TN-S, phases: 1, voltage: 230 V, fault-current: 1500 A }\nboards: [{ id: A }]\n", Small.LoadSound("small/small.yaml"));
        var slot = design.Installation.Shape.Inputs.Single(input => input.Path == "supply.fault-current");

        Assert.Equal(UnitCatalog.Find("kA"), slot.Unit);
        Assert.Equal(1500, design.Installation.Input(slot.Index).Number);
    }

    [Fact]
    public void A_subject_may_state_more_than_most_do()
    {
        var design = Small.Build("""
            design-format: 1
            supply: { earthing: TN-S, phases: 1, voltage: 230 V, frequency: 50 Hz, loop-impedance: 0.3 ohm, fault-current: 1 kA, agreed-capacity: 100 A }
            project: { title: Hut, reference: N1, client: C, address: Lane 1, designer: D, checker: E, revision: R2, notes: None }
            basis: { stage: design, supply-ownership: public, premises: dwelling, ambient: 30 °C, test-temperature: 20 °C, decision: guarded }
            boards: [{ id: A }]

            """);

        Assert.Equal("Hut", Shown(design, "project.title"));
        Assert.Equal("guarded", Shown(design, "basis.decision"));
        Assert.Equal("TN-S", Shown(design, "supply.earthing"));
        Assert.Equal(100, Input(design, "supply.agreed-capacity").Number);
        Assert.Equal(50, Input(design, "supply.frequency").Number);
    }

    private static Value Input(Design design, string path) =>
        design.Installation.Input(design.Installation.Shape.Inputs.Single(input => input.Path == path).Index);

    private static string Shown(Design design, string path) => Input(design, path).Text;

    private static MappingNode Root(string text) => (MappingNode)YamlReader.Read(new SourceText("plans/site.design.yaml", text), new Problems())!;
}
