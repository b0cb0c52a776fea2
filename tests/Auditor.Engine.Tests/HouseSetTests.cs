using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Engine.RuleTests;

namespace Auditor.Engine.Tests;

/// <summary>What a house set changes in the set below it, and what an audit says of that.</summary>
public class HouseSetTests
{
    private const string Lower = "drop: { value: 4 %, about: Drop., tighter: lower }";
    private const string Higher = "ways: { value: 25 %, about: Ways., tighter: higher }";

    [Theory]
    [InlineData(Lower, "drop: { value: 5 % }", "loosens drop: 4 % → 5 % (lower is stricter)")]
    [InlineData(Lower, "drop: { value: 3 % }", "tightens drop: 4 % → 3 % (lower is stricter)")]
    [InlineData(Lower, "drop: { value: 0.04 }", "")]
    [InlineData(Lower, "drop: { value: 4 %, source: the firm }", "")]
    [InlineData(Higher, "ways: { value: 20 % }", "loosens ways: 25 % → 20 % (higher is stricter)")]
    [InlineData(Higher, "ways: { value: 30 % }", "tightens ways: 25 % → 30 % (higher is stricter)")]
    [InlineData("asked: { value: true, tighter: higher }", "asked: { value: false }", "loosens asked: true → false (higher is stricter)")]
    [InlineData("asked: { value: false, tighter: higher }", "asked: { value: true }", "tightens asked: false → true (higher is stricter)")]
    [InlineData("reading: { value: plain, tighter: none }", "reading: { value: reduced }", "loosens reading: plain → reduced (no direction is declared to be the stricter one)")]
    [InlineData("length: { value: 20 m }", "length: { value: 10 m }", "loosens length: 20 m → 10 m (no direction is declared to be the stricter one)")]
    [InlineData(Lower, "other: { value: 5 % }", "")]
    public void A_parameter_that_moves_against_its_stricter_direction_is_told(string before, string after, string told)
    {
        using var rules = new TemporaryRules()
            .With("base.yaml", $"set: base\ntitle: Base\nparameters:\n  {before}\n")
            .With("house.yaml", $"set: house\ntitle: House\nextends: base.yaml\nparameters:\n  {after}\n");

        var changes = rules.LoadSound("house.yaml").Changes;

        Assert.Equal(told, string.Join(", ", changes.Select(change =>
            $"{(change.Loosens ? "loosens" : "tightens")} {change.Name}: {change.Before} → {change.After} ({change.How})")));
        Assert.All(changes, change => Assert.Equal(("house", "house.yaml", 5), (change.Set, change.Span.Source.Path, change.Span.StartLocation.Line)));
    }

    [Fact]
    public void A_loosened_parameter_is_a_finding_at_its_line_and_a_tightened_one_conforms()
    {
        using var rules = new TemporaryRules()
            .With("base.yaml", $"set: base\ntitle: Base\nparameters:\n  {Lower}\n  {Higher}\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nparameters:\n  drop: { value: 5 % }\n  ways: { value: 30 % }\n");

        var result = Small.Audit(Small.DesignText("house"), rules: rules.LoadSound("house.yaml"));

        Assert.Equal(
            ["record-house-set-not-looser:change/parameter drop nonconforming house.yaml:5:18", "record-house-set-not-looser:change/parameter ways conforms house.yaml:6:18"],
            result.Findings.Select(finding => $"{finding.Key} {finding.Verdict.Word()} {finding.Location}"));
        Assert.Equal("House set house changes the parameter drop from 4 % to 5 %: lower is stricter.", result.Findings[0].Message);
        Assert.Equal(Provision.Requirement, result.Findings[0].Rule.Provision);
    }

    [Fact]
    public void A_named_person_may_accept_what_is_loosened()
    {
        using var rules = new TemporaryRules()
            .With("base.yaml", $"set: base\ntitle: Base\nparameters:\n  {Lower}\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nparameters:\n  drop: { value: 5 % }\n");

        var result = Small.Audit(
            Small.DesignText("house") + "departures:\n  - { rule: record-house-set-not-looser, subject: change/*, reason: Agreed., agreed-by: B. Helper, date: 2026-09-01 }\n",
            rules: rules.LoadSound("house.yaml"));

        Assert.Equal(Verdict.Departed, result.Find("record-house-set-not-looser:change/parameter drop")!.Verdict);
    }

