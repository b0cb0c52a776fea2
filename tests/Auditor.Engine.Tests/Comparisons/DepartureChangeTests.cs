using Auditor.Engine.Comparisons;

namespace Auditor.Engine.Tests.Comparisons;

public class DepartureChangeTests
{
    private const string Departed = Yard.Design
        + "departures: [{ rule: spare, subject: A, reason: The yard will not grow., agreed-by: T. Example, date: 2026-10-01, until: 2027-10-01 }]\n";

    [Fact]
    public void A_departure_that_came_accepts_the_nonconformity_and_moves_no_margin()
    {
        var comparison = Revisions.Compare(Yard.Design, Departed);

        var change = Assert.Single(comparison.Of(FindingChangeKind.Accepted));
        Assert.Equal(("spare:A", MovedBy.Departure), (change.Finding.Key, change.MovedBy));
        Assert.Null(Assert.Single(comparison.Departures).Before);
    }

    [Fact]
    public void A_departure_that_went_leaves_a_new_nonconformity()
    {
        var comparison = Revisions.Compare(Departed, Yard.Design);

        var change = Assert.Single(comparison.Of(FindingChangeKind.New));
        Assert.Equal(("spare:A", MovedBy.Departure), (change.Finding.Key, change.MovedBy));
        Assert.Null(Assert.Single(comparison.Departures).After);
    }

    [Fact]
    public void A_departed_nonconformity_that_grew_is_worse()
    {
        var change = Assert.Single(Revisions.Compare(Departed, Departed.With("spare-ways: 1", "spare-ways: 0")).Of(FindingChangeKind.Worse));

        Assert.Equal("departed", change.Finding.VerdictText);
        Assert.True(change.IsNewOrWorse);
    }

    [Fact]
    public void A_departure_follows_its_board_when_that_is_renamed()
    {
        var comparison = Revisions.Compare(Departed, Departed.With("- id: A", "- id: GH").With("subject: A", "subject: GH"));

        Assert.Empty(comparison.Departures);
        Assert.Equal(["rcd:GH/2", "spare:GH"], comparison.Of(FindingChangeKind.Unchanged).Select(change => change.Finding.Key));
    }

    [Fact]
    public void Another_reason_or_last_day_is_told()
    {
        var comparison = Revisions.Compare(Departed, Departed.With("until: 2027-10-01", "until: 2030-10-01"));

        var change = Assert.Single(comparison.Departures);
        Assert.Equal(("2027-10-01", "2030-10-01"), (change.Before!.Until, change.After!.Until));
    }
}
