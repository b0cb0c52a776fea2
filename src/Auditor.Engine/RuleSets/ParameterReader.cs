using Auditor.Documents;
using Auditor.Engine.HouseSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads the parameters of a chain of sets; a later set's value goes before an earlier one's.</summary>
/// <param name="changes">Receives what house sets change.</param>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class ParameterReader(HouseChanges changes, Problems problems)
{
    private readonly SortedDictionary<string, MappingNode> _byId = new(StringComparer.Ordinal);
    private readonly Dictionary<string, MappingNode> _beforeHouse = new(StringComparer.Ordinal);

    /// <summary>The parameters, by name.</summary>
    public IReadOnlyList<Parameter> Read(IReadOnlyList<SetFile> chain)
    {
        foreach (var (set, file) in chain.Index())
        {
            foreach (var entry in file.Root.Mapping("parameters")?.Entries ?? [])
            {
                Enter(set, entry.Key.Value, (MappingNode)entry.Value);
            }
        }

        return [.. _byId.Select((entry, index) => Make(entry.Key, index, entry.Value))];
    }

    /// <summary>A house set need only state the new value: what it leaves out stays as the set before it says.</summary>
    private void Enter(int set, string id, MappingNode later)
    {
        if (_byId.TryGetValue(id, out var earlier))
        {
            if (Agrees(id, later, earlier))
            {
                Compare(set, id, later.Scalar("value")!, earlier);
            }

            if (changes.IsHouse(set))
            {
                _beforeHouse.TryAdd(id, earlier);
            }

            later = new MappingNode(later.Span, [.. later.Entries, .. earlier.Entries.Where(entry => later.Find(entry.Key.Value) is null)]);
        }

        _byId[id] = later;
    }

    private bool Agrees(string id, MappingNode later, MappingNode earlier)
    {
        if (later.Scalar("tighter") is { } restated && restated.Text != TighterOf(earlier))
        {
            problems.Add(RuleMessages.TighterRestated(restated.Span, id, TighterOf(earlier)));
        }

        var value = later.Scalar("value")!;
        var (type, before) = (Literal(value).Type, Literal(earlier.Scalar("value")!).Type);
        if (!type.Equals(before))
        {
            problems.Add(RuleMessages.ParameterKind(value.Span, id, type, before));
        }

        return type.Equals(before);
    }

    private void Compare(int set, string id, ScalarNode later, MappingNode earlier)
    {
        var before = earlier.Scalar("value")!;
        var (one, other) = (Literal(before).Value, Literal(later).Value);
        if (Order(one, other) is { } order && order != 0)
        {
            var tighter = TighterOf(earlier);
            var loosens = tighter switch
            {
                "lower" => order > 0,
                "higher" => order < 0,
                _ => true,
            };
            var how = tighter is "none" ? "no direction is declared to be the stricter one" : $"{tighter} is stricter";
            changes.Add(set, HouseChangeKind.Parameter, id, (before.Text, later.Text), loosens, how, later.Span);
        }
    }

    /// <summary>Positive where the later value is higher, negative where it is lower, nought where both are the same; a flag that is set is higher.</summary>
    private static int? Order(in Value earlier, in Value later) => earlier.Kind switch
    {
        ValueKind.Quantity => Comparison.Same(earlier.Number, later.Number) ? 0 : later.Number.CompareTo(earlier.Number),
        ValueKind.Flag => later.Flag.CompareTo(earlier.Flag),
        _ => string.CompareOrdinal(later.Text, earlier.Text),
    };

    private static string TighterOf(MappingNode node) => node.Text("tighter") ?? "none";

    private Parameter Make(string id, int index, MappingNode node)
    {
        var scalar = node.Scalar("value")!;
        var (type, unit, value) = Literal(scalar);
        var trust = node.Text("trust") is { } word ? TrustWords.Find(word) : null;
        var own = value.With(trust?.Mark() ?? Marks.None);
        return new Parameter(
            new ParameterSlot(id.Replace('-', '_'), index, type, unit), id, own, scalar.Text, node.Text("about") ?? "",
            TighterOf(node), node.Text("clause") ?? "", string.Join("; ", node.Texts("source")), trust, scalar.Span)
        {
            BeforeHouse = _beforeHouse.TryGetValue(id, out var before) ? Literal(before.Scalar("value")!).Value : own,
        };
    }

    /// <summary>A flag, a pure number, a quantity with its unit, or a word.</summary>
    public static (FormulaType Type, Unit? Unit, Value Value) Literal(ScalarNode scalar) => scalar.Kind switch
    {
        ScalarKind.Flag => (FormulaType.Flag, null, Value.Of(scalar.Flag)),
        ScalarKind.Number => (FormulaType.Number, Unit.One, Value.Of(scalar.Number)),
        _ when QuantityText.TryParse(scalar.Text, out var stated, out _) =>
            (FormulaType.Of(stated.Quantity.Dimension), stated.Unit, Value.Of(stated.Quantity.Value, stated.Standing == Standing.Assumed ? Marks.Assumed : Marks.None)),
        _ => (FormulaType.Text, null, Value.Of(scalar.Text)),
    };
}
