using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Formulas;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;

namespace Auditor.Engine.RuleSets;

/// <summary>Binds the rules of a set.</summary>
/// <param name="shapes">Kinds of subject, with their quantities.</param>
/// <param name="world">Tables, curves and parameters.</param>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class RuleReader(Shapes shapes, FormulaWorld world, Problems problems)
{
    private static readonly Dictionary<string, CheckKind> Comparisons = new()
    {
        ["at-most"] = CheckKind.AtMost,
        ["at-least"] = CheckKind.AtLeast,
        ["within"] = CheckKind.Within,
        ["equals"] = CheckKind.Equal,
        ["one-of"] = CheckKind.OneOf,
    };

    /// <summary>The rule of a file, or null with problems added.</summary>
    public Rule? Read(RuleFile file)
    {
        var node = file.Root;
        var id = node.Scalar("rule")!;
        if (Path.GetFileNameWithoutExtension(file.Path) != id.Text)
        {
            problems.Add(RuleMessages.NameIsNotFile(id.Span, id.Text, Path.GetFileName(file.Path)));
        }

        var shape = shapes.Find(node.Text("of")!)!;
        var when = node.Scalar("when") is { } condition ? Bind(condition, shape, FormulaType.Flag) : null;
        var check = node.Mapping("compare") is { } compare ? ReadComparison(compare, shape) : ReadRequirement(node.Scalar("require")!, shape);
        var says = new SentenceReader(shape, world, problems).Read(node.Scalar("says")!);
        if (check is null || says is null || (when is null && node.Find("when") is not null))
        {
            return null;
        }

        return new Rule
        {
            Id = id.Text,
            Title = node.Text("title")!,
            Covers = node.Texts("covers"),
            Clause = ClauseReader.Read(node),
            Provision = node.Text("provision") == "requirement" ? Provision.Requirement : Provision.Recommendation,
            Shape = shape,
            When = when,
            Check = check,
            Says = says,
            Why = node.Text("why")!,
            PutRightBy = node.Texts("put-right-by"),
            AllowsDepartures = node.Text("departures") != "never",
            Formerly = node.Texts("formerly"),
            Node = node,
        };
    }

    private Formula? Bind(ScalarNode source, SubjectShape shape, FormulaType? type) => FormulaBinder.Bind(source, shape, world, type, problems);

    private Check? ReadRequirement(ScalarNode require, SubjectShape shape) =>
        Bind(require, shape, FormulaType.Flag) is { } flag ? new Check(CheckKind.Require, flag, [], null) : null;

    private Check? ReadComparison(MappingNode compare, SubjectShape shape)
    {
        var entries = compare.Entries.Where(entry => entry.Key.Value != "value").ToArray();
        if (entries is not [var entry] || compare.Scalar("value") is not { } valueNode)
        {
            problems.Add(RuleMessages.CompareOnce(compare.Span));
            return null;
        }

        var how = Comparisons[entry.Key.Value];
        var value = Bind(valueNode, shape, null);
        var limits = LimitNodes(entry.Value).Select(limit => Bind(limit, shape, null)).ToArray();
        if (value is null || Array.Exists(limits, limit => limit is null))
        {
            return null;
        }

        if (Array.Find(limits, limit => !limit!.Type.Equals(value.Type)) is { } odd)
        {
            problems.Add(RuleMessages.Compare(odd.Source.Span, entry.Key.Value, value.Type, odd.Type));
            return null;
        }

        var isOrdered = how is CheckKind.AtMost or CheckKind.AtLeast or CheckKind.Within;
        if (value.Type.Kind == FormulaKind.Words || (isOrdered && value.Type.Kind != FormulaKind.Quantity))
        {
            problems.Add(RuleMessages.NotComparable(valueNode.Span, entry.Key.Value, value.Type));
            return null;
        }

        foreach (var limit in limits)
        {
            FormulaBinder.CheckWords(value, limit!, problems);
        }

        return new Check(how, value, limits!, value.Root.Unit ?? limits[0]!.Unit);
    }

    private static IEnumerable<ScalarNode> LimitNodes(Node node) => node switch
    {
        ScalarNode scalar => [scalar],
        SequenceNode list => list.Items.OfType<ScalarNode>(),
        MappingNode range => [range.Scalar("from")!, range.Scalar("to")!],
        _ => [],
    };
}
