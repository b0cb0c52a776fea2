using System.Text.Json;

namespace Auditor.Cli.Tests.Importing;

public class ImportTests
{
    private const string TwoBoards = """
        board,id,name,phase,device.standard,device.curve,device.rating,cable.csa,cable.length,serves,load.current,load.power-factor,points,segregated,feeds
        MSB,1,"Bench, ""long"" side",L1,EN 60898,B,32 A,6 mm²,18 m ± 2 m,socket-outlets; motor,20 A,0.95,12,TRUE,
        MSB,2,123,L1-L2-L3,BS 88-2,,63 A,16 mm²,"20 m, assumed",,,,,,DB1
        DB1,007,Lights: hall,L2,EN 60898,B,6 A,1.5 mm²,30 m,lighting,4 A,90 %,9,false,
        ,,,,,,,,,,,,,,
        """;

    private const string Design = """
        # Made from list.csv. A circuit list says nothing of the job, the rest of the supply, earthing and bonding, and the boards:
        # add what an audit misses. `auditor schema design` prints all that may be said.
        design-format: 1
        supply: { earthing: TN-S, phases: 3, voltage: 400 V }
        boards:
          - id: MSB
            fed-from: origin
            circuits:
              - id: 1
                name: "Bench, \"long\" side"
                phase: L1
                device: { standard: EN 60898, curve: B, rating: 32 A }
                cable: { csa: 6 mm², length: 18 m ± 2 m }
                serves: [socket-outlets, motor]
                load: { current: 20 A, power-factor: 0.95 }
                points: 12
                segregated: true
              - id: 2
                name: "123"
                phase: L1-L2-L3
                device: { standard: BS 88-2, rating: 63 A }
                cable: { csa: 16 mm², length: "20 m, assumed" }
                feeds: DB1
          - id: DB1
            circuits:
              - id: "007"
                name: "Lights: hall"
                phase: L2
                device: { standard: EN 60898, curve: B, rating: 6 A }
                cable: { csa: 1.5 mm², length: 30 m }
                serves: [lighting]
                load: { current: 4 A, power-factor: 90 % }
                points: 9
                segregated: false

        """;

    [Theory]
    [InlineData("\n", "")]
    [InlineData("\r\n", "")]
    [InlineData("\r\n", "\uFEFF")]
    public void A_circuit_list_becomes_a_design_of_its_boards_whatever_ends_its_lines(string lineEnd, string mark)
    {
        var result = Import(mark + TwoBoards.ReplaceLineEndings(lineEnd), CircuitLists.Supply);

        Assert.Equal((0, Design.ReplaceLineEndings("\n"), ""), (result.Code, result.Output, result.Error));
    }

    [Fact]
    public void Any_text_stays_the_text_that_it_is()
    {
        string[] names =
        [
            "true", "null", "1e3", "0x1F", "2026-09-14", "- a", "{ a: b }", "[a]", "# a", "a # b", "a: b", "&a *b !c |", "'a' \\ %b", "? a", "ends with:",
            "première étage, «Œuvre»", "two\nlines\tand a tab",
        ];
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.File("list.csv"), "board,id,name,phase\n" + string.Concat(names.Select((name, index) => $"A,{index},\"{name}\",L1\n")));

        var imported = Tool.RunIn(folder.Path, ["import", "list.csv", .. CircuitLists.Supply, "--write", "a.design.yaml"]);
        Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--write", "a.json"]);

