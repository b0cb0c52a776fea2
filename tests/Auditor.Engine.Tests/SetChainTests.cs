using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests;

public class SetChainTests
{
    private const string Sheet = "circuit limit A = 10 A; circuit kept A = limit * 2";

    [Fact]
    public void A_set_is_built_on_another_by_the_path_of_its_file()
    {
        using var rules = new TemporaryRules()
            .With("house.yaml", "set: house\ntitle: House\nextends: base/base.yaml\n")
            .With("base/base.yaml", "set: base\ntitle: Base\nedition: first\nnotice: Mind the gap.\nparameters: { drop: { value: 3 % } }\n");

        var title = rules.LoadSound("house.yaml").Title;

        Assert.Equal(("house", "House", "first", "Mind the gap."), (title.Id, title.Text, title.Edition, title.Notice));
        Assert.Equal(["base", "house"], title.Chain);
    }

    [Fact]
    public void A_set_is_built_on_a_shipped_one_by_its_name()
    {
        using var rules = new TemporaryRules().With("house.yaml", "set: house\ntitle: House\nextends: iec-base\nparameters: { cmin: { value: 0.9 } }\n");

        var set = rules.LoadSound("house.yaml");

        Assert.Equal(["iec-base", "house"], set.Title.Chain);
        Assert.Equal("0.9", set.Parameters.Single(parameter => parameter.Id == "cmin").Text);
        Assert.True(set.Rules.Count > 100);
    }

