using Auditor.Documents;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;
using Auditor.Testing;

namespace Auditor.Formulas.Tests;

/// <summary>Reads folders of lookups, tables and curves as a rule set does: the files of the folder, then those of <c>house</c> below it as a later set.</summary>
internal static class RuleData
{
    public const string Folder = "tests/Auditor.Formulas.Tests/Files/Tables";

    private static readonly Dictionary<string, Schema> Schemas = new[] { "lookup", "table", "curve" }.ToDictionary(
        kind => kind,
        kind => Schema.Parse(new SourceText($"{kind}.schema.json", File.ReadAllText(Repository.PathOf($"rules/schema/{kind}.schema.json")))));

    /// <summary>The tables and curves that most tests use.</summary>
    public static FormulaWorld Example { get; } = LoadGood("example");

    public static FormulaWorld LoadGood(string name)
    {
        var problems = new Problems();
        var world = Load(name, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return world;
    }

    public static FormulaWorld Load(string name, Problems problems)
    {
        var sets = new[] { FilesOf(name), FilesOf(name + "/house") };
        var lookups = new Dictionary<string, Lookup>();
        var curves = new CurveSet();
        var tables = new TableReader(lookups, problems);
        Each(sets, "lookup", (root, _) => LookupReader.Read(root, lookups, problems));
        Each(sets, "table", tables.Read);
        Each(sets, "curve", (root, set) => CurveReader.Read(root, set, curves, problems));
        foreach (var lookup in lookups.Values)
        {
            lookup.Close();
        }

        return new FormulaWorld(lookups, curves, Plant.Parameters);
    }

    private static void Each(MappingNode[][] sets, string kind, Action<MappingNode, int> read)
    {
        for (var set = 0; set < sets.Length; set++)
        {
            foreach (var root in sets[set].Where(root => root.Entries[0].Key.Value == kind))
            {
                read(root, set);
            }
        }
    }

    private static MappingNode[] FilesOf(string name)
    {
        var folder = Repository.PathOf($"{Folder}/{name}");
        return Directory.Exists(folder)
            ? [.. Directory.EnumerateFiles(folder, "*.yaml").Order(StringComparer.Ordinal).Select(file => Read(file, $"{name}/{Path.GetFileName(file)}"))]
            : [];
    }

    /// <summary>The readers only ever see files that their schema has accepted.</summary>
    private static MappingNode Read(string file, string display)
    {
        var problems = new Problems();
        var root = (MappingNode)YamlReader.Read(SourceReader.Read(file, display, problems)!, problems)!;
        Schemas[root.Entries[0].Key.Value].Validate(root, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return root;
    }
}
