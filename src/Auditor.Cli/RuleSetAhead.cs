using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli;

/// <summary>
/// A shipped rule set that is read while the first design still is. Which one it will ask for is only guessed: a wrong guess costs a
/// little time, and nothing else comes of it.
/// </summary>
internal sealed class RuleSetAhead
{
    private const string Key = "rule-set:";

    private readonly string _name;
    private readonly Problems _problems = new();
    private readonly Task<RuleSet?> _rules;

    private RuleSetAhead(string name)
    {
        _name = name;
        _rules = Task.Run(() => RuleSetLoader.Load(Shipped.Rules, name, Environment.CurrentDirectory, null, _problems));
    }

    /// <summary>Begins to read a rule set; null where the design names a file of its own, which has to be checked first.</summary>
    /// <param name="named">The set that the caller names; null to go by the design.</param>
    /// <param name="design">Text of the design.</param>
    public static RuleSetAhead? Of(string? named, SourceText design)
    {
        var name = named ?? Guess(design.Text);
        return named is null && Designs.IsPath(name) ? null : new(name);
    }

    /// <summary>The rule set, if it is the one of that name and without faults; null otherwise.</summary>
    /// <param name="name">Name of the set that is wanted.</param>
    /// <param name="problems">Receives what it warns of.</param>
    public RuleSet? Take(string name, Problems problems)
    {
        if (name != _name || _rules.GetAwaiter().GetResult() is not { } rules)
        {
            return null;
        }

        foreach (var problem in _problems.All)
        {
            problems.Add(problem);
        }

        return rules;
    }

    /// <summary>What a design seems to ask for.</summary>
    private static string Guess(string design)
    {
        foreach (var line in design.AsSpan().EnumerateLines())
        {
            if (line.StartsWith(Key, StringComparison.Ordinal))
            {
                return line[Key.Length..].Trim().ToString();
            }
        }

        return Shipped.DefaultSet;
    }
}
