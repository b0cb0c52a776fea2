using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads files of rule data and holds each against the schema of its kind.</summary>
/// <param name="home">Where the schemas stand.</param>
/// <param name="problems">Receives what is wrong.</param>
/// <param name="prepared">Trees that need neither.</param>
/// <param name="kinds">Which kinds of files are wanted, each with the name of its schema.</param>
internal sealed class RuleFileReader(RuleHome home, Problems problems, PreparedRules prepared, IReadOnlyDictionary<string, string> kinds)
{
    /// <summary>What sets are put together from.</summary>
    public static readonly IReadOnlyDictionary<string, string> OfSets = new Dictionary<string, string>
    {
        ["lookup"] = "lookup",
        ["table"] = "table",
        ["curve"] = "curve",
        ["sheet"] = "sheet",
        ["rule"] = "provision",
        ["adjustment"] = "adjustment",
        ["picture"] = "picture",
        ["set"] = "set",
    };

    /// <summary>What the register of requirements consists of.</summary>
    public static readonly IReadOnlyDictionary<string, string> OfRegister = new Dictionary<string, string>
    {
        ["register"] = "register",
        ["sources"] = "sources",
    };

    /// <summary>Reads many files, side by side; the result keeps their order. Files with problems are left out.</summary>
    public IReadOnlyList<RuleFile> Read(IReadOnlyList<(string Full, string Display)> paths)
    {
        var files = new RuleFile?[paths.Count];
        Parallel.For(0, paths.Count, i => files[i] = Read(paths[i].Full, paths[i].Display));
        return [.. files.OfType<RuleFile>()];
    }

    /// <summary>Reads one file; null, with problems added, when it is not valid.</summary>
    public RuleFile? Read(string fullPath, string displayPath)
    {
        if (SourceReader.ReadWithHash(fullPath, displayPath, problems) is not { } source)
        {
            return null;
        }

        if (prepared.Find(source) is MappingNode known && kinds.ContainsKey(known.Entries[0].Key.Value))
        {
            return new RuleFile(known.Entries[0].Key.Value, known, source.Sha256);
        }

        var own = new Problems();
        var file = Check(YamlReader.Read(source.Text, own), source.Sha256, own);
        foreach (var problem in own.All)
        {
            problems.Add(problem);
        }

        return own.HasErrors ? null : file;
    }

    private RuleFile? Check(Node? node, string sha256, Problems own)
    {
        if (node is not MappingNode { Entries: [var first, ..] } root)
        {
            if (node is not null)
            {
                own.Add(RuleMessages.NotMapping(node.Span));
            }

            return null;
        }

        if (!kinds.TryGetValue(first.Key.Value, out var schema))
        {
            own.Add(RuleMessages.UnknownKind(first.Key.Span, first.Key.Value, kinds.Keys));
            return null;
        }

        home.Schema(schema).Validate(root, own);
        return new RuleFile(first.Key.Value, root, sha256);
    }
}
