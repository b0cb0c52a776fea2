using Auditor.Engine.Installation;

namespace Auditor.Engine.Variation;

/// <summary>Follows an input from reader to reader through a design.</summary>
internal sealed class ReachSearch(SlotReaders readers, BackLinks links)
{
    private const int BitsOfWord = 64;

    private readonly Dictionary<int, ulong[]> _quantities = [];
    private readonly HashSet<RuleAt> _rules = [];
    private readonly Queue<(DesignSubject Subject, int Slot)> _open = new();

    public Reach Run(IReadOnlyList<SubjectInput> inputs)
    {
        foreach (var input in inputs)
        {
            Touch(readers.OfInput(input.Subject.Shape, input.Slot.Index), input.Subject);
        }

        while (_open.TryDequeue(out var next))
        {
            Touch(readers.OfQuantity(next.Subject.Shape, next.Slot), next.Subject);
        }

        var rules = _rules.ToArray();
        Array.Sort(rules, Reach.Order);
        return new Reach(inputs, _quantities, rules);
    }

    private void Touch(IReadOnlyList<Reader> reading, DesignSubject read)
    {
        foreach (var reader in reading)
        {
            foreach (var subject in links.Before(reader.Route, read))
            {
                if (reader.Rule is { } rule)
                {
                    _rules.Add(new RuleAt(rule, subject));
                }
                else if (Mark(subject, reader.Quantity))
                {
                    _open.Enqueue((subject, reader.Quantity));
                }
            }
        }
    }

    private bool Mark(DesignSubject subject, int slot)
    {
        if (!_quantities.TryGetValue(subject.Index, out var words))
        {
            words = new ulong[(subject.Shape.Quantities.Count + BitsOfWord - 1) / BitsOfWord];
            _quantities.Add(subject.Index, words);
        }

        var bit = 1UL << (slot % BitsOfWord);
        var isNew = (words[slot / BitsOfWord] & bit) == 0;
        words[slot / BitsOfWord] |= bit;
        return isNew;
    }
}
