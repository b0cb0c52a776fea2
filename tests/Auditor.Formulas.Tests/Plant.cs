using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Formulas.Tests;

/// <summary>A small world of subjects for the tests: an installation, its boards, their circuits and the legs of those.</summary>
internal static class Plant
{
    static Plant()
    {
        Installation.AddWay("up", Direction.Up, [Installation], "has nothing before it");
        Board.AddWay("up", Direction.Up, [Circuit, Installation], "is fed by nobody");
        Board.AddWay("origin", Direction.Up, [Installation], "is fed by nobody");
        Circuit.AddWay("up", Direction.Up, [Board], "is on no board");
        Circuit.AddWay("origin", Direction.Up, [Installation], "is on no board");
        Circuit.AddWay("fed", Direction.Down, [Board], "feeds no board");
        Leg.AddWay("up", Direction.Up, [Circuit], "belongs to no circuit");
        Installation.AddCollection("boards", Board);
        Board.AddCollection("circuits", Circuit);
        Circuit.AddCollection("legs", Leg);
        Describe();
    }

    public static SubjectShape Installation { get; } = new("installation", 0);

    public static SubjectShape Board { get; } = new("board", 1);

    public static SubjectShape Circuit { get; } = new("circuit", 2);

    public static SubjectShape Leg { get; } = new("leg", 3);

    public static Dictionary<string, ParameterSlot> Parameters { get; } = [];

    private static void Describe()
    {
        foreach (var (name, unit) in new[]
        {
            ("Z", "Ω"), ("R", "Ω"), ("X", "Ω"), ("U", "V"), ("I", "A"), ("t", "s"), ("L", "m"), ("S", "mm²"), ("theta", "°C"), ("delta", "K"), ("alpha", "1/K"),
            ("k", "A·s^½/mm²"), ("n", "1"), ("share", "%"), ("P", "W"), ("device.rating", "A"), ("rcd.residual-current", "mA"),
        })
        {
            Circuit.AddInput(name, Quantity(unit), UnitCatalog.Find(unit));
        }

        Circuit.AddInput("on", FormulaType.Flag, null);
        Circuit.AddInput("wet", FormulaType.Flag, null);
        Circuit.AddInput("kind", FormulaType.OneOf(["ring", "radial"]), null);
        Circuit.AddInput("remark", FormulaType.Text, null);
        Circuit.AddInput("serves", FormulaType.WordsOf(["lighting", "socket-outlets"]), null);
        Circuit.AddInput("rcd", FormulaType.Group, null);
        Circuit.AddInput("device.standard", FormulaType.Text, null);
        Circuit.AddInput("device.curve", FormulaType.OneOf(["B", "C", "D"]), null);
        Circuit.AddQuantity("Zs", Quantity("Ω"), UnitCatalog.Find("Ω"));
        Circuit.AddQuantity("Ib", Quantity("A"), UnitCatalog.Find("A"));

        Installation.AddInput("Ze", Quantity("Ω"), UnitCatalog.Find("Ω"));
        Installation.AddInput("system", FormulaType.OneOf(["TN", "TT"]), null);
        Installation.AddQuantity("Zs", Quantity("Ω"), UnitCatalog.Find("Ω"));
        Installation.AddQuantity("U0", Quantity("V"), UnitCatalog.Find("V"));
        Board.AddInput("rated-current", Quantity("A"), UnitCatalog.Find("A"));
        Board.AddInput("rcd", FormulaType.Group, null);
        Board.AddQuantity("Zdb", Quantity("Ω"), UnitCatalog.Find("Ω"));
        Circuit.AddQuantity("U0", Quantity("A"), UnitCatalog.Find("A"));
        Leg.AddInput("r", Quantity("mΩ/m"), UnitCatalog.Find("mΩ/m"));
        Leg.AddInput("length", Quantity("m"), UnitCatalog.Find("m"));
        Leg.AddInput("buried", FormulaType.Flag, null);
        Leg.AddInput("theta", Quantity("°C"), UnitCatalog.Find("°C"));

        Parameters.Add("cmin", new ParameterSlot("cmin", 0, FormulaType.Number, Unit.One));
        Parameters.Add("limit", new ParameterSlot("limit", 1, Quantity("V"), UnitCatalog.Find("V")));
        Parameters.Add("area", new ParameterSlot("area", 2, Quantity("mm²"), UnitCatalog.Find("mm²")));
    }

    private static FormulaType Quantity(string unit) => FormulaType.Of(UnitCatalog.Find(unit)!.Dimension);
}