    [Theory]
    [InlineData("sets/house.yaml", "", "sets/house.yaml", "sets/base.yaml", "rules/kept.yaml")]
    [InlineData("house", "sets", "house.yaml", "base.yaml", "rules/kept.yaml")]
    [InlineData("../sets/house.yaml", "rules", "../sets/house.yaml", "../sets/base.yaml", "../rules/kept.yaml")]
    public void Sets_beside_one_another_are_shown_by_the_path_on_which_they_were_found(string asked, string from, params string[] shown)
    {
        using var rules = new TemporaryRules()
            .With("sets/house.yaml", "set: house\ntitle: House\nextends: base\n")
            .With("sets/base.yaml", "set: base\ntitle: Base\nuses: { provisions: [rules/kept.yaml] }\n")
            .With("rules/kept.yaml", Rule("kept", "requirement").Replace("limit > 5", "device.rating > 5", StringComparison.Ordinal));
        var problems = new Problems();

        var set = RuleSetLoader.Load(Small.Home, asked, Path.Combine(rules.Folder, from), null, problems);

        Assert.Equal("", ProblemText.Render(problems.All));
        Assert.Equal(shown.Order(StringComparer.Ordinal), set!.Files.Select(file => file.Path).Where(path => !path.Contains("record", StringComparison.Ordinal)).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void A_later_set_overrides_a_parameter_and_leaves_what_it_does_not_say()
    {
        using var rules = new TemporaryRules()
            .With("base.yaml", "set: base\ntitle: Base\nparameters:\n  drop-limit: { value: 3 %, about: Drop., tighter: lower, source: somebody, trust: memory }\n  other: { value: 1 }\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nparameters:\n  drop-limit: { value: 2 %, source: the firm, trust: one source }\n");

        var set = rules.LoadSound("house.yaml");

        Assert.Equal(
            ["drop-limit = 2 % (Drop., lower, the firm, OneSource) house.yaml:5", "other = 1 (, none, , ) base.yaml:5"],
            set.Parameters.Select(each => $"{each.Id} = {each.Text} ({each.About}, {each.Tighter}, {each.Source}, {each.Trust}) {each.Span.Source.Path}:{each.Span.StartLocation.Line}"));
        Assert.Equal(["drop_limit", "other"], set.Parameters.Select(each => each.Slot.Name));
    }

    [Fact]
    public void A_later_set_overrides_a_quantity_a_cell_and_a_rule()
    {
        using var rules = new TemporaryRules()
            .With("base/base.yaml", "set: base\ntitle: Base\nuses: { tables: [tables], sheets: [sheet.yaml], provisions: [rules] }\n")
            .With("base/tables/lookup.yaml", "lookup: figure\nabout: For the test.\nkeys: [{ name: n, unit: 1 }]\nvalue: { name: v, unit: A }\nwhen-missing: ask\n")
            .With("base/tables/figures.yaml", Table("figures", "[1, 10]", "[2, 20]"))
            .WithSheet("base/sheet.yaml", Sheet.Split("; "))
            .With("base/rules/the-rule.yaml", Rule("the-rule", "recommendation"))
            .With("base/rules/base-rule.yaml", Rule("base-rule", "requirement"))
            .With("house.yaml", "set: house\ntitle: House\nextends: base/base.yaml\nuses: { tables: [cells.yaml], sheets: [own.yaml], provisions: [the-rule.yaml] }\n")
            .With("cells.yaml", Table("cells", "[2, 25]", "[3, 30]"))
            .WithSheet("own.yaml", "circuit limit A = table('figure', 2)")
            .With("the-rule.yaml", Rule("the-rule", "requirement"));

        var set = rules.LoadSound("house.yaml");
        var circuit = Small.Design("house", set).Find("DB1/1")!;

        Assert.Equal(25, circuit.Quantity(circuit.Shape.Quantity("limit")!.Index).Number);
        Assert.Equal(50, circuit.Quantity(circuit.Shape.Quantity("kept")!.Index).Number);
        Assert.Equal(["10 base/tables/figures.yaml", "25 cells.yaml", "30 cells.yaml"], set.World.Lookups["figure"].Cells().Select(entry => $"{entry.Cell.Number} {entry.Cell.Table.Path}"));
        Assert.Equal(["base-rule Requirement base/rules/base-rule.yaml", "the-rule Requirement the-rule.yaml"],
            set.Rules.Select(rule => $"{rule.Id} {rule.Provision} {rule.Path}"));
    }

    [Theory]
    [InlineData("circuit limit V = 10 V", "there is a `limit` of the circuit already")]
    [InlineData("circuit limit flag = true", "there is a `limit` of the circuit already")]
    public void A_quantity_keeps_its_unit_when_it_is_overridden(string quantity, string message)
    {
        using var rules = new TemporaryRules()
            .With("base.yaml", "set: base\ntitle: Base\nuses: { sheets: [sheet.yaml] }\n").WithSheet("sheet.yaml", Sheet.Split("; "))
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nuses: { sheets: [own.yaml] }\n").WithSheet("own.yaml", quantity);
        rules.Load("house.yaml", out var problems);

        var problem = Assert.Single(problems.All);
        Assert.Equal(message, problem.Message);
        Assert.Equal("it is defined at sheet.yaml:4:13; choose another symbol", problem.Help);
    }

    [Fact]
    public void A_file_named_twice_is_read_once()
    {
        using var rules = new TemporaryRules().WithSheet("sheets/sheet.yaml", Sheet.Split("; "))
            .With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheets, sheets/sheet.yaml, ./sheets/../sheets] }\n");

        Assert.Equal(2, rules.LoadSound("set.yaml").Quantities.Count());
    }

    [Theory]
    [InlineData("extends: base.yaml", "set `base.yaml` extends itself", "base.yaml:3:10")]
    [InlineData("extends: ./base.yaml", "set `./base.yaml` extends itself", "base.yaml:3:10")]
    [InlineData("extends: other.yaml", "set `base.yaml` extends itself", "other.yaml:3:10")]
    [InlineData("extends: ../outside.yaml", "`../outside.yaml` lies outside the folder of this set", "base.yaml:3:10")]
    [InlineData("extends: /etc/passwd", "`/etc/passwd` lies outside the folder of this set", "base.yaml:3:10")]
    [InlineData("extends: link/outside.yaml", "`link/outside.yaml` lies outside the folder of this set", "base.yaml:3:10")]
    [InlineData("extends: iec-bse", "there is no shipped rule set `iec-bse`", "base.yaml:3:10")]
    [InlineData("extends: long0.yaml", "more than 16 sets build on one another", "long14.yaml:3:10")]
    [InlineData("uses: { sheets: [../outside] }", "`../outside` lies outside the folder of this set", "base.yaml:3:18")]
    [InlineData("uses: { sheets: [link] }", "`link` lies outside the folder of this set", "base.yaml:3:18")]
    [InlineData("uses: { sheets: [link/sheet.yaml] }", "`link/sheet.yaml` lies outside the folder of this set", "base.yaml:3:18")]
    [InlineData("uses: { sheets: [linked.yaml] }", "`linked.yaml` lies outside the folder of this set", "base.yaml:3:18")]
    [InlineData("uses: { sheets: [nothing] }", "there is no `nothing`", "base.yaml:3:18")]
    public void A_set_that_reaches_out_or_runs_in_a_circle_is_refused(string line, string message, string place)
    {
        using var outside = new TemporaryRules().With("outside.yaml", "set: outside\ntitle: Outside\n").WithSheet("sheet.yaml", Sheet.Split("; "));
        using var rules = new TemporaryRules().With("base.yaml", $"set: base\ntitle: Base\n{line}\n").With("other.yaml", "set: other\ntitle: Other\nextends: base.yaml\n");
        for (var number = 0; number < 20; number++)
        {
            rules.With($"long{number}.yaml", $"set: long\ntitle: Long\nextends: long{number + 1}.yaml\n");
        }

        Directory.CreateSymbolicLink(Path.Combine(rules.Folder, "link"), outside.Folder);
        File.CreateSymbolicLink(Path.Combine(rules.Folder, "linked.yaml"), Path.Combine(outside.Folder, "sheet.yaml"));

        Assert.Null(rules.Load("base.yaml", out var problems));
        var problem = Assert.Single(problems.All);
        Assert.Equal((message, place), (problem.Message, problem.Span.ToString()));
    }

