namespace Auditor.Documents;

/// <summary>The total order of problems: path, offset, code, then whatever else tells two apart.</summary>
internal sealed class ProblemOrder : IComparer<Problem>
{
    public static readonly ProblemOrder Instance = new();

    public int Compare(Problem? x, Problem? y)
    {
        if (x is null || y is null)
        {
            return (x is null ? 0 : 1) - (y is null ? 0 : 1);
        }

        ReadOnlySpan<int> steps =
        [
            string.CompareOrdinal(x.Span?.Source.Path, y.Span?.Source.Path),
            Comparer<int?>.Default.Compare(x.Span?.Start, y.Span?.Start),
            string.CompareOrdinal(x.Code, y.Code),
            Comparer<int?>.Default.Compare(x.Span?.End, y.Span?.End),
            string.CompareOrdinal(x.Message, y.Message),
            string.CompareOrdinal(x.Help, y.Help),
            x.Severity.CompareTo(y.Severity),
        ];
        var first = steps.IndexOfAnyExcept(0);
        return first < 0 ? 0 : steps[first];
    }
}
