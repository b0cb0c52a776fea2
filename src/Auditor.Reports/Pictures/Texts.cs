using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;

namespace Auditor.Reports.Pictures;

/// <summary>Puts together what a plan writes of subjects.</summary>
internal static class Texts
{
    /// <summary>The known values of a role, each with the label that the plan gives it; what is missing is left out.</summary>
    public static string Known(this PicturePlan plan, DesignSubject subject, string role, string between = " ") => string.Join(between, plan
        .All(subject.Shape, role).Where(quantity => !quantity.Of(subject).IsMissing)
        .Select(quantity => quantity.IsLabelled ? $"{quantity.Label} {quantity.Show(subject)}" : quantity.Show(subject)));

    /// <summary>Labels of a role, as headings of a table.</summary>
    public static IEnumerable<string> Headings(this PicturePlan plan, SubjectShape shape, string role) => plan.All(shape, role).Select(quantity => quantity.Label);

    /// <summary>All values of a role, missing ones too.</summary>
    public static IEnumerable<string> Values(this PicturePlan plan, DesignSubject subject, string role) =>
        plan.All(subject.Shape, role).Select(quantity => quantity.Show(subject));

    /// <summary>Id of a subject within its parent.</summary>
    public static string OwnId(DesignSubject subject) => subject.Key[(subject.Key.IndexOf('/') + 1)..];
}