    [Fact]
    public void A_link_inside_a_folder_that_leads_out_of_it_is_passed_over()
    {
        using var outside = new TemporaryRules().WithSheet("sheet.yaml", Sheet.Split("; "));
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheets] }\n").WithSheet("sheets/own.yaml", "circuit own A = 1 A");
        File.CreateSymbolicLink(Path.Combine(rules.Folder, "sheets", "linked.yaml"), Path.Combine(outside.Folder, "sheet.yaml"));
        Directory.CreateSymbolicLink(Path.Combine(rules.Folder, "sheets", "folder"), outside.Folder);

        Assert.Equal(["own"], rules.LoadSound("set.yaml").Quantities.Select(quantity => quantity.Slot.Symbol));
    }

    [Theory]
    [InlineData("united-kingdm", "there is no shipped rule set `united-kingdm`", "did you mean `united-kingdom`? shipped sets: iec-base, united-kingdom; or give the path of a set file")]
    [InlineData("mars", "there is no shipped rule set `mars`", "shipped sets: iec-base, united-kingdom; or give the path of a set file")]
    [InlineData("missing.yaml", "there is no such file", null)]
    public void A_set_that_is_not_there_is_told(string name, string message, string? help)
    {
        using var rules = new TemporaryRules();
        Assert.Null(rules.Load(name, out var problems));

        var problem = Assert.Single(problems.All);
        Assert.Equal(message, problem.Message);
        Assert.True(help is null || help == problem.Help, problem.Help);
    }

    [Fact]
    public void The_hash_of_a_set_is_that_of_its_files_and_of_nothing_else()
    {
        var title = () =>
        {
            using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheet.yaml] }\n").WithSheet("sheet.yaml", Sheet.Split("; "));
            return rules.LoadSound("set.yaml");
        };
        var first = title();
        using var other = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheet.yaml] }\n").WithSheet("sheet.yaml", "circuit limit A = 11 A");

        Assert.Equal(first.Title.Sha256, title().Title.Sha256);
        Assert.NotEqual(first.Title.Sha256, other.LoadSound("set.yaml").Title.Sha256);
        Assert.Equal(["set.yaml", "sheet.yaml"], first.Files.Select(file => file.Path));
        Assert.All(first.Files, file => Assert.Equal(64, file.Sha256.Length));
    }

    private static string Table(string id, params string[] rows) =>
        $"table: {id}\nlookup: figure\ntitle: {id}\nsource: our own invention\ntrust: one source\ndown: n\nrows:\n" + string.Concat(rows.Select(row => $"  - {row}\n"));

    private static string Rule(string id, string provision) =>
        $"rule: {id}\ntitle: A rule\nclause: {{ type: plausibility }}\nprovision: {provision}\nstatus: {{ since: 1.0 }}\nof: circuit\nrequire: limit > 5 A\nsays: Nothing.\nwhy: Because.\n"
        + "departures: allowed\ncases: [{ name: none, verdict: conforms }]\n";
}
