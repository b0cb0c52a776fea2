using System.Numerics;
using Auditor.Engine.Installation;

namespace Auditor.Engine.Variation;

/// <summary>Everything that one input may have a part in: quantities, and rules at subjects.</summary>
public sealed class Reach
{
    private readonly Dictionary<int, ulong[]> _quantities;

    internal Reach(IReadOnlyList<SubjectInput> inputs, Dictionary<int, ulong[]> quantities, IReadOnlyList<RuleAt> rules)
    {
        Inputs = inputs;
        _quantities = quantities;
        Rules = rules;
        Size = quantities.Values.Sum(words => words.Sum(BitOperations.PopCount));
    }

    /// <summary>The rules that may come out otherwise when the input changes: subjects in the order of the design, then rules by id.</summary>
    public IReadOnlyList<RuleAt> Rules { get; }

    /// <summary>Whether a rule may come out otherwise when the input changes.</summary>
    public bool Holds(RuleAt at)
    {
        var (low, high) = (0, Rules.Count);
        while (low < high)
        {
            var middle = (low + high) / 2;
            (low, high) = Order(Rules[middle], at) < 0 ? (middle + 1, high) : (low, middle);
        }

        return low < Rules.Count && Rules[low] == at;
    }

    /// <summary>The order of rules at subjects: subjects in the order of the design, then rules by id.</summary>
    internal static int Order(RuleAt one, RuleAt other) =>
        one.Subject.Index != other.Subject.Index ? one.Subject.Index - other.Subject.Index : string.CompareOrdinal(one.Rule.Id, other.Rule.Id);

    /// <summary>The input, and the groups that it lies in where the design gives nothing of them.</summary>
    internal IReadOnlyList<SubjectInput> Inputs { get; }

    /// <summary>How many quantities it holds.</summary>
    internal int Size { get; }

    /// <summary>The subjects that have quantities in it, by their place in the design, with one bit for each quantity.</summary>
    internal IReadOnlyDictionary<int, ulong[]> Quantities => _quantities;

    /// <summary>One bit for each quantity of a subject; null where none of them is reached.</summary>
    internal ulong[]? QuantitiesOf(DesignSubject subject) => _quantities.GetValueOrDefault(subject.Index);
}
