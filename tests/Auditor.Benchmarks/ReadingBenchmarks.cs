using Auditor.Documents;
using Auditor.Engine.Installation;
using BenchmarkDotNet.Attributes;

namespace Auditor.Benchmarks;

/// <summary>From the text of a design to its tree of subjects.</summary>
public class ReadingBenchmarks
{
    private SourceText _text = null!;
    private MappingNode _root = null!;

    /// <summary>Which design.</summary>
    [Params(Inputs.Bakery, Inputs.Thousand)]
    public string Design { get; set; } = "";

    /// <summary>Reads the text once.</summary>
    [GlobalSetup]
    public void Read()
    {
        _text = Inputs.Text(Design);
        _root = Inputs.Parse(_text);
    }

    /// <summary>YAML to nodes with their places.</summary>
    [Benchmark]
    public object Parse() => Inputs.Parse(_text);

    /// <summary>Nodes against the design schema.</summary>
    [Benchmark]
    public object Validate() => Inputs.Checked(problems =>
    {
        Inputs.Rules.Schema.Validation.Validate(_root, problems);
        return problems;
    });

    /// <summary>Nodes to subjects.</summary>
    [Benchmark]
    public Design Build() => Inputs.Build(Design, _root);
}
