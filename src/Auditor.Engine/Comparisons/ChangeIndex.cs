using Auditor.Engine.RuleSets;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Tables;

namespace Auditor.Engine.Comparisons;

/// <summary>Numbers the changes between two audits and finds them by what a formula reads.</summary>
internal sealed class ChangeIndex
{
    private readonly List<Change> _changes = [];
    private readonly Dictionary<RevisionSubject, ChangeBits> _subjects = new(ReferenceEqualityComparer.Instance);
    private readonly Dictionary<RevisionSubject, ChangeBits> _moved = new(ReferenceEqualityComparer.Instance);
    private readonly Dictionary<(string Subject, bool Later), List<(string Path, ChangeBits Bits)>> _inputs = [];
    private readonly Dictionary<(RuleItem, string), ChangeBits> _rules = [];
    private readonly Dictionary<TableCell, ChangeBits> _cells = new(ReferenceEqualityComparer.Instance);

    public ChangeIndex(RuleSet before, RuleSet after, IEnumerable<SubjectChange> subjects, IEnumerable<InputChange> inputs, RuleSetChange rules)
    {
        foreach (var change in subjects)
        {
            var bits = Add(change);
            foreach (var subject in new[] { change.Before, change.After }.OfType<RevisionSubject>())
            {
                _subjects[subject] = bits;
                _moved[subject] = change.IsMoved ? bits : ChangeBits.None;
            }
        }

        foreach (var change in inputs)
        {
            var bits = Add(change);
            Keep(change.SubjectBefore, later: false, change.Path, bits);
            Keep(change.SubjectAfter, later: true, change.Path, bits);
        }

        foreach (var change in rules.Changes)
        {
            _rules[(change.Item, change.Name)] = Add(change);
        }

        if (!rules.IsSame)
        {
            KeepCells(before.World, after.World);
        }
    }

    /// <summary>The changes of a set.</summary>
    public IReadOnlyList<Change> Of(ChangeBits bits) => [.. bits.Numbers.Select(number => _changes[number])];

    /// <summary>The change of a subject as such; empty where it stayed what and where it was.</summary>
    public ChangeBits OfSubject(RevisionSubject subject) => _subjects.GetValueOrDefault(subject, ChangeBits.None);

    /// <summary>The change of a subject that stands on another board or is fed from another circuit; empty for any other.</summary>
    public ChangeBits OfMove(RevisionSubject subject) => _moved.GetValueOrDefault(subject, ChangeBits.None);

    /// <summary>The changes of an input; of a group of inputs, those of all in it.</summary>
    public ChangeBits OfInput(string subject, bool later, string path)
    {
        var found = ChangeBits.None;
        foreach (var (changed, bits) in _inputs.GetValueOrDefault((subject, later), []))
        {
            if (changed == path || (changed.Length > path.Length && changed[path.Length] == '.' && changed.StartsWith(path, StringComparison.Ordinal)))
            {
                found = found.Or(bits);
            }
        }

        return found;
    }

    /// <summary>The change of a part of the rule set.</summary>
    public ChangeBits OfRules(RuleItem item, string name) => _rules.GetValueOrDefault((item, name), ChangeBits.None);

    /// <summary>The change of the table that a cell stands in, where the cell itself differs.</summary>
    public ChangeBits OfCell(TableCell cell) => _cells.GetValueOrDefault(cell, ChangeBits.None);

    private ChangeBits Add(Change change)
    {
        _changes.Add(change);
        return ChangeBits.Of(_changes.Count - 1);
    }

    private void Keep(string subject, bool later, string path, ChangeBits bits)
    {
        if (!_inputs.TryGetValue((subject, later), out var list))
        {
            _inputs.Add((subject, later), list = []);
        }

        list.Add((path, bits));
    }

    private void KeepCells(FormulaWorld before, FormulaWorld after)
    {
        foreach (var (one, other, table) in FigureComparer.ChangedCells(before, after))
        {
            foreach (var cell in new[] { one, other }.OfType<TableCell>())
            {
                _cells[cell] = OfRules(RuleItem.Table, table);
            }
        }
    }
}
