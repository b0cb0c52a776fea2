using Auditor.Engine.Remedies;
using Auditor.Reports.Model;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Remedies;

/// <summary>Builds the model of a report on remedies.</summary>
internal sealed class RemediesBuilder(RemedyResult result)
{
    /// <summary>More than these are counted only: the reader wants the least changes.</summary>
    private const int MostShown = 8;

    private readonly Places _places = new(result.Audit.Design.File);

    public RemediesModel Build()
    {
        var said = ProjectWords.Of(result.Audit.Design);
        return new RemediesModel
        {
            Project = new ReportProject(said("title") ?? "", said("reference") ?? "", said("revision") ?? "", said("designer") ?? "", said("checker") ?? ""),
            Design = _places.Design,
            RuleSet = ReportRuleSet.Of(result.Audit.Rules),
            Decision = AuditBasis.Sentence(result.Audit.Decision),
            Inputs = _places.Inputs,
            Groups = [.. result.Findings.Select(Group)],
            Solved = result.Findings.Count(each => each.Remedies.Count > 0),
        };
    }

    private RemedyGroup Group(FindingRemedies each) => new()
    {
        Key = each.Finding.Key,
        SubjectLabel = SubjectText.Label(each.Finding.Subject),
        Title = each.Finding.Rule.Title,
        Sentence = each.Finding.Message,
        Verdict = each.Finding.VerdictText,
        Location = _places.Text(each.Finding.Location),
        Rows = [.. each.Remedies.Take(MostShown).Select((remedy, i) => Row(each, remedy, i + 1))],
        More = Math.Max(0, each.Remedies.Count - MostShown),
        None = RemedyText.None(each),
    };

    private static RemedyRow Row(FindingRemedies each, Remedy remedy, int number) => new(
        number, [.. remedy.Changes.Select(RemedyText.Change)], RemedyText.Margins(remedy, each.Finding.Rule), RemedyText.Besides(remedy),
        [.. remedy.Inputs.Select(RemedyText.Input)], remedy.Rechecked);
}
