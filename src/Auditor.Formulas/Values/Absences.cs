namespace Auditor.Formulas.Values;

/// <summary>The distinct absences that one missing value rests on, in the order in which they were met.</summary>
public sealed class Absences
{
    /// <summary>Beyond this many, further absences of one value are not kept: the list is for a person to act on.</summary>
    public const int Most = 12;

    private readonly Absence[] _items;

    private Absences(Absence[] items) => _items = items;

    /// <summary>The absences.</summary>
    public IReadOnlyList<Absence> Items => _items;

    /// <summary>One absence.</summary>
    public static Absences Of(Absence absence) => new([absence]);

    /// <summary>Both lists, each absence once.</summary>
    public Absences And(Absences other)
    {
        if (ReferenceEquals(this, other) || _items.Length >= Most)
        {
            return this;
        }

        var joined = new List<Absence>(_items);
        foreach (var absence in other._items)
        {
            if (joined.Count < Most && !joined.Contains(absence))
            {
                joined.Add(absence);
            }
        }

        return joined.Count == _items.Length ? this : new Absences([.. joined]);
    }
}