    [Theory]
    [InlineData("provision: requirement", "advice", "tightens Provision advice: recommendation → requirement (raised)")]
    [InlineData("provision: recommendation", "duty", "loosens Provision duty: requirement → recommendation (lowered)")]
    [InlineData("departures: never", "duty", "tightens Departures duty: allowed → never (ruled out)")]
    [InlineData("departures: allowed", "never", "loosens Departures never: never → allowed (made possible)")]
    [InlineData("dropped: true", "advice", "loosens Rule advice: advice.yaml → nothing (dropped)")]
    public void What_a_set_changes_of_a_rule_is_told_when_it_asks_for_less(string change, string rule, string told)
    {
        using var rules = Base().With("house.yaml", $"set: house\ntitle: House\nextends: base.yaml\nchanges:\n  - {{ rule: {rule}, {change}, reason: The firm. }}\n");

        var set = rules.LoadSound("house.yaml");

        Assert.Equal(told, string.Join(", ", set.Changes.Select(each => $"{(each.Loosens ? "loosens" : "tightens")} {each.What} {each.Name}: {each.Before} → {each.After} ({each.How})")));
        Assert.Equal(change != "dropped: true", set.Rule(rule) is not null);
    }

    [Fact]
    public void A_raised_recommendation_is_a_requirement_in_the_audit()
    {
        using var rules = Base()
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nchanges:\n  - { rule: advice, provision: requirement, reason: The firm. }\n");

        var before = Small.Audit(Small.DesignText("house"), rules: rules.LoadSound("base.yaml")).Find("advice:DB1/1")!;
        var after = Small.Audit(Small.DesignText("house"), rules: rules.LoadSound("house.yaml")).Find("advice:DB1/1")!;

        Assert.Equal((Provision.Recommendation, Verdict.Nonconforming), (before.Rule.Provision, before.Verdict));
        Assert.Equal((Provision.Requirement, Verdict.Nonconforming), (after.Rule.Provision, after.Verdict));
        Assert.Equal("advice.yaml", after.Rule.Path);
    }

    [Fact]
    public void A_replaced_rule_table_curve_and_formula_is_told_and_one_that_is_added_is_not()
    {
        using var rules = Base()
            .With("tables/lookup.yaml", "lookup: figure\nabout: For the test.\nkeys: [{ name: n, unit: 1 }, { name: word }]\nvalue: { name: v, unit: A }\nwhen-missing: ask\n")
            .With("tables/figures.yaml", Table("figures", "[n, word]", "[1, a, 10]", "[2, a, 20]", "[3, a, null]"))
            .With("tables/curve.yaml", Curve("base-curve", "[IEC 60898, EN 60898]"))
            .WithSheet("sheet.yaml", "circuit limit A = 10 A")
            .With("base.yaml", "set: base\ntitle: Base\nedition: third\nuses: { tables: [tables], curves: [tables/curve.yaml], sheets: [sheet.yaml], provisions: [advice.yaml, duty.yaml] }\n")
            .With("cells.yaml", Table("cells", "[n, word]", "[2, a, 25]", "[3, a, 30]", "[4, a, 40]", "[1, a, 10]"))
            .With("house/curve.yaml", Curve("house-curve", "[EN 60898]"))
            .With("house/other-curve.yaml", Curve("other-curve", "[EN 61009]"))
            .WithSheet("own.yaml", "circuit limit A = 12 A", "circuit further A = 1 A")
            .With("house/advice.yaml", Rule("advice", "recommendation", "allowed"))
            .With("house/more.yaml", Rule("more", "requirement", "allowed"))
            .With("house.yaml", "set: house\ntitle: House\nedition: fourth\nextends: base.yaml\n"
                + "uses: { tables: [cells.yaml], curves: [house/curve.yaml, house/other-curve.yaml], sheets: [own.yaml], provisions: [house/advice.yaml, house/more.yaml] }\n");

        var changes = rules.LoadSound("house.yaml").Changes;

        Assert.Equal(
            [
                "Rule advice: advice.yaml → house/advice.yaml (replaced) house/advice.yaml:1",
                "Table figures: tables/figures.yaml → cells.yaml (1 figure replaced) cells.yaml:8",
                "Curve base-curve: tables/curve.yaml → house/curve.yaml (replaced) house/curve.yaml:1",
                "Quantity circuit limit: sheet.yaml → own.yaml (computed by a formula of its own) own.yaml:4",
                "Edition house: third → fourth (stated by the firm) house.yaml:3",
            ],
            changes.Select(change => $"{change.What} {change.Name}: {change.Before} → {change.After} ({change.How}) {change.Span.Source.Path}:{change.Span.StartLocation.Line}"));
        Assert.All(changes, change => Assert.True(change.Loosens));
    }

