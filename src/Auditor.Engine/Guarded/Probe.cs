using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Guarded;

/// <summary>A design whose toleranced inputs can be moved about within their tolerances.</summary>
internal sealed class Probe
{
    private readonly Variant _variant;
    private readonly double[] _point;

    /// <summary>Makes a probe at the stated values.</summary>
    /// <param name="map">The map of the design.</param>
    /// <param name="inputs">The toleranced inputs, with the values that they have after the changes.</param>
    /// <param name="changes">What is otherwise than in the design; empty for nothing.</param>
    public Probe(DependencyMap map, IReadOnlyList<TolerancedInput> inputs, IReadOnlyList<ChangedInput> changes)
    {
        Inputs = inputs;
        var moved = inputs.Select(input => input.Input).ToArray();
        _variant = new Variant(map, [.. moved, .. changes.Select(change => change.Input).Except(moved)]);
        _point = [.. inputs.Select(input => input.Stated)];
        foreach (var change in changes)
        {
            _variant.Set(_variant.Inputs.ToList().IndexOf(change.Input), change.After);
        }
    }

    public IReadOnlyList<TolerancedInput> Inputs { get; }

    /// <summary>The values as the design has them.</summary>
    public double[] Stated() => [.. Inputs.Select(input => input.Stated)];

    /// <summary>Moves one input.</summary>
    public void Move(int input, double number)
    {
        if (_point[input] != number)
        {
            _point[input] = number;
            _variant.Set(input, Inputs[input].At(number));
        }
    }

    /// <summary>Moves all inputs.</summary>
    public void Move(double[] point)
    {
        for (var i = 0; i < point.Length; i++)
        {
            Move(i, point[i]);
        }
    }

    public Judgement Judge(RuleAt at) => _variant.Judge(at);

    /// <summary>Judges a rule at a point, and keeps only how well it comes out.</summary>
    public Score ScoreAt(RuleAt at, double[] point)
    {
        Move(point);
        return Score.Of(Judge(at));
    }
}
