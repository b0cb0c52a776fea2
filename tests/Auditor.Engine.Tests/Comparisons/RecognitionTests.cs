using Auditor.Engine.Comparisons;

namespace Auditor.Engine.Tests.Comparisons;

/// <summary>Which circuit is which where ids, names and inputs do not agree.</summary>
public class RecognitionTests
{
    private const string Saw = "- id: 1\n        name: Saw";
    private const string Lamps = "- id: 2\n        name: Lamps";

    [Fact]
    public void A_circuit_that_changed_all_but_its_place_is_the_same_circuit()
    {
        var comparison = Revisions.Compare(Yard.Design, Yard.Design.With("name: Saw", "name: Lathe").With("length: 20 m", "length: 21 m"));

        Assert.Empty(comparison.Subjects);
        Assert.Equal(["B/1 name", "B/1/leg 1 length"], Inputs(comparison));
    }

    [Fact]
    public void Circuits_without_names_that_swap_what_they_state_keep_their_places()
    {
        var before = Yard.Design.With(Saw, "- id: 1").With(Lamps, "- id: 2").With("load: { current: 6 A }", "load: { current: 8 A }")
            .With("device: { rating: 6 A }", "device: { rating: 16 A }").With("cable: { csa: 1.5 mm², length: 30 m }", "cable: { type: small, length: 30 m }");
        var after = before.With("length: 20 m", "length: 20.5 m").With("length: 30 m", "length: 20 m").With("length: 20.5 m", "length: 30 m");

        var comparison = Revisions.Compare(before, after);

        Assert.Empty(comparison.Subjects);
        Assert.Equal(["B/1/leg 1 length", "B/2/leg 1 length"], Inputs(comparison));
    }

    [Fact]
    public void A_declaration_is_believed_even_where_the_new_key_and_name_were_there_before()
    {
        var heater = Yard.Design + "      - id: 9\n        name: Heater\n        device: { rating: 6 A }\n        cable: { csa: 1.5 mm², length: 5 m }\n        load: { current: 1 A }\n";
        var lamps = Yard.Design[Yard.Design.IndexOf("      - id: 2\n        name: Lamps", StringComparison.Ordinal)..];
        var after = heater.With(lamps, "").With("- id: 9\n        name: Heater", "- id: 9\n        formerly: B/2\n        name: Heater");

        var comparison = Revisions.Compare(heater, after);

        Assert.Equal(
            [("B/2", "B/9", true, Recognition.Declared), ("B/9", null, false, null)],
            comparison.Subjects.Select(change => (change.Before!.Key, change.After?.Key, change.IsRenamed, change.By)));
    }

    [Fact]
    public void An_added_or_removed_circuit_is_neither_renamed_nor_moved()
    {
        var shed = Yard.Design[Yard.Design.IndexOf("      - id: 2\n        name: Lamps", StringComparison.Ordinal)..].With("id: 2", "id: 5").With("Lamps", "Shed");
        var change = Assert.Single(Revisions.Compare(Yard.Design + shed, Yard.Design).Subjects);
        var added = Assert.Single(Revisions.Compare(Yard.Design, Yard.Design + shed).Subjects);

        Assert.Equal(("B/5", true, false, false), (added.Subject.Key, added.IsAdded, added.IsRenamed, added.IsMoved));
        Assert.Equal(("B/5", true, false, false), (change.Subject.Key, change.IsRemoved, change.IsRenamed, change.IsMoved));
    }

    [Fact]
    public void Two_rules_cannot_both_be_what_one_was()
    {
        const string Formerly = "formerly: [rcd]\n";
        var comparison = Revisions.Compare(
            Yard.Design, Yard.Design, ("provisions/rcd.yaml", "rule: rcd\n", "rule: shocks\n" + Formerly), ("provisions/rating.yaml", "rule: rating\n", "rule: carries\n" + Formerly));

        Assert.Equal(
            [("carries", false, false), ("rating", false, true), ("shocks", true, false)],
            comparison.RuleSet.Changes.Select(change => (change.Name, change.IsAdded, change.IsRemoved)));
    }

    private static IEnumerable<string> Inputs(RevisionComparison comparison) => comparison.Inputs.Select(input => $"{input.SubjectAfter} {input.Path}");
}
