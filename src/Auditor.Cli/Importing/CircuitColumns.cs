using Auditor.Engine.Installation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;

namespace Auditor.Cli.Importing;

/// <summary>The columns that a circuit list may have: all that the design schema knows of a circuit and of its cable run.</summary>
internal static class CircuitColumns
{
    private const string CablePrefix = "cable.";

    /// <summary>The columns, by the order of the schema.</summary>
    public static IReadOnlyList<CircuitColumn> Of(Shapes shapes)
    {
        var bare = new Shapes();
        var circuit = Inputs(shapes.Circuit, bare.Circuit).Select(slot => new CircuitColumn(slot.Path, slot.Type));
        var cable = Inputs(shapes.Leg, bare.Leg).Select(slot => new CircuitColumn(CablePrefix + slot.Path, slot.Type));
        return [new CircuitColumn(CircuitColumn.Board, FormulaType.Text), .. circuit, .. cable];
    }

    /// <summary>What the schema adds to a shape, groups aside.</summary>
    private static IEnumerable<InputSlot> Inputs(SubjectShape shape, SubjectShape bare) =>
        shape.Inputs.Where(slot => bare.Input(slot.Name) is null && slot.Type.Kind != FormulaKind.Group);
}
