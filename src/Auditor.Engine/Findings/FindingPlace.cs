using Auditor.Documents;
using Auditor.Engine.Installation;

namespace Auditor.Engine.Findings;

/// <summary>Finds the place in the design that a finding points at.</summary>
internal static class FindingPlace
{
    private const string CablePrefix = "cable.";

    public static SourceSpan Of(Finding finding)
    {
        foreach (var path in finding.Rule.PutRightBy)
        {
            if (PlaceOf(finding.Subject, path) is { } span)
            {
                return span;
            }
        }

        return finding.Subject.Place;
    }

    private static SourceSpan? PlaceOf(DesignSubject subject, string path)
    {
        if (path.StartsWith(CablePrefix, StringComparison.Ordinal) && subject.Legs is [var leg, ..])
        {
            return PlaceOf(leg, path[CablePrefix.Length..]);
        }

        return subject.Shape.Input(path.Replace('-', '_')) is { } slot ? subject.Source(slot)?.Span : null;
    }
}
