namespace Auditor.Formulas.Values;

/// <summary>The words of a list value, under a type of their own by which a value knows them.</summary>
internal sealed class WordList(IReadOnlyList<string> items)
{
    public IReadOnlyList<string> Items { get; } = items;
}
