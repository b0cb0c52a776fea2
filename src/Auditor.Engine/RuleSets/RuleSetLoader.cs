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
    private readonly Problems _problems;
    private readonly RuleFileReader _reader;

    private RuleSetLoader(RuleHome home, Problems problems)
    {
        _problems = problems;
        _reader = new RuleFileReader(home, problems);
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
        var files = chain.Select(set => _reader.Read(set.Files(["tables", "curves", "sheets", "provisions", "pictures"], _problems))).ToArray();
        var schema = schemaTask.GetAwaiter().GetResult();
        var parameters = ParameterReader.Read(chain, _problems);
        var world = World(files, parameters);

        var sheets = new SheetReader(schema.Shapes, _problems);
        Each(files, "sheet", sheets.Declare);
        var quantities = sheets.Bind(world);
        new CircleCheck(quantities, _problems).Run();
        var rules = Rules(files, new RuleReader(schema.Shapes, world, _problems));
        var pictures = Pictures(files, new PicturePlanReader(schema.Shapes, world, quantities, _problems));
        return _problems.HasErrors
            ? null
            : new RuleSet(Title(chain, files), schema, world, parameters, quantities, rules, Hashes(chain, files)) { Pictures = pictures };
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

    private List<Rule> Rules(IReadOnlyList<RuleFile>[] files, RuleReader reader)
    {
        var rules = new Dictionary<string, (Rule Rule, int Set)>();
        Each(files, "rule", (file, set) =>
        {
            var id = file.Root.Scalar("rule")!;
            if (rules.TryGetValue(id.Text, out var earlier) && earlier.Set == set)
            {
                _problems.Add(RuleMessages.SecondRule(id.Span, id.Text, earlier.Rule.Path));
            }
            else if (reader.Read(file) is { } rule)
            {
                rules[id.Text] = (rule, set);
            }
        });
        return [.. rules.Values.Select(pair => pair.Rule).OrderBy(rule => rule.Id, StringComparer.Ordinal)];
    }

    private List<PicturePlan> Pictures(IReadOnlyList<RuleFile>[] files, PicturePlanReader reader)
    {
        var plans = new Dictionary<string, (PicturePlan Plan, int Set)>();
        Each(files, "picture", (file, set) =>
        {
            var id = file.Root.Scalar("picture")!;
            if (plans.TryGetValue(id.Text, out var earlier) && earlier.Set == set)
            {
                _problems.Add(RuleMessages.SecondPicture(id.Span, id.Text, earlier.Plan.Node.Span.Source.Path));
            }
            else
            {
                plans[id.Text] = (reader.Read(file), set);
            }
        });
        return [.. plans.Values.Select(pair => pair.Plan).OrderBy(plan => plan.Place).ThenBy(plan => plan.Id, StringComparer.Ordinal)];
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
        [.. chain.Select(set => set.Root).Concat(files.SelectMany(list => list).Select(file => file.Root))
            .Select(root => new InputFile(root.Span.Source.Path, Hash(root.Span.Source.Text)))
            .OrderBy(file => file.Path, StringComparer.Ordinal)];

    private static string Hash(string text) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)));
}
