using Auditor.Documents;
using Auditor.Engine.Installation;

namespace Auditor.Reports.Reading;

/// <summary>How reports name subjects.</summary>
internal static class SubjectText
{
    /// <summary>The name that the design gives a subject; null where it gives none.</summary>
    public static string? OwnName(DesignSubject subject) => subject.Node.Text("name");

    /// <summary>Key and name; a part without a name goes by that of its whole, and the installation is called what it is.</summary>
    public static string Label(DesignSubject subject)
    {
        if (subject.Parent is null)
        {
            return "The installation";
        }

        var name = OwnName(subject) ?? (subject.Shape.Name == "leg" ? OwnName(subject.Parent) : null);
        return name is null ? subject.Key : $"{subject.Key} {name}";
    }

    /// <summary>The board that a subject belongs to, itself included; null for the installation and its bonding conductors.</summary>
    public static DesignSubject? BoardOf(DesignSubject subject) =>
        subject.Shape.Name == "board" ? subject : subject.Parent is { } parent ? BoardOf(parent) : null;
}
