using System.Collections.Concurrent;
using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>Where the shipped rule data stand.</summary>
/// <param name="Folder">Full path of the folder that holds <c>schema</c>, <c>tables</c>, <c>sets</c> and the rest.</param>
/// <param name="Display">How its files are shown, such as <c>rules</c>.</param>
public sealed record RuleHome(string Folder, string Display)
{
    private static readonly ConcurrentDictionary<string, Lazy<Schema>> Schemas = new(StringComparer.Ordinal);

    /// <summary>A schema of files of rule data or of findings, read once for all files that are held against it.</summary>
    /// <exception cref="InvalidDataException">It is no schema; the message says where.</exception>
    public Schema Schema(string name) => Schemas.GetOrAdd(SchemaPath(name), path => new(() => ReadSchema(name, path))).Value;

    /// <summary>Full path of a schema.</summary>
    public string SchemaPath(string name) => Path.Combine(Folder, "schema", name + ".schema.json");

    /// <summary>With what the ids of the rules about the record of an audit begin, and no others.</summary>
    internal const string RecordPrefix = "record-";

    /// <summary>The rules about the record of an audit, by name, each with the path to show.</summary>
    internal IReadOnlyList<(string Full, string Display)> RecordRules() =>
        [.. Directory.EnumerateFiles(Path.Combine(Folder, "record"), "*.yaml").Order(StringComparer.Ordinal)
            .Select(path => (path, $"{Display}/record/{Path.GetFileName(path)}"))];

    /// <summary>Full path of a shipped set.</summary>
    public string SetPath(string name) => Path.Combine(Folder, "sets", name + ".yaml");

    /// <summary>Names of the shipped sets, in order.</summary>
    public IReadOnlyList<string> SetNames() =>
        Directory.Exists(Path.Combine(Folder, "sets"))
            ? [.. Directory.EnumerateFiles(Path.Combine(Folder, "sets"), "*.yaml").Select(path => Path.GetFileNameWithoutExtension(path)!).Order(StringComparer.Ordinal)]
            : [];

    private Schema ReadSchema(string name, string path) => Documents.Schema.Parse(new SourceText($"{Display}/schema/{name}.schema.json", File.ReadAllText(path)));
}
