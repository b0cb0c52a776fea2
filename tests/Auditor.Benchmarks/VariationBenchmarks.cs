using Auditor.Engine.Variation;
using Auditor.Formulas.Values;
using BenchmarkDotNet.Attributes;

namespace Auditor.Benchmarks;

/// <summary>An audit again after one input of one final circuit has changed: every rule that it may have a part in.</summary>
public class VariationBenchmarks
{
    private static readonly string[] Keys = ["DB17/4", "DB17/4/leg 1"];

    private Variant _variant = null!;
    private RuleAt[] _reached = [];
    private RuleAt[] _own = [];
    private double _value;

    /// <summary>Which input changes.</summary>
    [Params("length", "load.current")]
    public string Input { get; set; } = "";

    /// <summary>Makes the map of the design of a thousand circuits.</summary>
    [GlobalSetup]
    public void Map()
    {
        var design = Inputs.Build(Inputs.Thousand, Inputs.Parse(Inputs.Text(Inputs.Thousand)));
        var subject = design.Find(Input == "length" ? Keys[1] : Keys[0])!;
        var map = new DependencyMap(design);
        var input = new SubjectInput(subject, subject.Shape.Inputs.Single(slot => slot.Path == Input));
        _variant = new Variant(map, input);
        _reached = [.. map.ReachOf(input).Rules];
        _own = [.. _reached.Where(at => Keys.Contains(at.Subject.Key))];
        Console.WriteLine($"// {Input}: {_own.Length} rules of the circuit within reach, {_reached.Length} in all");
    }

    /// <summary>The rules of the circuit and of its cable.</summary>
    [Benchmark]
    public int Circuit() => Judge(_own);

    /// <summary>Those of boards and circuits on the way to the origin and beside it as well.</summary>
    [Benchmark]
    public int Everything() => Judge(_reached);

    private int Judge(RuleAt[] rules)
    {
        _value = _value == 20 ? 21 : 20;
        _variant.Set(0, Value.Of(_value));
        var applied = 0;
        foreach (var at in rules)
        {
            applied += _variant.Judge(at).Verdict is null ? 0 : 1;
        }

        return applied;
    }
}
