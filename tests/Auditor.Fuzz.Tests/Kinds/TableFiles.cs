using System.Text;
using Auditor.Documents;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Testing;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Lookups with their tables, and curves: entered, and then asked for figures. The documents of one input stand one after the other.</summary>
internal sealed class TableFiles : FuzzKind
{
    private const string Between = "\n# next file\n";

    private static readonly Dictionary<string, Schema> Schemas = new[] { "lookup", "table", "curve" }.ToDictionary(kind => kind, Read);

    private static readonly double[] Asked = [0, 1e-9, 0.1, 1, 2.5, 16, 32, 100, 1000, 1e12];

    public override IReadOnlyList<byte[]> Seeds { get; } = [.. Tables().Concat(Corpus.Files("rules/curves", "*.yaml", every: 3))];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var lookups = new Dictionary<string, Lookup>();
        var curves = new CurveSet();
        var roots = Encoding.UTF8.GetString(input).Split(Between).Select((text, number) => Accepted(text, number, problems)).ToArray();
        foreach (var lookup in roots.Where(root => root?.Find("lookup") is not null && root.Find("table") is null))
        {
            LookupReader.Read(lookup!, lookups, problems);
        }

        var tables = new TableReader(lookups, problems);
        foreach (var (root, set) in roots.Select((root, set) => (root, set)))
        {
            if (root?.Find("table") is not null)
            {
                tables.Read(root, set);
            }
            else if (root?.Find("curve") is not null)
            {
                CurveReader.Read(root, set, curves, problems);
            }
        }

        var isWhole = roots.All(root => root is not null) && !problems.HasErrors;
        return isWhole && !(lookups.Values.All(Answers) && curves.All.All(Answers)) ? Judgement.Neither : Judged(isWhole, problems);
    }

    private static MappingNode? Accepted(string text, int number, Problems problems)
    {
        var own = new Problems();
        var root = YamlReader.Read(new SourceText($"fuzzed-{number}.yaml", text), own) as MappingNode;
        var kind = root is { Entries: [var first, ..] } ? first.Key.Value : "";
        if (root is null && !own.HasErrors)
        {
            own.Add(Problem.Error("no-mapping", "no mapping", null));
        }
        else if (root is not null)
        {
            (Schemas.GetValueOrDefault(kind) ?? Schemas["table"]).Validate(root, own);
        }

        foreach (var problem in own.All)
        {
            problems.Add(problem);
        }

        return own.HasErrors ? null : root;
    }

    /// <summary>Whether a lookup answers for its own keys and for numbers of any size, with a finite figure or none.</summary>
    private static bool Answers(Lookup lookup)
    {
        lookup.Close();
        foreach (var (keys, _) in lookup.Cells().Take(3))
        {
            foreach (var number in Asked)
            {
                Value[] arguments = [.. keys.Select((key, place) => key is string word ? Value.Of(word) : Value.Of(place == keys.Count - 1 ? number : (double)key))];
                if (!IsWhole(lookup.Find(arguments, null)))
                {
                    return false;
                }
            }
        }

        return true;
    }

    private static bool Answers(Curve curve) =>
        curve.Slow.Concat(curve.Fast).Take(3).SelectMany(edge => Asked.SelectMany(number => new[] { curve.TripCurrent(edge.Rating, number), curve.TripTime(edge.Rating, number) }))
            .All(IsWhole);

    /// <summary>Each folder of tables as one input, of its lookup and its smaller files.</summary>
    private static IEnumerable<byte[]> Tables()
    {
        foreach (var folder in Directory.EnumerateDirectories(Repository.PathOf("rules/tables")).Order(StringComparer.Ordinal))
        {
            var files = Directory.EnumerateFiles(folder, "*.yaml").Order(StringComparer.Ordinal).Select(File.ReadAllText).ToArray();
            var chosen = files.Where(file => file.StartsWith("lookup:", StringComparison.Ordinal))
                .Concat(files.Where(file => file.StartsWith("table:", StringComparison.Ordinal)).OrderBy(file => file.Length).Take(1));
            yield return Encoding.UTF8.GetBytes(string.Join(Between, chosen));
        }
    }

    private static Schema Read(string name)
    {
        var path = $"rules/schema/{name}.schema.json";
        return Schema.Parse(new SourceText(path, File.ReadAllText(Repository.PathOf(path))));
    }
}
