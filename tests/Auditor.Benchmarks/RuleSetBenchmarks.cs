using Auditor.Engine.RuleSets;
using BenchmarkDotNet.Attributes;

namespace Auditor.Benchmarks;

/// <summary>Reading a rule set, and binding its sheets and rules.</summary>
public class RuleSetBenchmarks
{
    private string _folder = "";
    private RuleHome _prepared = null!;

    /// <summary>Copies the rule files and prepares them, as the build of the program does.</summary>
    [GlobalSetup]
    public void Prepare()
    {
        _folder = Directory.CreateTempSubdirectory("rules-").FullName;
        foreach (var file in Directory.EnumerateFiles(Inputs.Home.Folder, "*", SearchOption.AllDirectories))
        {
            var copy = Path.Combine(_folder, Path.GetRelativePath(Inputs.Home.Folder, file));
            Directory.CreateDirectory(Path.GetDirectoryName(copy)!);
            File.Copy(file, copy);
        }

        _prepared = new RuleHome(_folder, "rules");
        PreparedRules.Write(_prepared);
    }

    /// <summary>Takes the copies away.</summary>
    [GlobalCleanup]
    public void Remove() => Directory.Delete(_folder, recursive: true);

    /// <summary>Every file as YAML.</summary>
    [Benchmark]
    public RuleSet BindFromYaml() => Inputs.Load(Inputs.Home);

    /// <summary>As the program does after a build.</summary>
    [Benchmark]
    public RuleSet BindPrepared() => Inputs.Load(_prepared);
}
