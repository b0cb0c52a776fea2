using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using BenchmarkDotNet.Attributes;

namespace Auditor.Benchmarks;

/// <summary>Every rule on every subject of a design of which nothing is computed as yet; no evidence is recorded.</summary>
public class AuditBenchmarks
{
    private MappingNode _root = null!;
    private Design _design = null!;

    /// <summary>Which design.</summary>
    [Params(Inputs.Bakery, Inputs.Thousand)]
    public string Design { get; set; } = "";

    /// <summary>Reads the text once.</summary>
    [GlobalSetup]
    public void Read() => _root = Inputs.Parse(Inputs.Text(Design));

    /// <summary>A fresh tree, since a subject keeps what was computed for it.</summary>
    [IterationSetup]
    public void Build() => _design = Inputs.Build(Design, _root);

    /// <summary>The decisions alone.</summary>
    [Benchmark]
    public int Judge()
    {
        var applied = 0;
        foreach (var subject in _design.Subjects)
        {
            foreach (var rule in Inputs.Rules.RulesOf(subject.Shape))
            {
                applied += Engine.Evaluation.Judge.Decide(rule, subject.Scope).Verdict is null ? 0 : 1;
            }
        }

        return applied;
    }

    /// <summary>The whole audit, with worst cases within tolerances and departures.</summary>
    [Benchmark]
    public AuditResult Audit() => Inputs.Audit(_design);
}
