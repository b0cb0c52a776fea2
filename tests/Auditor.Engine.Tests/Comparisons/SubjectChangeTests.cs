using Auditor.Engine.Comparisons;

namespace Auditor.Engine.Tests.Comparisons;

/// <summary>What is only written, called or placed otherwise brings no news.</summary>
public class SubjectChangeTests
{
    private const string Lamps = """
              - id: 2
                name: Lamps
                device: { rating: 6 A }
                cable: { csa: 1.5 mm², length: 30 m }
                load: { current: 6 A }

        """;

    private static string[] News(RevisionComparison comparison) =>
        [.. comparison.Findings.Where(change => change.Kind != FindingChangeKind.Unchanged).Select(change => $"{change.Kind} {change.Finding.Key}")];

    [Fact]
    public void Reformatting_is_no_news()
    {
        var after = Yard.Design
            .With("{ csa: 10 mm², length: 40 m }", "\n          length: 4000 cm\n          csa: '10.0 mm2'")
            .With("voltage: 230 V", "voltage: 0.23 kV")
            .With("serves: [socket-outlets]", "serves:\n          - socket-outlets")
            .With("{ type: small, length: 20 m }", "{ length: 20 m, csa: 2.5 mm² }");

        var comparison = Revisions.Compare(Yard.Design, after);

        Assert.Empty(News(comparison));
        Assert.Empty(comparison.Inputs);
        Assert.Empty(comparison.Subjects);
    }

