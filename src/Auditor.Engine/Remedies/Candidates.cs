using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>Finds the adjustments that have a part in a finding.</summary>
internal static class Candidates
{
    private const string CablePrefix = "cable.";

    /// <summary>
    /// The adjustments at the subject of the finding and at everything between it and the origin, cable runs included, and at bonding
    /// conductors for a finding at the origin: those that the rule
    /// reads, however indirectly, and those beside them that may make up for what another one breaks.
    /// </summary>
    public static (IReadOnlyList<Candidate> Reading, IReadOnlyList<Candidate> Beside) Of(DependencyMap map, Finding finding)
    {
        var at = new RuleAt(finding.Rule, finding.Subject);
        var all = Adjustables.Remedies(map.Design, Chain(map.Design, finding.Subject))
            .Select(place => new Candidate(map, place, IsNamed(finding, place)))
            .Where(candidate => candidate.Steps.Count > 0 || candidate.Ends.Count > 0)
            .ToLookup(candidate => candidate.Place.Inputs.Any(input => map.ReachOf(input).Holds(at)));
        return ([.. all[true]], [.. all[false]]);
    }

    private static IEnumerable<DesignSubject> Chain(Design design, DesignSubject subject)
    {
        var chain = new HashSet<DesignSubject>();
        for (var each = subject; each is not null; each = each.Parent)
        {
            chain.Add(each);
            chain.UnionWith(each.Legs);
        }

        var isOrigin = subject.Parent is null;
        return design.Subjects.Where(each => chain.Contains(each) || (isOrigin && each.Shape == design.Evaluator.Rules.Schema.Shapes.Bonding));
    }

    private static bool IsNamed(Finding finding, Adjustable place) =>
        (place.Subject == finding.Subject || place.Holders.Contains(finding.Subject)) && place.Inputs.Any(input => finding.Rule.PutRightBy.Any(path => Names(path, Written(input))));

    private static string Written(SubjectInput input) => input.Subject.Shape.Name == "leg" ? CablePrefix + input.Slot.Path : input.Slot.Path;

    /// <summary>A rule of a leg names inputs without the key that a circuit puts before them.</summary>
    private static bool Names(string path, string input) =>
        input == path || input == CablePrefix + path || input.StartsWith(path + ".", StringComparison.Ordinal);
}