        Assert.Equal((0, ""), (imported.Code, imported.Error));
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        Assert.Equal(names, json.RootElement.GetProperty("subjects").EnumerateArray()
            .Where(subject => subject.GetProperty("kind").GetString() == "circuit").Select(subject => subject.GetProperty("name").GetString()));
    }

    [Fact]
    public void Every_column_on_the_list_is_known_and_comes_from_the_schema()
    {
        var columns = Tool.Run("import", "--columns").Output.Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(line => line.Split(' ')[0]).ToArray();

        Assert.True(columns.Length > 100);
        Assert.Equal(columns.Length, columns.Distinct().Count());
        string[] some = ["board", "id", "feeds", "device.rating", "cable.csa", "cable.length", "load.current", "readings.insulation.live-to-earth", "rcd.type"];
        Assert.All(some, column => Assert.Contains(column, columns));
        Assert.DoesNotContain("cable.type", columns);
        Assert.DoesNotContain("key", columns);
        Assert.Equal(0, Import($"{string.Join(',', columns)}\nA,1{new string(',', columns.Length - 2)}\n", CircuitLists.Supply).Code);
    }

    [Fact]
    public void A_design_that_is_there_already_stays_as_it_is()
    {
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.File("list.csv"), TwoBoards);
        File.WriteAllText(folder.File("a.design.yaml"), "precious");

        var result = Tool.RunIn(folder.Path, ["import", "list.csv", .. CircuitLists.Supply, "--write", "a.design.yaml"]);

        Assert.Equal(2, result.Code);
        Assert.Equal("precious", File.ReadAllText(folder.File("a.design.yaml")));
    }

    [Fact]
    public void Five_hundred_rows_with_ten_bad_cells_are_told_ten_times_and_written_not_at_all()
    {
        using var folder = new TemporaryFolder();
        var sound = CircuitLists.Large(500);
        var list = sound
            .With(2, "cable.length", "25")
            .With(17, "device.rating", "6 V")
            .With(58, "phase", "L4")
            .With(99, "cable.csa", "1;5 mm²")
            .With(140, "serves", "ligting")
            .With(205, "load.current", "-3 A")
            .With(300, "points", "eight")
            .With(377, "load.power-factor", "9")
            .With(444, "id", "")
            .With(501, "device.standard", "EN 60899");
        File.WriteAllText(folder.File("bad.csv"), list);
        File.WriteAllText(folder.File("good.csv"), sound);

        var bad = Tool.RunIn(folder.Path, ["import", "bad.csv", .. CircuitLists.Supply, "--write", "bad.design.yaml"]);
        var good = Tool.RunIn(folder.Path, ["import", "good.csv", .. CircuitLists.Supply, "--write", "good.design.yaml"]);

        Assert.Equal((2, ""), (bad.Code, bad.Output));
        Assert.False(File.Exists(folder.File("bad.design.yaml")));
        Assert.EndsWith("\n10 problems\n", bad.Error, StringComparison.Ordinal);
        Assert.Equal(
            [
                "bad.csv:2:85: error unit-missing: row 2, column cable.length: a length needs its unit",
                "bad.csv:17:33: error wrong-unit: row 17, column device.rating: `V` is not a unit of current",
                "bad.csv:58:19: error unknown-word: row 58, column phase: `L4` is not a phase",
                "bad.csv:99:72: error unreadable-quantity: row 99, column cable.csa: an area is due here, but `;5 mm²` is not a unit",
                "bad.csv:140:95: error unknown-word: row 140, column serves: `ligting` is not a word for an item of `serves`",
                "bad.csv:205:104: error out-of-range: row 205, column load.current: a current cannot be negative here",
                "bad.csv:300:113: error wrong-type: row 300, column points: `points` must be a whole number, not a text",
                "bad.csv:377:108: error out-of-range: row 377, column load.power-factor: a ratio of `9` is beyond any sense: it must be at most 100 %",
                "bad.csv:444:6: error missing-cell: row 444, column id: nothing is said",
                "bad.csv:501:25: error unknown-word: row 501, column device.standard: `EN 60899` is not a standard",
            ],
            bad.Error.Split('\n').Where(line => line.StartsWith("bad.csv:", StringComparison.Ordinal)));
        Assert.Equal(10, bad.Error.Split('\n').Count(line => line.StartsWith("      = ", StringComparison.Ordinal)));
        Assert.Equal((0, "", ""), (good.Code, good.Output, good.Error));
        var audited = Tool.RunIn(folder.Path, ["audit", "good.design.yaml", "--write", "good.json"]);
        Assert.Equal((1, ""), (audited.Code, audited.Error));
        Assert.Contains("findings on 1051 subjects", audited.Output, StringComparison.Ordinal);
    }

    private static ToolResult Import(string list, params string[] options)
    {
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.File("list.csv"), list);
        return Tool.RunIn(folder.Path, ["import", "list.csv", .. options]);
    }
}
