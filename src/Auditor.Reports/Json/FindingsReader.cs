using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Engine.Departures;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Reports.Json;

/// <summary>Takes a revision from a findings file that its schema and the checks have accepted.</summary>
internal sealed class FindingsReader(string name, MappingNode root)
{
    private readonly MappingNode? _stated = root.Mapping("stated");
    private readonly Dictionary<string, MappingNode> _rules = root.Mappings("rules").ToDictionary(rule => rule.Text("id")!, StringComparer.Ordinal);

    public Revision Read() => new()
    {
        Name = name,
        Mark = Text(root.Mapping("project")!, "revision") ?? "",
        Inputs = [.. root.Mappings("inputs").Select(input => new InputFile(input.Text("path")!, input.Text("sha256")!))],
        Rules = Rules(root.Mapping("ruleSet")!),
        Subjects = [.. root.Mappings("subjects").Select(Subject)],
        Findings = [.. root.Mappings("findings").Select(Finding)],
        Departures = [.. root.Mappings("departures").Select(Departure)],
    };

    private RevisionRules Rules(MappingNode set)
    {
        var parameters = set.Mappings("parameters").Select(node => new RevisionParameter(node.Text("name")!, "", Figure(node)!));
        var applied = _rules.Select(rule => (Id: rule.Key, Title: rule.Value.Text("title")!));
        var rules = applied.Concat(root.Texts("neverApplied").Select(id => (Id: id, Title: "")))
            .DistinctBy(rule => rule.Id).OrderBy(rule => rule.Id, StringComparer.Ordinal)
            .Select(rule => new RevisionRule(rule.Id, rule.Title, []));
        return new RevisionRules(set.Text("name")!, set.Text("title")!, Text(set, "edition") ?? "", set.Text("sha256")!, [.. parameters], [.. rules]);
    }

    private RevisionSubject Subject(MappingNode node) => new(node.Text("key")!, node.Text("kind")!, Text(node, "name"), Text(node, "parent"))
    {
        Place = PlaceOf(node),
        Stated = _stated is null ? null : [.. (_stated.Mapping(node.Text("key")!)?.Entries ?? []).Select(Input)],
    };

    private static RevisionInput Input(MappingEntry entry)
    {
        var node = (MappingNode)entry.Value;
        return new RevisionInput(entry.Key.Value, node.Text("text")!, node.Text("from")!, null, PlaceOf(node));
    }

    private RevisionFinding Finding(MappingNode node)
    {
        var limit = node.Mapping("limit");
        var margin = node.Mapping("margin");
        var rule = _rules[node.Text("rule")!];
        var limits = limit is null ? [] : Limits(limit);
        double? distance = margin is not null && Number(margin, "absolute") is { } number ? UnitOf(margin).ToCoherent(number) : null;
        return new RevisionFinding
        {
            Rule = node.Text("rule")!,
            Title = rule.Text("title")!,
            Subject = node.Text("subject")!,
            Verdict = VerdictWords.Find(node.Text("verdict")!)!.Value,
            OnAssumption = node.Scalar("onAssumption")!.Flag,
            IsRequirement = rule.Text("provision") == "requirement",
            Value = node.Mapping("value") is { } value ? Figure(value) : null,
            Limits = limits,
            LimitShown = limit is null ? "" : LimitText.Show(Relation(limit.Text("relation")!), [.. limits.Select(figure => figure.Text)]),
            RelativeMargin = margin is null ? null : Number(margin, "relative"),
            AbsoluteMargin = distance,
            MarginShown = distance is { } shown ? ValueText.ShowNumber(shown, UnitOf(margin!)) : "",
            Message = node.Text("message")!,
            Missing = [.. node.Mappings("missing").Select(gap => gap.Text("name")!).Distinct(StringComparer.Ordinal)],
            Place = PlaceOf(node),
        };
    }

    private static Figure[] Limits(MappingNode limit)
    {
        var figures = limit.Items("value").OfType<ScalarNode>().Select(scalar => Figure(scalar, UnitOf(limit)));
        return limit.Scalar("to") is { Kind: ScalarKind.Number } to ? [.. figures, Figure(to, UnitOf(limit))] : [.. figures];
    }

    private static CheckKind Relation(string word) => word switch
    {
        "at-most" => CheckKind.AtMost,
        "at-least" => CheckKind.AtLeast,
        "within" => CheckKind.Within,
        "equals" => CheckKind.Equal,
        _ => CheckKind.OneOf,
    };

    private static Figure Figure(MappingNode node) => Figure(node.Scalar("value")!, UnitOf(node));

    private static Figure Figure(ScalarNode scalar, Unit unit) => Engine.Comparisons.Figure.Of(
        scalar.Kind switch
        {
            ScalarKind.Number => Value.Of(unit.ToCoherent(scalar.Number)),
            ScalarKind.Flag => Value.Of(scalar.Flag),
            _ => Value.Of(scalar.Text),
        },
        unit) ?? new Figure(null, scalar.Text);

    private static RevisionDeparture Departure(MappingNode node) => new(
        node.Text("rule")!, node.Text("subject")!, node.Text("reason")!, node.Text("agreedBy")!, node.Text("date")!, Text(node, "until"),
        node.Text("state") switch
        {
            "inForce" => DepartureState.InForce,
            "notNeeded" => DepartureState.NotNeeded,
            "expired" => DepartureState.Expired,
            "forbidden" => DepartureState.Forbidden,
            _ => DepartureState.Unmatched,
        },
        PlaceOf(node));

    private static Place? PlaceOf(MappingNode node) => node.Mapping("location") is { } place
        ? new Place(place.Text("file")!, (int)place.Scalar("line")!.Number, (int)place.Scalar("column")!.Number)
        : null;

    /// <summary>The unit of a figure. One that the program does not know any more is taken as it is: such figures compare as numbers.</summary>
    private static Unit UnitOf(MappingNode node) => (Text(node, "unit") is { } symbol ? UnitCatalog.Find(symbol) : null) ?? Unit.One;

    private static double? Number(MappingNode node, string key) => node.Scalar(key) is { Kind: ScalarKind.Number } scalar ? scalar.Number : null;

    private static string? Text(MappingNode node, string key) => node.Scalar(key) is { Kind: not ScalarKind.Null } scalar ? scalar.Text : null;
}
