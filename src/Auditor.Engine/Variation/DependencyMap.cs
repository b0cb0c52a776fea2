using System.Collections.Concurrent;
using Auditor.Engine.Installation;
using Auditor.Formulas.Types;

namespace Auditor.Engine.Variation;

/// <summary>
/// What depends on what in a design. Any number of threads may make variants of it side by side.
/// </summary>
public sealed class DependencyMap
{
    private readonly SlotReaders _readers;
    private readonly BackLinks _links;
    private readonly ConcurrentDictionary<SubjectInput, Reach> _reaches = [];

    /// <summary>Makes the map of a design.</summary>
    public DependencyMap(Design design)
    {
        Design = design;
        _readers = new SlotReaders(design.Evaluator.Rules);
        _links = new BackLinks(design);
    }

    /// <summary>The design.</summary>
    public Design Design { get; }

    /// <summary>What an input has a part in.</summary>
    public Reach ReachOf(SubjectInput input) => _reaches.GetOrAdd(input, key => new ReachSearch(_readers, _links).Run(WithGroups(key)));

    /// <summary>A group of which nothing is given is given as soon as one of its inputs is.</summary>
    private static List<SubjectInput> WithGroups(SubjectInput input)
    {
        var inputs = new List<SubjectInput> { input };
        var name = input.Slot.Name;
        for (var dot = name.LastIndexOf('.'); dot > 0; dot = name.LastIndexOf('.', dot - 1))
        {
            var group = input.Subject.Shape.Input(name[..dot]);
            if (group is { Type.Kind: FormulaKind.Group } && input.Subject.Input(group.Index).IsMissing)
            {
                inputs.Add(new SubjectInput(input.Subject, group));
            }
        }

        return inputs;
    }
}
