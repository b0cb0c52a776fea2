using Auditor.Cli.Commands;
using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Serilog;

namespace Auditor.Cli;

/// <summary>Reads designs and audits them; a rule set that several designs share is read once.</summary>
/// <param name="ruleSet">Rule set named by the caller; null to go by each design.</param>
/// <param name="asOf">The day on which departures are judged.</param>
/// <param name="problems">Receives everything that stands in the way.</param>
internal sealed class Auditing(string? ruleSet, DateOnly asOf, Problems problems)
{
    private readonly Dictionary<string, RuleSet?> _sets = [];

    /// <summary>Audits one design; null, with problems added, when it cannot be done.</summary>
    public AuditResult? Run(string path)
    {
        var file = DesignFile.Read(Path.GetFullPath(path), path, problems);
        Log.Information("Read {Design}", path);
        if (file is null || RulesFor(file) is not { } rules)
        {
            return null;
        }

        var own = new Problems();
        rules.Schema.Validation.Validate(file.Root, own);
        var design = DesignBuilder.Build(file, new Evaluator(rules), own);
        var result = design is null ? null : Audit.Run(design, asOf, own);
        foreach (var problem in own.All)
        {
            problems.Add(problem);
        }

        Log.Information("Evaluated {Design}: {Findings} findings", path, result?.Findings.Count ?? 0);
        return own.HasErrors ? null : result;
    }

    private RuleSet? RulesFor(DesignFile file)
    {
        if (ruleSet is not null)
        {
            return Load(ruleSet, Environment.CurrentDirectory, null);
        }

        if (file.RuleSet is not { } named)
        {
            return Load(Shipped.DefaultSet, Environment.CurrentDirectory, null);
        }

        var folder = Path.GetDirectoryName(Path.GetFullPath(file.Path))!;
        if (named.Text.Contains('/') && !IsReachable(Path.GetFullPath(Path.Combine(folder, named.Text)), folder))
        {
            problems.Add(CommandMessages.UnreachableRuleSet(named.Span, named.Text));
            return null;
        }

        return Load(named.Text, folder, named.Span);
    }

    private RuleSet? Load(string name, string folder, SourceSpan? asked)
    {
        var key = name.Contains('/') ? Path.GetFullPath(Path.Combine(folder, name)) : name;
        if (!_sets.TryGetValue(key, out var rules))
        {
            rules = RuleSetLoader.Load(Shipped.Rules, name, folder, asked, problems);
            _sets.Add(key, rules);
            Log.Information("Read rule set {RuleSet}", name);
        }

        return rules;
    }

    private static bool IsReachable(string path, string folder) =>
        IsBelow(path, folder) || IsBelow(path, Environment.CurrentDirectory);

    private static bool IsBelow(string path, string folder) => path.StartsWith(folder.TrimEnd('/') + "/", StringComparison.Ordinal);
}
