namespace Auditor.Documents;

/// <summary>What is left of the limits while a document and its includes are read.</summary>
/// <param name="limits">The limits to keep.</param>
internal sealed class ReadingBudget(ReadingLimits limits)
{
    private long _bytes = limits.Bytes;
    private int _values = limits.Values;
    private int _files = limits.Files;

    public ReadingLimits Limits { get; } = limits;

    public bool TrySpendBytes(long count)
    {
        if (count > _bytes)
        {
            return false;
        }

        _bytes -= count;
        return true;
    }

    public bool TrySpendValue() => _values-- > 0;

    public bool TrySpendFile() => _files-- > 0;
}
