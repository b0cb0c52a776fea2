using Auditor.Cli.Commands;
using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;
using Serilog;

namespace Auditor.Cli;

/// <summary>Reads designs with the rule set that each asks for; a rule set that several share is read once.</summary>
/// <param name="ruleSet">Rule set named by the caller; null to go by each design.</param>
/// <param name="problems">Receives everything that stands in the way.</param>
internal sealed class Designs(string? ruleSet, Problems problems)
{
    private readonly Dictionary<string, RuleSet?> _sets = [];
    private RuleSetAhead? _ahead;

    /// <summary>Reads a design; null, with problems added, when that cannot be done.</summary>
    public Design? Read(string path) => Read(Path.GetFullPath(path), path, Environment.CurrentDirectory);

    /// <summary>Reads a design that lies elsewhere than it is shown; null, with problems added, when that cannot be done.</summary>
    /// <param name="fullPath">Where it lies.</param>
    /// <param name="path">The path to show.</param>
    /// <param name="within">Full path of the folder that its rule set may lie in, besides its own folder.</param>
    public Design? Read(string fullPath, string path, string within)
    {
        var file = DesignFile.Read(fullPath, path, problems, onTop: text => _ahead ??= RuleSetAhead.Of(ruleSet, text));
        Log.Information("Read {Design}", path);
        if (file is null || RulesFor(file, Path.GetDirectoryName(fullPath)!, within) is not { } rules)
        {
            return null;
        }

        var own = new Problems();
        var design = Build(file, rules, own);
        foreach (var problem in own.All)
        {
            problems.Add(problem);
        }

        return design;
    }

    /// <summary>How to read a design of the current folder again with some of its files changed, by the same rule set. Safe from any thread.</summary>
    public static Reread RereadOf(Design design) => texts =>
    {
        var own = new Problems();
        var file = DesignFile.Read(Path.GetFullPath(design.File.Path), design.File.Path, own, texts);
        return file is null || own.HasErrors ? null : Build(file, design.Evaluator.Rules, own);
    };

    private static Design? Build(DesignFile file, RuleSet rules, Problems own)
    {
        rules.Schema.Validation.Validate(file.Root, own);
        var design = DesignBuilder.Build(file, new Evaluator(rules), own);
        return own.HasErrors ? null : design;
    }

    private RuleSet? RulesFor(DesignFile file, string folder, string within)
    {
        if (ruleSet is not null)
        {
            return Load(ruleSet, Environment.CurrentDirectory, null);
        }

        if (file.RuleSet is not { } named)
        {
            return Load(Shipped.DefaultSet, Environment.CurrentDirectory, null);
        }

        var asked = Path.GetFullPath(Path.Combine(folder, named.Text));
        if (IsPath(named.Text) && !Enclosure.Holds(folder, asked) && !Enclosure.Holds(within, asked))
        {
            problems.Add(CommandMessages.UnreachableRuleSet(named.Span, named.Text));
            return null;
        }

        return Load(named.Text, folder, named.Span);
    }

    private RuleSet? Load(string name, string folder, SourceSpan? asked)
    {
        var key = IsPath(name) ? Path.GetFullPath(Path.Combine(folder, name)) : name;
        if (!_sets.TryGetValue(key, out var rules))
        {
            var own = new Problems();
            rules = _ahead?.Take(name, own) ?? RuleSetLoader.Load(Shipped.Rules, name, folder, asked, own);
            foreach (var problem in own.All)
            {
                problems.Add(problem);
            }

            _sets.Add(key, rules);
            Log.Information("Read rule set {RuleSet}", name);
        }

        return rules;
    }

    /// <summary>Whether a rule set is named by the path of its file, and not as one of those shipped.</summary>
    public static bool IsPath(string name) => name.Contains('/') || name.EndsWith(".yaml", StringComparison.Ordinal);
}
