using Auditor.Engine.Installation;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.Variation;

/// <summary>The ways and collections of a design walked backwards: from a subject to those that reach it.</summary>
internal sealed class BackLinks
{
    private readonly Dictionary<(SubjectShape From, string Step), List<DesignSubject>?[]> _links = [];

    public BackLinks(Design design)
    {
        foreach (var subject in design.Subjects)
        {
            foreach (var way in subject.Shape.Ways)
            {
                if (subject.Go(way.Index) is DesignSubject target)
                {
                    Enter(design, subject, way.Name, target);
                }
            }

            foreach (var list in subject.Shape.Collections)
            {
                foreach (var item in subject.Collection(list.Index))
                {
                    Enter(design, subject, list.Name, (DesignSubject)item);
                }
            }
        }
    }

    /// <summary>The subjects from which a route leads to <paramref name="subject"/>.</summary>
    public IReadOnlyList<DesignSubject> Before(Route? route, DesignSubject subject)
    {
        List<DesignSubject> at = [subject];
        for (var step = route; step is not null; step = step.Before)
        {
            if (!_links.TryGetValue((step.From, step.Way?.Name ?? step.List!.Name), out var links))
            {
                return [];
            }

            at = at is [var only] ? links[only.Index] ?? [] : [.. at.SelectMany(each => links[each.Index] ?? [])];
        }

        return at;
    }

    private void Enter(Design design, DesignSubject source, string step, DesignSubject target)
    {
        if (!_links.TryGetValue((source.Shape, step), out var links))
        {
            links = new List<DesignSubject>?[design.Subjects.Count];
            _links.Add((source.Shape, step), links);
        }

        (links[target.Index] ??= []).Add(source);
    }
}
