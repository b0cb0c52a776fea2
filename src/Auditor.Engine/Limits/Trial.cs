using Auditor.Engine.Adjustments;
using Auditor.Engine.Guarded;
using Auditor.Engine.RuleSets;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Limits;

/// <summary>Tries values of one adjustable input. A place is the number of a quantity, or the number of a step of a ladder.</summary>
internal sealed class Trial
{
    private readonly AdjustedDesign _design;
    private readonly IReadOnlyList<Value>? _steps;
    private readonly QuantityDefinition? _uncertainty;
    private double _position = double.NaN;

    /// <summary>Makes a trial.</summary>
    /// <param name="map">The map of the design.</param>
    /// <param name="adjustable">The input.</param>
    /// <param name="uncertainty">The uncertainty to use up against the value tried; null for none.</param>
    public Trial(DependencyMap map, Adjustable adjustable, QuantityDefinition? uncertainty = null)
    {
        _design = new AdjustedDesign(map, adjustable);
        _steps = _design.Steps();
        _uncertainty = uncertainty;
        Stated = StatedOf(adjustable);
        Expected = adjustable.Adjustment.Expect?.Evaluate(adjustable.Holders[0].Scope);
        Grid = adjustable.Adjustment.Ladder is RangeLadder range
            ? TrialGrid.Of(range, Stated, Expected is { Kind: ValueKind.Quantity } expected ? expected.Number : null)
            : [.. Enumerable.Range(0, _steps!.Count).Select(step => (double)step)];
    }

    public IReadOnlyList<RuleAt> Rules => _design.Rules;

    /// <summary>The places to try first, ascending.</summary>
    public IReadOnlyList<double> Grid { get; }

    /// <summary>Whether there is nothing between two places.</summary>
    public bool HasSteps => _steps is not null;

    /// <summary>Place of the stated value; null where nothing is stated.</summary>
    public double? Stated { get; }

    /// <summary>What a reading should show if the work is as designed; null where nothing is said.</summary>
    public Value? Expected { get; }

    /// <summary>How many rules have been judged.</summary>
    public long Judged { get; private set; }

    public Value ValueAt(double position) => _steps is null ? Value.Of(position) : _steps[(int)position];

    /// <summary>How well a rule comes out at a place; with an uncertainty, at the worst of it and the two ends.</summary>
    public Score ScoreAt(RuleAt at, double position)
    {
        var score = Judge(at, position);
        if (_uncertainty is null || UncertaintyAt(position) is not { } off)
        {
            return score;
        }

        var (below, above) = (Judge(at, position - off), Judge(at, position + off));
        var worse = below < above ? below : above;
        return worse < score ? worse : score;
    }

    private double? UncertaintyAt(double position)
    {
        MoveTo(position);
        var value = _design.Quantity(_uncertainty!, _design.Places[0].Holders[0]);
        return value.IsMissing ? null : Math.Abs(value.Number);
    }

    private Score Judge(RuleAt at, double position)
    {
        MoveTo(position);
        Judged++;
        return Score.Of(_design.Judge(at));
    }

    private void MoveTo(double position)
    {
        if (_position != position)
        {
            _position = position;
            _design.Set(ValueAt(position));
        }
    }

    private double? StatedOf(Adjustable adjustable)
    {
        var stated = adjustable.Stated;
        if (stated.IsMissing)
        {
            return null;
        }

        if (_steps is null)
        {
            return stated.Number;
        }

        var step = _steps.ToList().FindIndex(each => Adjustable.Same(each, stated));
        return step < 0 ? null : step;
    }
}