    [Fact]
    public void A_tolerance_or_a_standing_is_a_changed_input()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("length: 40 m", "length: 40 m ± 2 m").With("length: 10 m", "length: \"10 m, measured\""));

        Assert.Equal(["A/1/leg 1", "A/2/leg 1"], comparison.Inputs.Select(input => input.SubjectAfter));
    }

    [Fact]
    public void Reordering_boards_and_circuits_is_no_news()
    {
        var boards = Yard.Design[Yard.Design.IndexOf("  - id: A", StringComparison.Ordinal)..];
        var gatehouse = boards[..boards.IndexOf("  - id: B", StringComparison.Ordinal)];
        var workshop = boards[gatehouse.Length..];
        var swapped = Yard.Design.With(boards, workshop.With(Lamps, "").With("    circuits:\n", "    circuits:\n" + Lamps) + gatehouse.With("name: Gatehouse", "name: Gatehouse\n    fed-from: origin"));

        var comparison = Revisions.Compare(Yard.Design, swapped);

        Assert.Empty(News(comparison));
        Assert.Equal(["fed-from"], comparison.Inputs.Select(input => input.Path));
        Assert.Empty(comparison.Subjects);
    }

    [Fact]
    public void A_circuit_under_another_id_is_known_by_its_name_and_inputs()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("- id: 2\n        name: Kiosk", "- id: 7\n        name: Kiosk"));

        Assert.Empty(News(comparison));
        Assert.Empty(comparison.Inputs);
        var change = Assert.Single(comparison.Subjects);
        Assert.Equal(("A/2", "A/7", true, false, Recognition.Content), (change.Before!.Key, change.After!.Key, change.IsRenamed, change.IsMoved, change.By));
    }

    [Fact]
    public void Circuits_that_swap_their_ids_are_known_by_name_even_where_one_of_them_changed()
    {
        var after = Yard.Design
            .With("- id: 1\n        name: Saw", "- id: 2\n        name: Saw")
            .With("- id: 2\n        name: Lamps", "- id: 1\n        name: Lamps")
            .With("length: 20 m", "length: 22 m");

        var comparison = Revisions.Compare(Yard.Design, after);

        Assert.Equal(["Closer drop:B/2"], News(comparison));
        Assert.Equal(["B/2/leg 1 length"], comparison.Inputs.Select(input => $"{input.SubjectAfter} {input.Path}"));
        Assert.Equal([Recognition.Name, Recognition.Content], comparison.Subjects.Select(change => change.By!.Value));
    }

    [Fact]
    public void A_board_under_another_id_keeps_its_circuits_and_its_feeder()
    {
        var after = Yard.Design.With("- id: B", "- id: WS").With("feeds: B", "feeds: WS");

        var comparison = Revisions.Compare(Yard.Design, after);

        Assert.Empty(News(comparison));
        Assert.Empty(comparison.Inputs);
        var change = Assert.Single(comparison.Subjects);
        Assert.Equal(("B", "WS", true, false), (change.Before!.Key, change.After!.Key, change.IsRenamed, change.IsMoved));
    }

    [Fact]
    public void A_nonconformity_of_a_circuit_that_moved_to_another_board_is_not_new()
    {
        const string Kiosk = "      - id: 2\n        name: Kiosk\n        device: { rating: 16 A }\n        cable: { type: small, length: 10 m }\n"
            + "        serves: [socket-outlets]\n        load: { current: 12 A }\n";
        var after = Yard.Design.With(Kiosk, "") + Kiosk.With("- id: 2", "- id: 3");

        var comparison = Revisions.Compare(Yard.Design, after);

        var change = Assert.Single(comparison.Subjects);
        Assert.Equal(("A/2", "B/3", true), (change.Before!.Key, change.After!.Key, change.IsMoved));
        Assert.Equal(["rcd:B/3"], comparison.Of(FindingChangeKind.Unchanged).Where(finding => finding.Finding.IsRequirement).Select(finding => finding.Finding.Key));
        Assert.DoesNotContain(comparison.Findings, finding => finding.Kind == FindingChangeKind.Undetermined);

        // Behind the feeder, which now carries 26 A, the kiosk has 4.16 V + 1.68 V; that is 2.54 % where it was 0.73 %.
        var drop = comparison.Findings.Single(finding => finding.Finding.Key == "drop:B/3");
        Assert.Equal(("0.7304 %", "2.539 %"), (drop.Before!.Value!.Text, drop.After!.Value!.Text));
        Assert.Equal(MovedBy.Design, drop.MovedBy);
        Assert.Same(change, Assert.Single(drop.Causes));

        // What the saw draws did not change: its margin fell because the kiosk moved behind its feeder.
        Assert.Same(change, Assert.Single(comparison.Findings.Single(finding => finding.Finding.Key == "drop:B/1").Causes));
    }

    [Fact]
    public void A_declared_former_key_is_believed_before_any_likeness()
    {
        var after = Yard.Design
            .With("- id: 2\n        name: Lamps", "- id: 9\n        formerly: B/2\n        name: Yard lighting")
            .With("csa: 1.5 mm², length: 30 m", "csa: 4 mm², length: 33 m");

        var comparison = Revisions.Compare(Yard.Design, after);

        var change = Assert.Single(comparison.Subjects);
        Assert.Equal(("B/2", "B/9", Recognition.Declared), (change.Before!.Key, change.After!.Key, change.By));
        Assert.Equal(["name", "csa", "length"], comparison.Inputs.Select(input => input.Path));
    }

    [Fact]
    public void A_declaration_that_stays_in_the_file_speaks_only_of_the_renaming_it_was_made_for()
    {
        var renamed = Yard.Design.With("- id: 2\n        name: Lamps", "- id: 9\n        formerly: B/2\n        name: Lamps");
        var reused = renamed + Lamps.With("Lamps", "Heater").With("length: 30 m", "length: 5 m");

        var comparison = Revisions.Compare(reused, reused.With("length: 5 m", "length: 6 m"));

        Assert.Empty(comparison.Subjects);
        Assert.Equal(["B/2/leg 1 length"], comparison.Inputs.Select(input => $"{input.SubjectAfter} {input.Path}"));
    }

    [Fact]
    public void A_name_that_others_bear_too_identifies_nothing()
    {
        var before = Yard.Design.With("name: Kiosk", "name: Lamps");
        var after = before.With("- id: 2\n        name: Lamps\n        device: { rating: 6 A }", "- id: 5\n        name: Lamps\n        device: { rating: 10 A }");

        var comparison = Revisions.Compare(before, after);

        Assert.Equal([("B/5", true, false), ("B/2", false, true)], comparison.Subjects.Select(change => (change.Subject.Key, change.IsAdded, change.IsRemoved)));
    }

    [Fact]
    public void What_an_added_circuit_brings_is_news_and_so_is_what_it_does_to_others()
    {
        var after = Yard.Design + Lamps.With("id: 2", "id: 3").With("Lamps", "Sockets").With("load:", "serves: [socket-outlets]\n        load:");

        var comparison = Revisions.Compare(Yard.Design, after);

        Assert.Equal(["New rcd:B/3", "Closer drop:A/1", "Closer rating:A/1", "Closer drop:B/1", "Closer drop:B/2"], News(comparison));
        Assert.All(comparison.Findings.Where(change => change.Kind != FindingChangeKind.Unchanged), change =>
            Assert.True(Assert.IsType<SubjectChange>(Assert.Single(change.Causes)).IsAdded));
    }

    [Fact]
    public void A_nonconformity_of_a_removed_circuit_is_gone_with_it()
    {
        var kiosk = Yard.Design[Yard.Design.IndexOf("      - id: 2\n        name: Kiosk", StringComparison.Ordinal)..Yard.Design.IndexOf("  - id: B", StringComparison.Ordinal)];

        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With(kiosk, ""));

        Assert.Equal(["Gone rcd:A/2"], News(comparison));
        Assert.True(Assert.Single(comparison.Subjects).IsRemoved);
    }

    [Fact]
    public void A_leg_put_in_front_leaves_the_others_what_they_are()
    {
        var after = Yard.Design.With("cable: { csa: 1.5 mm², length: 30 m }", "legs: [{ csa: 4 mm², length: 3 m }, { csa: 1.5 mm², length: 30 m }]");

        var comparison = Revisions.Compare(Yard.Design, after);

        Assert.Empty(comparison.Inputs);
        Assert.Equal("B/2/leg 1", Assert.Single(comparison.Subjects).Subject.Key);
        Assert.Equal(["Closer drop:B/2"], News(comparison));
    }

    [Fact]
    public void A_bonding_conductor_whose_end_is_called_otherwise_is_known_by_the_rest()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("to: gas", "to: gas service"));

        Assert.Equal(("bonding/gas", "bonding/gas service"), (Assert.Single(comparison.Subjects).Before!.Key, comparison.Subjects[0].After!.Key));
    }
}