    [Fact]
    public void A_row_put_between_those_that_a_lookup_reads_between_is_told()
    {
        using var rules = new TemporaryRules()
            .With("lookup.yaml", "lookup: figure\nabout: For the test.\nkeys: [{ name: n, unit: 1 }]\nvalue: { name: v, unit: A }\nbetween: { n: linear }\nwhen-missing: ask\n")
            .With("figures.yaml", Table("figures", "n", "[1, 10]", "[2, 20]"))
            .With("more.yaml", Table("more", "n", "[1.5, 19]"))
            .With("base.yaml", "set: base\ntitle: Base\nuses: { tables: [lookup.yaml, figures.yaml] }\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nuses: { tables: [more.yaml] }\n");

        var change = Assert.Single(rules.LoadSound("house.yaml").Changes);
        Assert.Equal(("figure", true, "more.yaml"), (change.Name, change.Loosens, change.After));
    }

    [Fact]
    public void A_house_set_adds_to_the_notice_and_cannot_lose_it()
    {
        using var rules = new TemporaryRules()
            .With("base.yaml", "set: base\ntitle: Base\nnotice: Mind the gap.\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nnotice: All is well.\n");

        var title = rules.LoadSound("house.yaml").Title;

        Assert.Equal(("Mind the gap. All is well.", "base"), (title.Notice, title.BuiltOn));
    }

    [Fact]
    public void A_set_between_the_shipped_one_and_the_house_set_hides_nothing()
    {
        using var rules = new TemporaryRules()
            .With("sets/firm.yaml", "set: firm\ntitle: Firm\nextends: office\nparameters: { voltage-drop-lighting: { value: 9 % } }\n")
            .With("sets/office.yaml", "set: office\ntitle: Office\nextends: united-kingdom\n");

        var change = Assert.Single(rules.LoadSound("sets/firm.yaml").Changes);
        Assert.Equal(("voltage-drop-lighting", "3 %", "9 %", true), (change.Name, change.Before, change.After, change.Loosens));
    }

    [Fact]
    public void The_sets_of_a_copy_of_the_rule_data_are_no_house_sets()
    {
        using var rules = new TemporaryRules()
            .With("sets/country.yaml", "set: country\ntitle: Country\nextends: common\nparameters: { drop: { value: 9 % } }\n")
            .With("sets/common.yaml", $"set: common\ntitle: Common\nparameters: {{ {Lower} }}\n")
            .With("firm.yaml", "set: firm\ntitle: Firm\nextends: sets/country.yaml\nparameters: { drop: { value: 10 % } }\n");

        Assert.Empty(rules.LoadSound("sets/country.yaml").Changes);
        Assert.Equal("9 % 10 %", string.Join(", ", rules.LoadSound("firm.yaml").Changes.Select(change => $"{change.Before} {change.After}")));
    }

