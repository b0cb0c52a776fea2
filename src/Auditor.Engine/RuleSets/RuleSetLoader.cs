using System.Security.Cryptography;
using System.Text;
using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;

namespace Auditor.Engine.RuleSets;

/// <summary>Puts a rule set together: reads the chain of sets and all their files, enters the tables, and binds sheets and rules.</summary>
public sealed class RuleSetLoader
{
    private readonly RuleHome _home;
    private readonly Problems _problems;
    private readonly RuleFileReader _reader;

    private RuleSetLoader(RuleHome home, Problems problems)
    {
        _home = home;
        _problems = problems;
        _reader = new RuleFileReader(home, problems, PreparedRules.Open(home));
    }

    /// <summary>Loads a rule set.</summary>
    /// <param name="home">Where the shipped rule data stand.</param>
    /// <param name="name">Name of a shipped set, or path of a set file.</param>
    /// <param name="folder">Full path of the folder that a path is relative to.</param>
    /// <param name="asked">Where the set is named, if in a file.</param>
    /// <param name="problems">Receives everything that is wrong with it.</param>
    /// <returns>The set; null when there are problems.</returns>
    public static RuleSet? Load(RuleHome home, string name, string folder, SourceSpan? asked, Problems problems)
    {
        var loader = new RuleSetLoader(home, problems);
        var schema = Task.Run(() => DesignSchema.Parse(new SourceText(home.Display + "/schema/design.schema.json", File.ReadAllText(home.SchemaPath("design")))));
        var chain = new SetChain(home, loader._reader, problems).Follow(name, folder, asked);
        return chain.Count == 0 ? null : loader.Compose(chain, schema);
    }

    private RuleSet? Compose(IReadOnlyList<SetFile> chain, Task<DesignSchema> schemaTask)
    {
        var files = chain.Select(set => _reader.Read(set.Files(["tables", "curves", "sheets", "provisions", "adjustments", "pictures"], _problems))).ToArray();
        var schema = schemaTask.GetAwaiter().GetResult();
        var parameters = ParameterReader.Read(chain, _problems);
        var world = World(files, parameters);

        var sheets = new SheetReader(schema.Shapes, _problems);
        Each(files, "sheet", sheets.Declare);
        var quantities = sheets.Bind(world);
        new CircleCheck(quantities, _problems).Run();
        var reader = new RuleReader(schema.Shapes, world, _problems);
        var rules = ById(files, "rule", reader.Read, RuleMessages.SecondRule);
        var record = _reader.Read(_home.RecordRules()).Select(reader.Read).OfType<Rule>().ToArray();
        var adjustments = ById(files, "adjustment", new AdjustmentReader(schema.Shapes, world, _problems).Read, RuleMessages.SecondAdjustment);
        var pictures = ById(files, "picture", new PicturePlanReader(schema.Shapes, world, quantities, _problems).Read, RuleMessages.SecondPicture);
        return _problems.HasErrors
            ? null
            : new RuleSet(Title(chain, files), schema, world, parameters, quantities, rules, record, Hashes(chain, files))
            {
                Adjustments = adjustments,
                Pictures = [.. pictures.OrderBy(plan => plan.Place).ThenBy(plan => plan.Id, StringComparer.Ordinal)],
            };
    }

    private FormulaWorld World(IReadOnlyList<RuleFile>[] files, IReadOnlyList<Parameter> parameters)
    {
        var lookups = new Dictionary<string, Lookup>();
        var curves = new CurveSet();
        Each(files, "lookup", (file, _) => LookupReader.Read(file.Root, lookups, _problems));
        var tables = new TableReader(lookups, _problems);
        Each(files, "table", (file, set) => tables.Read(file.Root, set));
        Each(files, "curve", (file, set) => CurveReader.Read(file.Root, set, curves, _problems));
        foreach (var lookup in lookups.Values)
        {
            lookup.Close();
        }

        return new FormulaWorld(lookups, curves, parameters.ToDictionary(parameter => parameter.Slot.Name, parameter => parameter.Slot));
    }

    /// <summary>What the files of a kind hold, by id. A later set replaces what an earlier one holds; in one set an id stands once.</summary>
    private List<T> ById<T>(IReadOnlyList<RuleFile>[] files, string kind, Func<RuleFile, T?> read, Func<SourceSpan, string, string, Problem> second)
        where T : class
    {
        var found = new SortedDictionary<string, (T Item, int Set, string Path)>(StringComparer.Ordinal);
        Each(files, kind, (file, set) =>
        {
            var id = file.Root.Scalar(kind)!;
            if (kind == "rule" && id.Text.StartsWith(RuleHome.RecordPrefix, StringComparison.Ordinal))
            {
                _problems.Add(RuleMessages.RecordRule(id.Span, id.Text));
            }
            else if (found.TryGetValue(id.Text, out var earlier) && earlier.Set == set)
            {
                _problems.Add(second(id.Span, id.Text, earlier.Path));
            }
            else if (read(file) is { } item)
            {
                found[id.Text] = (item, set, file.Path);
            }
        });
        return [.. found.Values.Select(each => each.Item)];
    }

    private static void Each(IReadOnlyList<RuleFile>[] files, string kind, Action<RuleFile, int> action)
    {
        for (var set = 0; set < files.Length; set++)
        {
            foreach (var file in files[set].Where(file => file.Kind == kind))
            {
                action(file, set);
            }
        }
    }

    private static RuleSetTitle Title(IReadOnlyList<SetFile> chain, IReadOnlyList<RuleFile>[] files)
    {
        var last = chain[^1].Root;
        var whole = string.Join('\n', Hashes(chain, files).Select(file => $"{file.Sha256} {file.Path}"));
        return new RuleSetTitle(
            chain[^1].Id, last.Text("title")!, LastSaid(chain, "edition"), LastSaid(chain, "notice"), [.. chain.Select(set => set.Id)], Hash(whole));
    }

    private static string LastSaid(IReadOnlyList<SetFile> chain, string key) => chain.Select(set => set.Root.Text(key)).LastOrDefault(text => text is not null) ?? "";

    private static List<InputFile> Hashes(IReadOnlyList<SetFile> chain, IReadOnlyList<RuleFile>[] files) =>
        [.. chain.Select(set => set.File).Concat(files.SelectMany(list => list)).Select(file => new InputFile(file.Path, file.Sha256))
            .OrderBy(file => file.Path, StringComparer.Ordinal)];

    private static string Hash(string text) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)));
}
