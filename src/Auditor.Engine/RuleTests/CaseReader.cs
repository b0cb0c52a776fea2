using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.RuleTests;

/// <summary>Makes the subject of a case from what the case gives.</summary>
internal sealed class CaseReader(RuleSet rules, Evaluator evaluator, Problems problems)
{
    /// <summary>The subject that a case describes.</summary>
    /// <param name="shape">Kind of subject.</param>
    /// <param name="given">What the case gives; null for nothing.</param>
    /// <param name="ofHouse">Whether the case stands in a file of a house set: the others know nothing of the parameters that one changes.</param>
    public CaseSubject Read(SubjectShape shape, MappingNode? given, bool ofHouse)
    {
        var installation = rules.Schema.Shapes.Installation;
        var world = new CaseWorld(evaluator, installation);
        foreach (var parameter in ofHouse ? [] : rules.Parameters)
        {
            world.Parameters[parameter.Slot.Index] = parameter.BeforeHouse;
        }

        var subject = shape == installation ? world.Origin : new CaseSubject(shape, "case", world);
        foreach (var entry in given?.Entries ?? [])
        {
            Give(subject, world, entry.Key, entry.Key.Value.Split('.'), entry.Value);
        }

        return subject;
    }

    private void Give(CaseSubject subject, CaseWorld world, Located<string> key, ReadOnlySpan<string> parts, Node value)
    {
        if (parts is ["param", ..])
        {
            GiveParameter(world, key, string.Join('.', parts[1..]!), value);
        }
        else if (parts is ["origin", _, ..])
        {
            Give(world.Origin, world, key, parts[1..], value);
        }
        else if (parts.Length > 1 && subject.Shape.Way(parts[0]) is { } way)
        {
            Give(Follow(subject, world, way, parts[1]), world, key, parts[1..], value);
        }
        else if (parts.Length == 1 && subject.Shape.Collection(parts[0]) is { } list)
        {
            GiveItems(subject, world, list, key, value);
        }
        else
        {
            GiveValue(subject, key, string.Join('.', parts!), value);
        }
    }

    private void GiveParameter(CaseWorld world, Located<string> key, string name, Node value)
    {
        if (!rules.World.Parameters.TryGetValue(name, out var slot))
        {
            problems.Add(CaseMessages.UnknownName(key.Span, key.Value, "rule set", NearestWord.Find(name, rules.World.Parameters.Keys)));
        }
        else if (ValueOf(value, slot.Type) is { } parsed)
        {
            world.Parameters[slot.Index] = parsed;
        }
        else
        {
            problems.Add(CaseMessages.WrongValue(value.Span, key.Value, slot.Type));
        }
    }

    private void GiveItems(CaseSubject subject, CaseWorld world, SubjectList list, Located<string> key, Node value)
    {
        if (value is not SequenceNode sequence)
        {
            problems.Add(CaseMessages.NotList(key.Span, key.Value));
            return;
        }

        foreach (var node in sequence.Items.OfType<MappingNode>())
        {
            var item = new CaseSubject(list.Items, $"{subject.Key}/{list.Name} {node.Span.StartLocation.Line}", world);
            item.Join("up", subject);
            subject.Add(list, item);
            foreach (var entry in node.Entries)
            {
                Give(item, world, entry.Key, entry.Key.Value.Split('.'), entry.Value);
            }
        }
    }

    private static CaseSubject Follow(CaseSubject subject, CaseWorld world, Way way, string next)
    {
        if (subject.At(way.Name) is { } there)
        {
            return there;
        }

        var shape = way.Targets.FirstOrDefault(target => Has(target, next)) ?? way.Targets[0];
        var made = shape.Index == world.Origin.Shape.Index ? world.Origin : new CaseSubject(shape, $"{subject.Key}.{way.Name}", world);
        subject.Join(way.Name, made);
        if (way.Direction == Direction.Down)
        {
            made.Join("up", subject);
        }

        return made;
    }

    private static bool Has(SubjectShape shape, string name) =>
        shape.Quantity(name) is not null || shape.Way(name) is not null || shape.Inputs.Any(input => input.Name == name || input.Name.StartsWith(name + ".", StringComparison.Ordinal));

    private void GiveValue(CaseSubject subject, Located<string> key, string name, Node value)
    {
        var quantity = subject.Shape.Quantity(name);
        var input = subject.Shape.Input(name);
        var type = quantity?.Type ?? input?.Type;
        if (type is null)
        {
            problems.Add(CaseMessages.UnknownName(key.Span, name, subject.Shape.Name, NearestWord.Find(name, subject.Shape.AllNames())));
        }
        else if (ValueOf(value, type) is not { } parsed)
        {
            problems.Add(CaseMessages.WrongValue(value.Span, name, type));
        }
        else if (quantity is not null)
        {
            subject.Give(quantity, parsed);
        }
        else
        {
            subject.Give(input!, parsed);
            GiveGroups(subject, name);
        }
    }

    /// <summary>Giving <c>rcd.type</c> gives the group <c>rcd</c> as well, as in a design file.</summary>
    private static void GiveGroups(CaseSubject subject, string name)
    {
        for (var dot = name.IndexOf('.'); dot > 0; dot = name.IndexOf('.', dot + 1))
        {
            if (subject.Shape.Input(name[..dot]) is { Type.Kind: FormulaKind.Group } group)
            {
                subject.Give(group, Value.Of(true));
            }
        }
    }

    /// <summary>A value of the wanted type; null when the node is no such value.</summary>
    public static Value? ValueOf(Node node, FormulaType type) => (type.Kind, node) switch
    {
        (FormulaKind.Words, SequenceNode list) => WordsOf(list, type.Vocabulary),
        (FormulaKind.Group, MappingNode) => Value.Of(true),
        (FormulaKind.Group, ScalarNode { Kind: ScalarKind.Flag, Flag: true }) => Value.Of(true),
        (FormulaKind.Flag, ScalarNode { Kind: ScalarKind.Flag } scalar) => Value.Of(scalar.Flag),
        (FormulaKind.Text, ScalarNode scalar) => type.Vocabulary is { } words && !words.Contains(scalar.Text) ? null : Value.Of(scalar.Text),
        (FormulaKind.Quantity, ScalarNode scalar) => QuantityOf(scalar, type.Dimension),
        _ => null,
    };

    private static Value? WordsOf(SequenceNode list, IReadOnlyList<string>? vocabulary)
    {
        var words = list.Items.OfType<ScalarNode>().Select(item => item.Text).ToArray();
        return vocabulary is not null && Array.Exists(words, word => !vocabulary.Contains(word)) ? null : Value.Of(words);
    }

    private static Value? QuantityOf(ScalarNode scalar, Dimension dimension)
    {
        if (scalar.Kind == ScalarKind.Number)
        {
            return dimension.IsNone ? Value.Of(scalar.Number) : null;
        }

        return QuantityText.TryParse(scalar.Text, out var stated, out _) && stated.Quantity.Dimension == dimension
            ? Value.Of(stated.Quantity.Value, stated.Standing == Standing.Assumed ? Marks.Assumed : Marks.None)
            : null;
    }
}