    [Theory]
    [InlineData("parameters: { drop: { value: 5 %, tighter: higher } }", "tighter-restated: parameter `drop` has its stricter direction already: lower")]
    [InlineData("parameters: { drop: { value: 5 V } }", "parameter-kind: parameter `drop` is a pure number, and this is a quantity in V")]
    [InlineData("changes: [{ rule: advise, dropped: true, reason: None. }]", "change-of-no-rule: there is no rule `advise` to change")]
    [InlineData("changes: [{ rule: record-house-set-not-looser, dropped: true, reason: None. }]", "change-of-no-rule: there is no rule `record-house-set-not-looser` to change")]
    [InlineData("changes: [{ rule: advice, provision: requirement, departures: never }]", "missing-key: an item of `changes` lacks `reason`")]
    [InlineData("changes: [{ rule: advice, reason: None. }]", "too-few: an item of `changes` must have at least 3 keys")]
    [InlineData("changes: [{ rule: advice, dropped: false, reason: None. }]", "unknown-word: `false` is not a dropped")]
    [InlineData("templates: { md: ../outside.scriban-md }", "rules-outside-folder: `../outside.scriban-md` lies outside the folder of this set")]
    [InlineData("templates: { md: /etc/hostname }", "rules-outside-folder: `/etc/hostname` lies outside the folder of this set")]
    [InlineData("templates: { md: none.scriban-md }", "rules-not-found: there is no `none.scriban-md`")]
    [InlineData("templates: { pdf: a.scriban-md }", "unknown-key: `pdf` is not a key of `templates`")]
    public void A_house_set_that_is_wrong_is_told_at_its_place(string line, string told)
    {
        using var rules = Base($"parameters: {{ {Lower} }}\n").With("house.yaml", $"set: house\ntitle: House\nextends: base.yaml\n{line}\n");

        Assert.Null(rules.Load("house.yaml", out var problems));
        var problem = Assert.Single(problems.All);
        Assert.StartsWith("house.yaml:4:", problem.Span.ToString(), StringComparison.Ordinal);
        Assert.Equal(told, $"{problem.Code}: {problem.Message}");
    }

    [Fact]
    public void A_change_that_changes_nothing_is_a_warning()
    {
        using var rules = Base().With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nchanges:\n  - { rule: duty, provision: requirement, reason: None. }\n");

        var set = rules.Load("house.yaml", out var problems);

        Assert.Empty(set!.Changes);
        Assert.Equal("change-of-nothing", Assert.Single(problems.All).Code);
    }

    [Fact]
    public void Cases_of_the_sets_below_know_nothing_of_a_parameter_that_a_house_set_moves_and_its_own_do()
    {
        const string Of = "of: circuit\ncompare: { value: design_current_made, at-most: param.most }\nsays: \"{{ value }} {{ limit }}\"\nwhy: Because.\ndepartures: allowed\n";
        static string Limit(string id, string given, string verdict) =>
            $"rule: {id}\ntitle: A rule\nclause: {{ type: plausibility }}\nprovision: requirement\nstatus: {{ since: 1.0 }}\n{Of}cases: [{{ name: one, given: {{ {given} }}, verdict: {verdict} }}]\n";
        using var rules = new TemporaryRules()
            .WithSheet("sheet.yaml", "circuit design_current_made A = 1 A")
            .With("below.yaml", Limit("below", "design_current_made: 15 A", "conforms"))
            .With("above.yaml", Limit("above", "design_current_made: 15 A", "nonconforming"))
            .With("base.yaml", "set: base\ntitle: Base\nuses: { sheets: [sheet.yaml], provisions: [below.yaml] }\nparameters: { most: { value: 20 A, tighter: lower } }\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\nuses: { provisions: [above.yaml] }\nparameters: { most: { value: 10 A } }\n");
        var set = rules.LoadSound("house.yaml");

        var results = set.Rules.SelectMany(new CaseRunner(set, new Problems()).Run).ToArray();

        Assert.Equal(["above ", "below "], results.Select(result => $"{result.Owner} {result.Failure}"));
        var mutations = new MutationRunner(set).Run();
        Assert.All(mutations.Survivors, survivor => Assert.Equal("above.yaml", survivor.Span.Source.Path));
        Assert.InRange(mutations.Count, 1, 10);
    }

