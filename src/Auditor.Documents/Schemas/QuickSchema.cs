using System.Text.RegularExpressions;

namespace Auditor.Documents;

/// <summary>
/// A schema made ready for one question: does it take a value? Nearly all values are taken, and then nobody needs the validator,
/// which explains at length why a value is refused. Where the two could differ the answer is <see cref="Acceptance.Unsure"/>.
/// </summary>
internal sealed class QuickSchema
{
    /// <summary>The schema that this one refers to, which then answers for it.</summary>
    public QuickSchema? Reference { get; set; }

    /// <summary>Whether it has a keyword that only the validator knows.</summary>
    public bool IsUnsure { get; set; }

    /// <summary>The types that it takes; none for every type.</summary>
    public NodeTypes Types { get; set; }

    /// <summary>The words, numbers and flags that it takes; null for every one.</summary>
    public IReadOnlyList<object>? Words { get; set; }

    public QuantityRule? Quantity { get; set; }

    public Regex? Pattern { get; set; }

    public bool IsDate { get; set; }

    /// <summary>Whether a text has at least one character. Only the validator counts further than that.</summary>
    public bool IsNotEmpty { get; set; }

    /// <summary>Limits of numbers.</summary>
    public QuickLimits Limits { get; set; } = QuickLimits.None;

    /// <summary>Limits of how many items or keys.</summary>
    public QuickLimits Count { get; set; } = QuickLimits.None;

    public bool HasUniqueItems { get; set; }

    public QuickSchema? Items { get; set; }

    public IReadOnlyList<string> Required { get; set; } = [];

    public Dictionary<string, QuickSchema> Properties { get; } = new(StringComparer.Ordinal);

    public List<(Regex Key, QuickSchema Value)> PatternProperties { get; } = [];

    /// <summary>What every other key holds; null for anything.</summary>
    public QuickSchema? Others { get; set; }

    /// <summary>Whether keys that are not named are refused.</summary>
    public bool RefusesOthers { get; set; }

    public List<QuickSchema> OneOf { get; } = [];

    /// <summary>Looks at a value.</summary>
    public Acceptance Look(Node node)
    {
        if (Reference is not null)
        {
            return Reference.Look(node);
        }

        if (IsUnsure || node.IsPartial)
        {
            return Acceptance.Unsure;
        }

        if (Types != NodeTypes.Any && (Types & NodeTypesOf(node)) == NodeTypes.Any)
        {
            return Acceptance.No;
        }

        var own = node switch
        {
            ScalarNode scalar => Look(scalar),
            SequenceNode sequence => Look(sequence),
            _ => Look((MappingNode)node),
        };
        return OneOf.Count == 0 || own == Acceptance.No ? own : Both(own, LookAtChoices(node));
    }

    private static NodeTypes NodeTypesOf(Node node) => node switch
    {
        MappingNode => NodeTypes.Object,
        SequenceNode => NodeTypes.Array,
        ScalarNode { Kind: ScalarKind.Text } => NodeTypes.String,
        ScalarNode { Kind: ScalarKind.Flag } => NodeTypes.Boolean,
        ScalarNode { Kind: ScalarKind.Number } number => double.IsInteger(number.Number) ? NodeTypes.Number | NodeTypes.Integer : NodeTypes.Number,
        _ => NodeTypes.Null,
    };

    private static Acceptance Both(Acceptance one, Acceptance other) =>
        one == Acceptance.No || other == Acceptance.No ? Acceptance.No : one == Acceptance.Unsure ? one : other;

    private Acceptance Look(ScalarNode scalar)
    {
        if (scalar.Kind == ScalarKind.Null)
        {
            return Types.HasFlag(NodeTypes.Null) && Words is null ? Acceptance.Yes : Acceptance.Unsure;
        }

        var isTaken = (Words is null || IsListed(scalar)) && Quantity?.Check(scalar) is null && scalar.Kind switch
        {
            ScalarKind.Number => Limits.Take(scalar.Number),
            ScalarKind.Text => IsTaken(scalar.Text),
            _ => true,
        };
        return isTaken ? Acceptance.Yes : Acceptance.No;
    }

    private bool IsListed(ScalarNode scalar) => Words!.Any(word => word switch
    {
        string text => scalar.Kind == ScalarKind.Text && scalar.Text == text,
        bool flag => scalar.Kind == ScalarKind.Flag && scalar.Flag == flag,
        double number => scalar.Kind == ScalarKind.Number && scalar.Number == number,
        _ => false,
    });

    private bool IsTaken(string text) =>
        (!IsNotEmpty || text.Length > 0) && (Pattern is null || (!text.EndsWith('\n') && Pattern.IsMatch(text))) && (!IsDate || DateOnly.TryParseExact(text, "yyyy-MM-dd", out _));

    private Acceptance Look(SequenceNode sequence)
    {
        if (Words is not null || !Count.Take(sequence.Items.Count))
        {
            return Acceptance.No;
        }

        if (HasUniqueItems && !AreSurelyUnique(sequence))
        {
            return Acceptance.Unsure;
        }

        var result = Acceptance.Yes;
        for (var i = 0; Items is not null && i < sequence.Items.Count && result != Acceptance.No; i++)
        {
            result = Both(result, Items.Look(sequence.Items[i]));
        }

        return result;
    }

    /// <summary>Whether the items are texts that all differ; the validator tells what it thinks of other items.</summary>
    private static bool AreSurelyUnique(SequenceNode sequence)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        return sequence.Items.All(item => item is ScalarNode { Kind: ScalarKind.Text } text && seen.Add(text.Text));
    }

    private Acceptance Look(MappingNode mapping)
    {
        if (Words is not null || !Count.Take(mapping.Entries.Count) || !Required.All(key => mapping.Entry(key) is not null))
        {
            return Acceptance.No;
        }

        var result = Acceptance.Yes;
        for (var i = 0; i < mapping.Entries.Count && result != Acceptance.No; i++)
        {
            result = Both(result, Look(mapping.Entries[i]));
        }

        return result;
    }

    /// <summary>Looks at an entry of a mapping.</summary>
    public Acceptance Look(MappingEntry entry)
    {
        if (Properties.TryGetValue(entry.Key.Value, out var property))
        {
            return PatternProperties.Count == 0 ? property.Look(entry.Value) : Acceptance.Unsure;
        }

        var result = Acceptance.Yes;
        var isMatched = false;
        foreach (var (key, value) in PatternProperties)
        {
            if (key.IsMatch(entry.Key.Value))
            {
                isMatched = true;
                result = Both(result, value.Look(entry.Value));
            }
        }

        return isMatched ? result : RefusesOthers ? Acceptance.No : Others?.Look(entry.Value) ?? Acceptance.Yes;
    }

    private Acceptance LookAtChoices(Node node)
    {
        var taken = 0;
        foreach (var choice in OneOf)
        {
            var look = choice.Look(node);
            if (look == Acceptance.Unsure)
            {
                return look;
            }

            taken += look == Acceptance.Yes ? 1 : 0;
        }

        return taken == 1 ? Acceptance.Yes : Acceptance.No;
    }
}
