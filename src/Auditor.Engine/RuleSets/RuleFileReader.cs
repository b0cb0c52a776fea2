using System.Security.Cryptography;
using System.Text;
using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads files of rule data and holds each against the schema of its kind.</summary>
/// <param name="home">Where the schemas stand.</param>
/// <param name="problems">Receives what is wrong.</param>
/// <param name="prepared">Trees that need neither.</param>
internal sealed class RuleFileReader(RuleHome home, Problems problems, PreparedRules prepared)
{
    private static readonly Dictionary<string, string> SchemaOfKind = new()
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
        if (SourceReader.Read(fullPath, displayPath, problems) is not { } source)
        {
            return null;
        }

        var sha256 = Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(source.Text)));
        if (prepared.Find(source, sha256) is MappingNode known)
        {
            return new RuleFile(known.Entries[0].Key.Value, known, sha256);
        }

        var own = new Problems();
        var file = Check(YamlReader.Read(source, own), sha256, own);
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

        if (!SchemaOfKind.TryGetValue(first.Key.Value, out var schema))
        {
            own.Add(RuleMessages.UnknownKind(first.Key.Span, first.Key.Value, SchemaOfKind.Keys));
            return null;
        }

        home.Schema(schema).Validate(root, own);
        return new RuleFile(first.Key.Value, root, sha256);
    }
}
