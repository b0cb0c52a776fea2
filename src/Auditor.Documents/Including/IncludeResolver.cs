namespace Auditor.Documents;

/// <summary>Puts included files in the place of the <c>include</c> keys of one document.</summary>
internal sealed class IncludeResolver
{
    private const string Keyword = "include";

    private readonly Problems _problems;
    private readonly ReadingBudget _budget;
    private readonly IReadOnlyDictionary<string, string>? _texts;
    private readonly IncludeFolder _folder;
    private readonly Dictionary<string, SourceFile> _files = new(StringComparer.Ordinal);
    private readonly List<Inclusion> _way = [];

    public IncludeResolver(string fullPath, string displayPath, SourceFile top, Problems problems, ReadingBudget budget, IReadOnlyDictionary<string, string>? texts)
    {
        _problems = problems;
        _budget = budget;
        _texts = texts;
        _folder = new IncludeFolder(fullPath, displayPath);
        _files.Add(_folder.TopFile, top);
        _way.Add(new Inclusion(_folder.TopFile, top.Text.WholeSpan() with { End = 0 }));
    }

    public Document Resolve(Node root)
    {
        var resolved = Resolve(root, 0);
        return new Document(resolved, [.. _files.Values.Select(file => new InputFile(file.Text.Path, file.Sha256))
            .OrderBy(file => file.Path, StringComparer.Ordinal)]);
    }

    private Node Resolve(Node node, int nesting) => node switch
    {
        MappingNode mapping when HoldsInclude(mapping) => ResolveMapping(mapping, nesting + 1),
        SequenceNode sequence when HoldsInclude(sequence) =>
            new SequenceNode(sequence.Span, [.. sequence.Items.Select(item => Resolve(item, nesting + 1))]) { IsPartial = sequence.IsPartial },
        _ => node,
    };

    /// <summary>Whether anything below includes a file; what does not is left as it is.</summary>
    private static bool HoldsInclude(Node node) => node switch
    {
        MappingNode mapping => mapping.Entries.Any(entry => entry.Key.Value == Keyword || HoldsInclude(entry.Value)),
        SequenceNode sequence => sequence.Items.Any(HoldsInclude),
        _ => false,
    };

    private MappingNode ResolveMapping(MappingNode mapping, int nesting)
    {
        var entries = new List<MappingEntry>();
        var partial = mapping.IsPartial;
        foreach (var entry in mapping.Entries)
        {
            if (entry.Key.Value != Keyword)
            {
                entries.Add(entry with { Value = Resolve(entry.Value, nesting) });
            }
            else if (Include(entry.Value, nesting) is { } included)
            {
                partial |= included.IsPartial;
                entries.AddRange(included.Entries.Where(other => !IsSaidTwice(mapping, entry, other)));
            }
            else
            {
                partial = true;
            }
        }

        return new MappingNode(mapping.Span, entries) { IsPartial = partial };
    }

    private bool IsSaidTwice(MappingNode mapping, MappingEntry include, MappingEntry included)
    {
        if (mapping.Entry(included.Key.Value) is not { } own)
        {
            return false;
        }

        _problems.Add(FileProblems.KeyAlsoIncluded(own.Key, included.Key.Span, include.Value.Span));
        return true;
    }

    private MappingNode? Include(Node value, int nesting)
    {
        if (value is not ScalarNode { Text: { Length: > 0 } path, Kind: not ScalarKind.Null } scalar || ForbiddenCharacters.FirstIn(path) >= 0)
        {
            _problems.Add(FileProblems.IncludeIsNoPath(value.Span));
            return null;
        }

        if (_folder.Find(path, _way[^1].File, out var refusal) is not { } file)
        {
            _problems.Add(refusal(scalar.Span, path));
            return null;
        }

        if (RefuseWay(file, path, scalar.Span) is { } problem)
        {
            _problems.Add(problem);
            return null;
        }

        _way.Add(new Inclusion(file, scalar.Span));
        var included = Read(file, nesting);
        var resolved = included is null ? null : Resolve(included, nesting - 1);
        _way.RemoveAt(_way.Count - 1);
        if (resolved is not null and not MappingNode)
        {
            _problems.Add(FileProblems.IncludedIsNoMapping(scalar.Span, resolved.Span with { End = resolved.Span.Start }));
        }

        return resolved as MappingNode;
    }

    private Problem? RefuseWay(string file, string path, SourceSpan span)
    {
        var earlier = _way.FindIndex(inclusion => inclusion.File == file);
        if (earlier == _way.Count - 1)
        {
            return FileProblems.IncludesItself(span, path);
        }

        if (earlier >= 0)
        {
            return FileProblems.IncludeLoop(span, path, [.. _way.Skip(earlier + 1).Select(inclusion => new ProblemLabel(inclusion.Place, "included here"))]);
        }

        if (_way.Count > _budget.Limits.IncludeDepth)
        {
            return FileProblems.IncludeTooDeep(span, _budget.Limits.IncludeDepth);
        }

        return _budget.TrySpendFile() ? null : FileProblems.TooManyFiles(span, _budget.Limits.Files);
    }

    private Node? Read(string file, int nesting)
    {
        if (_files.TryGetValue(file, out var known))
        {
            if (!_budget.TrySpendBytes(known.Bytes))
            {
                _problems.Add(FileProblems.TooLarge(known.Text.WholeSpan() with { End = 0 }, _budget.Limits.Bytes));
                return null;
            }
        }
        else if (SourceReader.Read(file, _folder.DisplayPathOf(file), _problems, _budget, _texts) is { } read)
        {
            _files.Add(file, known = read);
        }

        return known is null ? null : YamlReader.Read(known.Text, _problems, _budget, nesting - 1);
    }

    private readonly record struct Inclusion(string File, SourceSpan Place);
}
