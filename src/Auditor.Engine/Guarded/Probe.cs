using Auditor.Engine.Findings;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Guarded;

/// <summary>A design whose toleranced inputs can be moved about within their tolerances.</summary>
internal sealed class Probe
{
    private readonly Variant _variant;
    private readonly double[] _point;

    public Probe(DependencyMap map, IReadOnlyList<TolerancedInput> inputs)
    {
        Inputs = inputs;
        _variant = new Variant(map, [.. inputs.Select(input => input.Input)]);
        _point = [.. inputs.Select(input => input.Stated)];
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
