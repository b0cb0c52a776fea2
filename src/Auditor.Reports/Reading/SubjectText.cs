using Auditor.Documents;
using Auditor.Engine.Installation;

namespace Auditor.Reports.Reading;

/// <summary>How reports name subjects.</summary>
internal static class SubjectText
{
    /// <summary>The name that the design gives a subject; null where it gives none.</summary>
    public static string? OwnName(DesignSubject subject) => subject.Node.Text("name");

    /// <summary>The name to show beside a key: its own, else that of what it is a part of; the installation is called what it is.</summary>
    public static string NameToShow(DesignSubject subject) => subject.Parent is null ? subject.Shape.Name : OwnName(subject) ?? NameOfWhole(subject);

    /// <summary>Where a subject is named, or where its mapping begins.</summary>
    public static SourceSpan Place(DesignSubject subject) =>
        (subject.Node.Find("id") ?? subject.Node.Find("to"))?.Span ?? subject.Node.Span.Slice(0, 1);

    private static string NameOfWhole(DesignSubject subject) => subject.Shape.Name == "leg" ? OwnName(subject.Parent!) ?? "" : "";
}
