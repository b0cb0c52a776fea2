using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Engine.Installation;

/// <summary>An input as the design states it.</summary>
/// <param name="Subject">The subject that has it.</param>
/// <param name="Slot">The input.</param>
/// <param name="Text">Its value as written; a list of words with commas between.</param>
/// <param name="Standing">How it came to be known.</param>
/// <param name="From">Where it was said: <c>subject</c>, <c>type</c> or <c>defaults</c>.</param>
/// <param name="Span">Where it stands.</param>
public sealed record StatedInput(DesignSubject Subject, InputSlot Slot, string Text, Standing Standing, string From, SourceSpan Span)
{
    /// <summary>Every input that the design states of a subject, in the order of its shape.</summary>
    public static IEnumerable<StatedInput> Of(DesignSubject subject) =>
        subject.Shape.Inputs.Where(slot => slot.Type.Kind != FormulaKind.Group).Select(slot => Of(subject, slot)).OfType<StatedInput>();

    /// <summary>One input as the design states it; null where it does not.</summary>
    public static StatedInput? Of(DesignSubject subject, InputSlot slot) => subject.Statement(slot) switch
    {
        ScalarNode scalar => new StatedInput(subject, slot, scalar.Text, StandingOf(slot, scalar), FromOf(subject, slot, scalar), scalar.Span),
        SequenceNode list => new StatedInput(subject, slot, Words(list), Standing.Designed, FromOf(subject, slot, list), list.Span),
        _ => null,
    };

    private static string Words(SequenceNode list) => string.Join(", ", list.Items.OfType<ScalarNode>().Select(item => item.Text));

    private static Standing StandingOf(InputSlot slot, ScalarNode scalar) =>
        slot.Type.Kind == FormulaKind.Quantity && QuantityText.TryParse(scalar.Text, out var stated, out _) ? stated.Standing : Standing.Designed;

    private static string FromOf(DesignSubject subject, InputSlot slot, Node node)
    {
        if (ReferenceEquals(Walk(subject.Node, slot), node))
        {
            return "subject";
        }

        var defaults = subject.Parent?.Parent?.Node.Mapping("defaults");
        return defaults is not null && ReferenceEquals(Walk(defaults, slot), node) ? "defaults" : "type";
    }

    private static Node? Walk(MappingNode start, InputSlot slot)
    {
        Node? node = start;
        foreach (var key in slot.Path.Split('.'))
        {
            node = (node as MappingNode)?.Find(key);
        }

        return node;
    }
}
