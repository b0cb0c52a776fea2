using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads the parameters of a chain of sets; a later set's value goes before an earlier one's.</summary>
internal static class ParameterReader
{
    public static IReadOnlyList<Parameter> Read(IReadOnlyList<SetFile> chain, Problems problems)
    {
        var byId = new Dictionary<string, MappingNode>();
        var order = new List<string>();
        foreach (var entry in chain.SelectMany(set => set.Root.Mapping("parameters")?.Entries ?? []))
        {
            var id = entry.Key.Value;
            if (!byId.ContainsKey(id))
            {
                order.Add(id);
            }

            var (later, earlier) = ((MappingNode)entry.Value, byId.GetValueOrDefault(id));
            CheckKind(id, later, earlier, problems);
            byId[id] = Merge(later, earlier);
        }

        return [.. order.Order(StringComparer.Ordinal).Select((id, index) => Make(id, index, byId[id]))];
    }

    private static void CheckKind(string id, MappingNode later, MappingNode? earlier, Problems problems)
    {
        var value = later.Scalar("value")!;
        var type = Literal(value).Type;
        if (earlier is not null && Literal(earlier.Scalar("value")!).Type is var before && !type.Equals(before))
        {
            problems.Add(RuleMessages.ParameterKind(value.Span, id, type, before));
        }
    }

    /// <summary>A house set need only state the new value: what it leaves out stays as the set before it says.</summary>
    private static MappingNode Merge(MappingNode later, MappingNode? earlier) =>
        earlier is null
            ? later
            : new MappingNode(later.Span, [.. later.Entries, .. earlier.Entries.Where(entry => later.Find(entry.Key.Value) is null)]);

    private static Parameter Make(string id, int index, MappingNode node)
    {
        var scalar = node.Scalar("value")!;
        var (type, unit, value) = Literal(scalar);
        var trust = node.Text("trust") is { } word ? TrustWords.Find(word) : null;
        return new Parameter(
            new ParameterSlot(id.Replace('-', '_'), index, type, unit), id, value.With(trust?.Mark() ?? Marks.None), scalar.Text, node.Text("about") ?? "",
            node.Text("tighter") ?? "none", node.Text("clause") ?? "", string.Join("; ", node.Texts("source")), trust, scalar.Span);
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
