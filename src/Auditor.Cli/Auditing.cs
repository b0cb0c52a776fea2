using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Serilog;

namespace Auditor.Cli;

/// <summary>Reads designs and audits them.</summary>
/// <param name="ruleSet">Rule set named by the caller; null to go by each design.</param>
/// <param name="asOf">The day on which departures are judged.</param>
/// <param name="problems">Receives everything that stands in the way.</param>
/// <param name="acceptance">What to do with tolerances; null to go by each design.</param>
internal sealed class Auditing(string? ruleSet, DateOnly asOf, Problems problems, Acceptance? acceptance = null)
{
    private readonly Designs _designs = new(ruleSet, problems);

    /// <summary>Audits one design; null, with problems added, when it cannot be done.</summary>
    public AuditResult? Run(string path) => Run(Path.GetFullPath(path), path, Environment.CurrentDirectory);

    /// <summary>Audits one design that lies elsewhere than it is shown; null, with problems added, when it cannot be done.</summary>
    /// <param name="fullPath">Where it lies.</param>
    /// <param name="path">The path to show.</param>
    /// <param name="within">Full path of the folder that its rule set may lie in, besides its own folder.</param>
    public AuditResult? Run(string fullPath, string path, string within)
    {
        if (_designs.Read(fullPath, path, within) is not { } design)
        {
            return null;
        }

        var own = new Problems();
        var result = Audit.Run(design, asOf, own, acceptance);
        foreach (var problem in own.All)
        {
            problems.Add(problem);
        }

        Log.Information("Evaluated {Design}: {Findings} findings", path, result.Findings.Count);
        return own.HasErrors ? null : result;
    }
}
