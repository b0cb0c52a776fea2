using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Reports.Pictures.Drawing;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Pictures;

/// <summary>An audit as pictures look at it.</summary>
internal sealed class Scene
{
    private readonly ILookup<DesignSubject, Finding> _findings;

    public Scene(AuditResult result)
    {
        Result = result;
        _findings = result.Findings.ToLookup(finding => finding.Subject);
        var shapes = result.Rules.Schema.Shapes;
        Boards = [.. result.Design.Subjects.Where(subject => subject.Shape == shapes.Board)];
        Circuits = [.. result.Design.Subjects.Where(subject => subject.Shape == shapes.Circuit)];
        Bondings = [.. result.Design.Subjects.Where(subject => subject.Shape == shapes.Bonding)];
        CircuitsOf = Circuits.ToLookup(circuit => circuit.Parent!);
    }

    /// <summary>The audit.</summary>
    public AuditResult Result { get; }

    /// <summary>The installation.</summary>
    public DesignSubject Installation => Result.Design.Installation;

    /// <summary>The boards, in the order of the design.</summary>
    public IReadOnlyList<DesignSubject> Boards { get; }

    /// <summary>The circuits, in the order of the design.</summary>
    public IReadOnlyList<DesignSubject> Circuits { get; }

    /// <summary>The bonding conductors, in the order of the design.</summary>
    public IReadOnlyList<DesignSubject> Bondings { get; }

    /// <summary>The circuits of each board.</summary>
    public ILookup<DesignSubject, DesignSubject> CircuitsOf { get; }

    /// <summary>The marks that the findings may need, the gravest first; what only guarded acceptance finds has none where nothing was found so.</summary>
    public IEnumerable<string> Marks => Badges.All.Select(badge => badge.Mark)
        .Where(mark => mark != Badges.Unproven || Result.Findings.Any(finding => finding.Verdict == Verdict.Unproven));

    /// <summary>The findings of a subject; those of a circuit's legs count as its own.</summary>
    public IReadOnlyList<Finding> FindingsOf(DesignSubject subject) => [.. subject.Legs.Prepend(subject).SelectMany(part => _findings[part])];

    /// <summary>How a subject stands.</summary>
    public Standing StandingOf(DesignSubject subject) => Standing.Of(FindingsOf(subject));

    /// <summary>A subject as people name it.</summary>
    public static string Label(DesignSubject subject) => SubjectText.Label(subject);

    /// <summary>The name that the design gives a subject; empty where it gives none.</summary>
    public static string Name(DesignSubject subject) => SubjectText.OwnName(subject) ?? "";
}