    [Fact]
    public void A_template_of_the_last_set_that_has_one_is_used()
    {
        using var rules = new TemporaryRules()
            .With("base.yaml", "set: base\ntitle: Base\ntemplates: { md: a.scriban-md, txt: a.scriban-txt }\n")
            .With("house.yaml", "set: house\ntitle: House\nextends: base.yaml\ntemplates: { md: own/b.scriban-md }\n")
            .With("a.scriban-md", "").With("a.scriban-txt", "").With("own/b.scriban-md", "");

        Assert.Equal(
            [".md own/b.scriban-md", ".txt a.scriban-txt"],
            rules.LoadSound("house.yaml").Templates.OrderBy(entry => entry.Key, StringComparer.Ordinal).Select(entry => $"{entry.Key} {entry.Value.DisplayPath}"));
    }

    [Fact]
    public void A_set_or_a_template_behind_a_symbolic_link_is_refused()
    {
        using var outside = new TemporaryRules().With("secret.yaml", "set: secret\ntitle: Secret\n").With("secret.scriban-md", "");
        using var rules = new TemporaryRules()
            .With("template.yaml", "set: template\ntitle: Template\ntemplates: { md: linked.scriban-md }\n")
            .With("sets/house.yaml", "set: house\ntitle: House\nextends: linked\n");
        File.CreateSymbolicLink(Path.Combine(rules.Folder, "linked.yaml"), Path.Combine(outside.Folder, "secret.yaml"));
        File.CreateSymbolicLink(Path.Combine(rules.Folder, "linked.scriban-md"), Path.Combine(outside.Folder, "secret.scriban-md"));
        File.CreateSymbolicLink(Path.Combine(rules.Folder, "sets", "linked.yaml"), Path.Combine(outside.Folder, "secret.yaml"));
        Directory.CreateSymbolicLink(Path.Combine(rules.Folder, "folder"), outside.Folder);

        Assert.Equal("rule-set-linked", Code(rules, "linked.yaml"));
        Assert.Equal("rule-set-linked", Code(rules, "folder/secret.yaml"));
        Assert.Equal("rule-set-linked", Code(rules, Path.Combine(rules.Folder, "linked.yaml")));
        Assert.Equal("extends-outside-folder", Code(rules, "sets/house.yaml"));
        Assert.Equal("rules-outside-folder", Code(rules, "template.yaml"));
    }

    private static string Code(TemporaryRules rules, string path)
    {
        Assert.Null(rules.Load(path, out var problems));
        return Assert.Single(problems.All).Code;
    }

    private static TemporaryRules Base(string parameters = "") => new TemporaryRules()
        .With("base.yaml", "set: base\ntitle: Base\nuses: { provisions: [advice.yaml, duty.yaml, never.yaml] }\n" + parameters)
        .With("advice.yaml", Rule("advice", "recommendation", "allowed"))
        .With("duty.yaml", Rule("duty", "requirement", "allowed"))
        .With("never.yaml", Rule("never", "requirement", "never"));

    private static string Rule(string id, string provision, string departures) =>
        $"rule: {id}\ntitle: A rule\nclause: {{ type: plausibility }}\nprovision: {provision}\nstatus: {{ since: 1.0 }}\nof: circuit\nrequire: matches(key, 'X.*')\n"
        + $"says: Nothing.\nwhy: Because.\ndepartures: {departures}\ncases: [{{ name: none, verdict: nonconforming }}]\n";

    private static string Table(string id, string down, params string[] rows) =>
        $"table: {id}\nlookup: figure\ntitle: {id}\nsource: our own invention\ntrust: one source\ndown: {down}\nrows:\n" + string.Concat(rows.Select(row => $"  - {row}\n"));

    private static string Curve(string id, string standards) =>
        File.ReadAllText(Testing.Repository.PathOf("rules/curves/en-60898-b.yaml"))
            .Replace("curve: en-60898-b", "curve: " + id, StringComparison.Ordinal)
            .Split('\n').Aggregate("", (text, line) => text + (line.StartsWith("standard:", StringComparison.Ordinal) ? "standard: " + standards : line) + "\n");
}
