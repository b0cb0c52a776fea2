using Auditor.Engine.Installation;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

public class SubjectTreeTests
{
    private static readonly Design House = Small.Design("house");

    [Fact]
    public void Subjects_come_in_the_order_of_the_design() => Assert.Equal(
        [
            "- installation", "bonding/water bonding", "bonding/gas bonding", "DB1 board", "DB1/1 circuit", "DB1/1/leg 1 leg", "DB1/1/leg 2 leg",
            "DB1/2 circuit", "DB1/2/leg 1 leg",
            "DB1/shed circuit", "DB1/shed/leg 1 leg", "DB2 board", "DB2/1 circuit", "DB2/1/leg 1 leg", "DB2/2 circuit",
        ],
        House.Subjects.Select(subject => $"{subject.Key} {subject.Shape.Name}"));

    [Theory]
    [InlineData("-", null)]
    [InlineData("bonding/water", "-")]
    [InlineData("DB1", "-")]
    [InlineData("DB1/shed", "DB1")]
    [InlineData("DB2", "DB1/shed")]
    [InlineData("DB2/1", "DB2")]
    [InlineData("DB2/1/leg 1", "DB2/1")]
    public void A_subject_hangs_below_what_supplies_it(string key, string? parent) => Assert.Equal(parent, House.Find(key)!.Parent?.Key);

    [Fact]
    public void A_circuit_knows_the_board_that_it_feeds()
    {
        Assert.Equal("DB2", House.Find("DB1/shed")!.FedBoard?.Key);
        Assert.Null(House.Find("DB1/1")!.FedBoard);
        Assert.Null(House.Find("DB1/9"));
    }

    [Theory]
    [InlineData("-", "boards", "DB1 DB2")]
    [InlineData("-", "all_circuits", "DB1/1 DB1/2 DB1/shed DB2/1 DB2/2")]
    [InlineData("-", "bondings", "bonding/water bonding/gas")]
    [InlineData("DB1", "circuits", "DB1/1 DB1/2 DB1/shed")]
    [InlineData("DB1/1", "legs", "DB1/1/leg 1 DB1/1/leg 2")]
    [InlineData("DB2/2", "legs", "")]
    public void A_subject_has_its_collections(string key, string list, string items)
    {
        var subject = House.Find(key)!;

        Assert.Equal(items, string.Join(' ', subject.Collection(subject.Shape.Collection(list)!.Index).Select(item => item.Key)));
    }

    [Theory]
    [InlineData("-", "key", "-")]
    [InlineData("DB1", "is_root", "yes")]
    [InlineData("DB2", "is_root", "no")]
    [InlineData("DB1/shed", "feeds_board", "yes")]
    [InlineData("DB1/1", "feeds_board", "no")]
    [InlineData("DB1/1", "id", "1")]
    [InlineData("DB1/1", "name", "sockets")]
    [InlineData("DB1/shed", "name", "not known")]
    [InlineData("DB1/1/leg 2", "key", "DB1/1/leg 2")]
    [InlineData("bonding/gas", "to", "gas")]
    public void Some_inputs_are_built_in(string key, string input, string value)
    {
        var subject = House.Find(key)!;
        var slot = subject.Shape.Input(input)!;

        Assert.Equal(value, ValueText.Show(subject.Input(slot.Index), slot.Unit));
    }

    [Fact]
    public void The_first_board_is_fed_from_the_origin_unless_a_circuit_feeds_it()
    {
        var plain = Small.Build(Boards("- { id: A }"));
        Assert.Equal("-", plain.Find("A")!.Parent!.Key);

        var turned = Small.Build(Boards("- { id: B }", "- { id: A, fed-from: origin, circuits: [{ id: 1, feeds: B }] }"));
        Assert.Equal("A/1", turned.Find("B")!.Parent!.Key);
    }

    [Fact]
    public void Several_boards_may_be_fed_from_the_origin() =>
        Assert.Equal(["-", "-"], Small.Build(Boards("- { id: A }", "- { id: B, fed-from: origin }")).Subjects.Skip(1).Select(board => board.Parent!.Key));

    [Fact]
    public void A_board_may_be_named_by_a_number_as_a_number_or_as_a_text() =>
        Assert.Equal("A/1", Small.Build(Boards("- { id: A, circuits: [{ id: 1, feeds: 7 }] }", "- { id: \"7\" }")).Find("7")!.Parent!.Key);

    [Fact]
    public void Boards_may_be_sixty_four_deep_and_no_more()
    {
        Assert.Equal(128, Small.Build(Chain(64)).Subjects.Count);

        Assert.Null(Small.TryBuild(Chain(66), Small.Rules, out var problems));
        Assert.Equal(["boards-too-deep 65: boards feed one another more than 64 deep", "boards-too-deep 66: boards feed one another more than 64 deep"],
            problems.All.Select(problem => $"{problem.Code} {problem.Span!.Value.Text}: {problem.Message}"));
    }

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void The_deepest_tree_is_evaluated_from_either_end(bool deepestFirst)
    {
        var boards = Enumerable.Range(1, 64).Select(number => number < 64 ? $"- {{ id: {number}, circuits: [{{ id: x, feeds: {number + 1} }}] }}" : "- { id: 64 }");
        var design = Small.Build(Boards([.. deepestFirst ? boards.Skip(1).Reverse().Append("- { id: 1, fed-from: origin, circuits: [{ id: x, feeds: 2 }] }") : boards]));
        var board = design.Find("64")!;

        Assert.Equal("not known", ValueText.Show(board.Quantity(board.Shape.Quantity("Zdb")!.Index), null));
    }

    [Theory]
    [InlineData("- { id: \"-\", fed-from: origin }", "-")]
    [InlineData("- { id: bonding, fed-from: origin }", "bonding")]
    public void No_board_may_be_called_what_findings_call_something_else(string board, string id)
    {
        Small.TryBuild(Boards("- { id: A, fed-from: origin }", board), Small.Rules, out var problems);

        var problem = Assert.Single(problems.All);
        Assert.Equal(("reserved-id", $"no board may be called `{id}`", 5), (problem.Code, problem.Message, problem.Span!.Value.StartLocation.Line));
    }

    private static string Chain(int count) =>
        Boards([.. Enumerable.Range(1, count).Select(number => number < count ? $"- {{ id: {number}, circuits: [{{ id: x, feeds: {number + 1} }}] }}" : $"- {{ id: {count} }}")]);

    private static string Boards(params string[] boards) =>
        "design-format: 1\nsupply: { earthing: TN-S, phases: 1, voltage: 230 V }\nboards:\n" + string.Join('\n', boards.Select(board => "  " + board)) + "\n";
}
