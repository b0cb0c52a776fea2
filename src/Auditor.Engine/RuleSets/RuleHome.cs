namespace Auditor.Engine.RuleSets;

/// <summary>Where the shipped rule data stand.</summary>
/// <param name="Folder">Full path of the folder that holds <c>schema</c>, <c>tables</c>, <c>sets</c> and the rest.</param>
/// <param name="Display">How its files are shown, such as <c>rules</c>.</param>
public sealed record RuleHome(string Folder, string Display)
{
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
}
