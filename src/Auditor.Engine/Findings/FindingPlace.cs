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

        return OfSubject(finding.Subject);
    }

    /// <summary>Where a subject is named, or where its mapping begins.</summary>
    public static SourceSpan OfSubject(DesignSubject subject) =>
        (subject.Node.Find("id") ?? subject.Node.Find("to"))?.Span ?? subject.Node.Span.Slice(0, 1);

    private static SourceSpan? PlaceOf(DesignSubject subject, string path)
    {
        if (path.StartsWith(CablePrefix, StringComparison.Ordinal) && subject.Legs is [var leg, ..])
        {
            return PlaceOf(leg, path[CablePrefix.Length..]);
        }

        return subject.Shape.Input(path.Replace('-', '_')) is { } slot ? subject.Source(slot)?.Span : null;
    }
}
