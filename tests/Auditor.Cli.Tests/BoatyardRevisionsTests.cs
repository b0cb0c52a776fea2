using System.Text.Json;

namespace Auditor.Cli.Tests;

/// <summary>
/// The boatyard in three revisions. The second says the same otherwise: a circuit renumbered, one moved to another board, circuits and
/// boards in another order, YAML in another layout. The third lengthens one cable and puts one bonding conductor right.
/// </summary>
public class BoatyardRevisionsTests
{
    private const string Golden = "tests/Auditor.Cli.Tests/BoatyardRevisionsTests";
    private const string Design = "boatyard.design.yaml";
    private const string Office = "boards/office.board.yaml";
    private const string Welding = "boards/welding.board.yaml";

    [Fact]
    public void Another_order_layout_number_or_board_is_no_new_finding()
    {
        using var repository = Boatyard();

        var result = Tool.RunIn(repository.Path, ["compare", $"first:{Design}", $"second:{Design}", "--write", "changes.json"]);

        Assert.Equal((0, ""), (result.Code, result.Error));
        using var json = JsonDocument.Parse(File.ReadAllText(repository.File("changes.json")));
        var newOrWorse = json.RootElement.GetProperty("findings").EnumerateArray().Where(finding => finding.GetProperty("newOrWorse").GetBoolean());
        // What the move of a load truly changes: the board it came to is less evenly loaded.
        Assert.Equal("phase-balance:DBW", Assert.Single(newOrWorse).GetProperty("key").GetString());
        var subjects = json.RootElement.GetProperty("subjects").EnumerateArray()
            .Select(subject => (subject.GetProperty("before").GetString(), subject.GetProperty("after").GetString()));
        Assert.Equal([("DBO/5", "DBW/9"), ("DBO/4", "DBO/14")], subjects);
    }

    [Fact]
    public void A_longer_cable_and_a_mended_bond_are_told_with_what_they_moved()
    {
        using var repository = Boatyard();

        var result = Tool.RunIn(repository.Path, ["compare", $"second:{Design}", $"third:{Design}", "--write", "changes.md", "--fail-on", "recommendation"]);

        Assert.Equal((1, ""), (result.Code, result.Error));
        Auditor.Testing.Golden.Match(File.ReadAllText(repository.File("changes.md")), Golden, "md");
    }

    private static GitRepository Boatyard()
    {
        var repository = new GitRepository("examples/boatyard");
        repository.Edit(Office, "- id: 4\n", "- id: 14\n");
        Move(repository, Office, "  - id: 3\n", "  - id: 14\n", Office, "  - id: 1\n");
        repository.Edit(Office, "device: { type: b6 }", "device:\n      type: \"b6\" # six amperes");
        repository.Edit(Office, "- id: 5\n    name: Panel heaters\n", "- id: 9\n    name: Panel heaters\n    phase: L3\n");
        repository.Edit(Office, "type: flat-2.5, length: 18 m }", "type: flat-2.5, length: 18 m, method: C, grouped-circuits: 1, ambient: 30 °C }");
        Move(repository, Office, "  - id: 9\n", "  - id: 6\n", Welding, "  - id: 1\n");
        Move(repository, Design, "  - id: DBH\n", "  - id: DBW\n", Design, "  - id: MSB\n");
        repository.Commit("second");
        repository.Edit(Design, "length: 128 m", "length: 150 m");
        repository.Edit(Design, "part: structural-steel, csa: 10 mm²", "part: structural-steel, csa: 16 mm²");
        repository.Commit("third");
        return repository;
    }

    /// <summary>Moves the lines from one text up to another one in front of a third.</summary>
    private static void Move(GitRepository repository, string file, string from, string until, string otherFile, string before)
    {
        var text = File.ReadAllText(repository.File(file));
        var start = text.IndexOf(from, StringComparison.Ordinal);
        var moved = text[start..text.IndexOf(until, start, StringComparison.Ordinal)];
        repository.Edit(file, moved, "");
        repository.Edit(otherFile, before, moved + before);
    }
}
