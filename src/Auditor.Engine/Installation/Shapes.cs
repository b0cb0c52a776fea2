using Auditor.Engine.Departures;
using Auditor.Engine.HouseSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;

namespace Auditor.Engine.Installation;

/// <summary>
/// The kinds of subject and the ways between them. The tree is what every installation has (origin, boards, circuits,
/// legs, bonding conductors); what may be said of each comes from the design schema, what is computed from the sheets.
/// Beside it stands what is on record about the audit itself: the departures, and the changes that a house set makes.
/// </summary>
public sealed class Shapes
{
    /// <summary>Number of the way towards the origin, in every shape.</summary>
    internal const int Up = 0;

    /// <summary>Number of the way to the installation, in every shape.</summary>
    internal const int Origin = 1;

    /// <summary>Number of the way from a circuit to the board that it feeds.</summary>
    internal const int Fed = 2;

    /// <summary>Name of the built-in text that holds a subject's key.</summary>
    internal const string Key = "key";

    /// <summary>Name of the built-in flag of a circuit that feeds a board.</summary>
    internal const string FeedsBoard = "feeds_board";

    /// <summary>Name of the built-in flag of a board that is fed straight from the origin.</summary>
    internal const string IsRoot = "is_root";

    /// <summary>Name of the built-in word that tells what became of a departure.</summary>
    internal const string State = "state";

    /// <summary>Name of the built-in text that holds the day of the audit, at a departure.</summary>
    internal const string AsOf = "as_of";

    /// <summary>Makes the kinds with their ways and collections, without inputs or quantities.</summary>
    public Shapes()
    {
        All = [Installation, Board, Circuit, Leg, Bonding, Departure, Change];
        Link(Installation, [Installation], "has nothing before it");
        Link(Board, [Circuit, Installation], "is fed by nobody");
        Link(Circuit, [Board], "is on no board");
        Link(Leg, [Circuit], "belongs to no circuit");
        Link(Bonding, [Installation], "belongs to no installation");
        Link(Departure, [Installation], "belongs to no installation");
        Link(Change, [Installation], "belongs to no installation");
        Circuit.AddWay("fed", Direction.Down, [Board], "feeds no board");

        Installation.AddCollection("boards", Board);
        Installation.AddCollection("all_circuits", Circuit);
        Installation.AddCollection("bondings", Bonding);
        Board.AddCollection("circuits", Circuit);
        Circuit.AddCollection("legs", Leg);

        foreach (var shape in All)
        {
            shape.AddInput(Key, FormulaType.Text, null);
        }

        Circuit.AddInput(FeedsBoard, FormulaType.Flag, null);
        Board.AddInput(IsRoot, FormulaType.Flag, null);
        Departure.AddInput(State, FormulaType.OneOf(DepartureStateWords.All), null);
        Departure.AddInput(AsOf, FormulaType.Text, null);
        ChangeSubjects.AddInputs(Change);
    }

    /// <summary>The whole installation, seen from its origin.</summary>
    public SubjectShape Installation { get; } = new("installation", 0);

    /// <summary>A distribution board.</summary>
    public SubjectShape Board { get; } = new("board", 1);

    /// <summary>A final or distribution circuit.</summary>
    public SubjectShape Circuit { get; } = new("circuit", 2);

    /// <summary>A stretch of a cable run under one set of conditions.</summary>
    public SubjectShape Leg { get; } = new("leg", 3);

    /// <summary>A bonding conductor.</summary>
    public SubjectShape Bonding { get; } = new("bonding", 4);

    /// <summary>A departure that the design records.</summary>
    public SubjectShape Departure { get; } = new("departure", 5);

    /// <summary>A change that a house set makes to the sets that it is built on.</summary>
    public SubjectShape Change { get; } = new("change", 6);

    /// <summary>All kinds, by number.</summary>
    public IReadOnlyList<SubjectShape> All { get; }

    /// <summary>Whether a kind of subject is no part of the installation, but on record about the audit.</summary>
    public bool IsOnRecord(SubjectShape shape) => shape == Departure || shape == Change;

    /// <summary>The kind of that name, or null.</summary>
    public SubjectShape? Find(string name) => All.FirstOrDefault(shape => shape.Name == name);

    private void Link(SubjectShape shape, IReadOnlyList<SubjectShape> up, string whenNone)
    {
        shape.AddWay("up", Direction.Up, up, whenNone);
        shape.AddWay("origin", Direction.Up, [Installation], whenNone);
    }
}
