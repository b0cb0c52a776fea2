using System.Security.Cryptography;
using System.Text;
using Auditor.Documents;
using Auditor.Engine.HouseSets;
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
        _reader = new RuleFileReader(home, problems, PreparedRules.Open(home), RuleFileReader.OfSets);
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
        var changes = new HouseChanges(chain);
        Edition(chain, changes);
        var parameters = new ParameterReader(changes, _problems).Read(chain);
        var world = World(files, parameters, changes);

        var sheets = new SheetReader(schema.Shapes, changes, _problems);
        Each(files, "sheet", sheets.Declare);
        var quantities = sheets.Bind(world);
        new CircleCheck(quantities, _problems).Run();
        var reader = new RuleReader(schema.Shapes, world, _problems);
        var rules = Rules(chain, files, new RuleComposer(reader, changes, _problems));
        var record = _reader.Read(_home.RecordRules()).Select(reader.Read).OfType<Rule>().ToArray();
        var adjustments = ById(files, "adjustment", new AdjustmentReader(schema.Shapes, world, _problems).Read, RuleMessages.SecondAdjustment);
        var pictures = ById(files, "picture", new PicturePlanReader(schema.Shapes, world, quantities, _problems).Read, RuleMessages.SecondPicture);
        var templates = chain.SelectMany(set => set.Templates(_problems)).GroupBy(pair => pair.Ending).ToDictionary(group => group.Key, group => group.Last().Template);
        return _problems.HasErrors
            ? null
            : new RuleSet(Title(chain, files), schema, world, parameters, quantities, rules, record, Hashes(chain, files))
            {
                Adjustments = adjustments,
                Pictures = [.. pictures.OrderBy(plan => plan.Place).ThenBy(plan => plan.Id, StringComparer.Ordinal)],
                Changes = changes.All,
                Templates = templates,
                HouseFiles = files.Where((_, set) => changes.IsHouse(set)).SelectMany(list => list).Select(file => file.Path).ToHashSet(StringComparer.Ordinal),
            };
    }

    private FormulaWorld World(IReadOnlyList<RuleFile>[] files, IReadOnlyList<Parameter> parameters, HouseChanges changes)
    {
        var lookups = new Dictionary<string, Lookup>();
        var setOf = new Dictionary<string, int>();
        var curves = new CurveSet();
        var places = new Dictionary<string, SourceSpan>();
        Each(files, "lookup", (file, set) =>
        {
            LookupReader.Read(file.Root, lookups, _problems);
            setOf.TryAdd(file.Root.Text("lookup")!, set);
        });
        var tables = new TableReader(lookups, _problems);
        Each(files, "table", (file, set) => tables.Read(file.Root, set));
        Each(files, "curve", (file, set) =>
        {
            CurveReader.Read(file.Root, set, curves, _problems);
            places.TryAdd(file.Path, file.Root.Find("curve")!.Span);
        });
        foreach (var lookup in lookups.Values)
        {
            lookup.Close();
        }

        HouseRuleData.Tables(tables.Later, setOf, changes);
        HouseRuleData.Curves(curves, places, changes);
        return new FormulaWorld(lookups, curves, parameters.ToDictionary(parameter => parameter.Slot.Name, parameter => parameter.Slot));
    }

    private static IReadOnlyList<Rule> Rules(IReadOnlyList<SetFile> chain, IReadOnlyList<RuleFile>[] files, RuleComposer composer)
    {
        foreach (var (set, file) in chain.Index())
        {
            foreach (var rule in files[set].Where(file => file.Kind == "rule"))
            {
                composer.Enter(rule, set);
            }

            composer.Change(file, set);
        }

        return composer.All;
    }

    /// <summary>What the files of a kind hold, by id. A later set replaces what an earlier one holds; in one set an id stands once.</summary>
    private List<T> ById<T>(IReadOnlyList<RuleFile>[] files, string kind, Func<RuleFile, T?> read, Func<SourceSpan, string, string, Problem> second)
        where T : class
    {
        var found = new SortedDictionary<string, (T Item, int Set, string Path)>(StringComparer.Ordinal);
        Each(files, kind, (file, set) =>
        {
            var id = file.Root.Scalar(kind)!;
            if (found.TryGetValue(id.Text, out var earlier) && earlier.Set == set)
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

    /// <summary>What a report says of the edition, a reader takes for what its figures are.</summary>
    private static void Edition(IReadOnlyList<SetFile> chain, HouseChanges changes)
    {
        foreach (var (set, file) in chain.Index())
        {
            var before = LastSaid(chain.Take(set), "edition");
            if (file.Root.Scalar("edition") is { } edition && before.Length > 0 && edition.Text != before)
            {
                changes.Add(set, HouseChangeKind.Edition, file.Id, (before, edition.Text), loosens: true, "stated by the firm", edition.Span);
            }
        }
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
            chain[^1].Id, last.Text("title")!, LastSaid(chain, "edition"), Notice(chain), [.. chain.Select(set => set.Id)], Hash(whole))
        {
            BuiltOn = chain.Last(set => set.Standing != SetStanding.House).Id,
        };
    }

    /// <summary>A house set adds to the notice, lest a warning get lost.</summary>
    private static string Notice(IReadOnlyList<SetFile> chain)
    {
        var houses = chain.Where(set => set.Standing == SetStanding.House).Select(set => set.Root.Text("notice"));
        return string.Join(' ', houses.Prepend(LastSaid(chain.Where(set => set.Standing != SetStanding.House), "notice")).Where(text => !string.IsNullOrEmpty(text)));
    }

    private static string LastSaid(IEnumerable<SetFile> chain, string key) => chain.Select(set => set.Root.Text(key)).LastOrDefault(text => text is not null) ?? "";

    private static List<InputFile> Hashes(IReadOnlyList<SetFile> chain, IReadOnlyList<RuleFile>[] files) =>
        [.. chain.Select(set => set.File).Concat(files.SelectMany(list => list)).Select(file => new InputFile(file.Path, file.Sha256))
            .OrderBy(file => file.Path, StringComparer.Ordinal)];

    private static string Hash(string text) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)));
}
