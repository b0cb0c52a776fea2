using Auditor.Testing;

namespace Auditor.Documents.Tests;

/// <summary>The schema and the whole files that these tests read.</summary>
internal static class Plan
{
    public const string Files = "tests/Auditor.Documents.Tests/Files";

    public static Schema Schema { get; } = Schema.Parse(new SourceText("plan.schema.json", SchemaText));

    public static string SchemaText => File.ReadAllText(Repository.PathOf($"{Files}/plan.schema.json"));

    /// <summary>The names of the cases in a folder: a file <c>name.yaml</c>, or a folder <c>name</c> with <c>plan.yaml</c> in it.</summary>
    public static IEnumerable<string> CasesIn(string folder)
    {
        var entries = new DirectoryInfo(Repository.PathOf($"{Files}/{folder}"));
        return entries.EnumerateFiles("*.yaml").Select(file => Path.GetFileNameWithoutExtension(file.Name))
            .Concat(entries.EnumerateDirectories().Select(each => each.Name)).Order(StringComparer.Ordinal);
    }

    /// <summary>Reads a case, without checking it against the schema.</summary>
    public static Document? Load(string folder, string name, Problems problems)
    {
        var isFolder = Directory.Exists(Repository.PathOf($"{Files}/{folder}/{name}"));
        var path = isFolder ? $"{name}/plan.yaml" : $"{name}.yaml";
        return DocumentLoader.Load(Repository.PathOf($"{Files}/{folder}/{path}"), path, problems);
    }

    /// <summary>Reads a case and checks it against the schema.</summary>
    public static Problems Check(string folder, string name)
    {
        var problems = new Problems();
        if (Load(folder, name, problems) is { } document)
        {
            Schema.Validate(document.Root, problems);
        }

        return problems;
    }
}
