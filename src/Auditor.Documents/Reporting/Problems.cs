namespace Auditor.Documents;

/// <summary>
/// Gathers problems from any number of threads. What it shows depends only on the problems added, never on their order:
/// they are sorted by path, offset and code, a problem added twice is kept once, and of each file the first hundred are kept.
/// </summary>
public sealed class Problems
{
    /// <summary>How many problems of one file are kept.</summary>
    public const int PerFile = 100;

    private readonly Lock _lock = new();
    private readonly SortedDictionary<string, FileProblems> _files = new(StringComparer.Ordinal);
    private bool _hasErrors;

    /// <summary>Whether an error was added; warnings do not count.</summary>
    public bool HasErrors
    {
        get
        {
            lock (_lock)
            {
                return _hasErrors;
            }
        }
    }

    /// <summary>
    /// The problems in order: those without a place first, then by path, offset and code. A file that had more than
    /// <see cref="PerFile"/> ends with one problem that says so.
    /// </summary>
    public IReadOnlyList<Problem> All
    {
        get
        {
            lock (_lock)
            {
                return [.. _files.Values.SelectMany(file => file.Shown())];
            }
        }
    }

    /// <summary>Adds a problem.</summary>
    public void Add(Problem problem)
    {
        lock (_lock)
        {
            _hasErrors |= problem.Severity == Severity.Error;
            var path = problem.Span?.Source.Path ?? "";
            if (!_files.TryGetValue(path, out var file))
            {
                _files.Add(path, file = new FileProblems());
            }

            file.Add(problem);
        }
    }

    private sealed class FileProblems
    {
        private readonly SortedSet<Problem> _kept = new(ProblemOrder.Instance);
        private Severity? _dropped;

        public void Add(Problem problem)
        {
            if (!_kept.Add(problem) || _kept.Count <= PerFile)
            {
                return;
            }

            var last = _kept.Max!;
            _kept.Remove(last);
            _dropped = _dropped == Severity.Error ? Severity.Error : last.Severity;
        }

        public IEnumerable<Problem> Shown() => _dropped is { } severity
            ? _kept.Append(new Problem("too-many-problems", severity, "further problems in this file are not shown", _kept.Max!.Span,
                "put right the problems above, then run again", []))
            : _kept;
    }
}
