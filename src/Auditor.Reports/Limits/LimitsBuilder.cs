using Auditor.Engine.Limits;
using Auditor.Reports.Model;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Limits;

/// <summary>Builds the model of a report on limits.</summary>
internal sealed class LimitsBuilder(LimitResult result)
{
    private const string TestTemperature = "basis.test_temperature";

    public LimitsModel Build()
    {
        var design = result.Design;
        var said = ProjectWords.Of(design);
        var places = new Places(design.File);
        var title = design.Evaluator.Rules.Title;
        var rows = result.Inputs.Select(limit => (limit.Input, Row: Row(limit))).ToArray();
        return new LimitsModel
        {
            Project = new ReportProject(said("title") ?? "", said("reference") ?? "", said("revision") ?? "", said("designer") ?? "", said("checker") ?? ""),
            Design = places.Design,
            RuleSet = new ReportRuleSet(
                title.Id, title.Text, title.Edition, title.Notice, title.Chain, title.Sha256, design.Evaluator.Rules.Rules.Count, Loosened.Text(design.Evaluator.Rules)),
            Inputs = places.Inputs,
            TestTemperature = design.Installation.Shape.Input(TestTemperature) is { } slot ? LimitText.Value(design.Installation.Input(slot.Index), slot) : "",
            Groups = [.. rows.GroupBy(pair => pair.Input.Subject)
                .Select(group => new LimitsGroup(group.Key.Key, SubjectText.Label(group.Key), [.. group.Select(pair => pair.Row)]))],
            Site = [.. rows.Where(pair => pair.Input.Adjustment.IsForSite).Select(pair => pair.Row).Where(IsBounded)],
        };
    }

    private static bool IsBounded(LimitsRow row) => row.Least.Length > 0 || row.Most.Length > 0 || row.Advised.Length > 0;

    private static bool IsNarrower(InputLimit limit) =>
        limit is { Advised: { } advised, Around: { } around }
        && (advised.Least?.Edge.Position != around.Least?.Edge.Position || advised.Most?.Edge.Position != around.Most?.Edge.Position);

    private static LimitsRow Row(InputLimit limit)
    {
        var (input, slot) = (limit.Input, limit.Input.Adjustment.Slot);
        return new LimitsRow
        {
            Subject = input.Subject.Key,
            SubjectLabel = SubjectText.Label(input.Subject),
            Input = input.Adjustment.Path,
            Label = input.Adjustment.Label,
            IsReading = input.Adjustment.IsReading,
            Stated = LimitText.Value(input.Stated, slot),
            Expected = LimitText.Value(limit.Expected, slot),
            Least = LimitText.Least(limit.Around?.Least?.Edge, slot),
            LeastRule = LimitText.Rule(limit.Around?.Least, input.Subject),
            Most = LimitText.Most(limit.Around?.Most?.Edge, slot),
            MostRule = LimitText.Rule(limit.Around?.Most, input.Subject),
            Advised = IsNarrower(limit) ? LimitText.Range(limit.Advised!.Least?.Edge, limit.Advised.Most?.Edge, slot) : "",
            Guarded = LimitText.Range(limit.Guarded?.Least?.Edge, limit.Guarded?.Most?.Edge, slot),
            Notes = LimitNotes.Of(limit),
        };
    }
}
