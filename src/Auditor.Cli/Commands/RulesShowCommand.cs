using System.CommandLine;
using Auditor.Documents;
using Auditor.Engine.HouseSets;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Commands;

/// <summary><c>rules show</c>: one rule in full.</summary>
internal static class RulesShowCommand
{
    public static Command Make(Terminal terminal)
    {
        var rules = RuleSetOption.Make();
        var id = new Argument<string>("RULE") { Description = "Rule id, present or former." };
        var command = new ExampleCommand(
            "show", "Show one rule: what it compares, its clause, why, and its cases.",
            "auditor rules show disconnection-tn") { id, rules };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(id)!, parsed.GetValue(rules)));
        return command;
    }

    private static int Run(Terminal terminal, string id, string? name)
    {
        var problems = new Problems();
        var set = RuleSetOption.Load(name, problems);
        var rule = set?.Rule(id);
        if (set is not null && rule is null)
        {
            problems.Add(CommandMessages.UnknownRule(id, NearestWord.Find(id, set.AllRules.Select(known => known.Id))));
        }

        if (terminal.Tell(problems) || rule is null)
        {
            return ExitCode.Problems;
        }

        Write(terminal.Output, rule, set!);
        return ExitCode.Clean;
    }

    private static void Write(TextWriter output, Rule rule, RuleSet set)
    {
        output.WriteLine($"{rule.Id}: {rule.Title}");
        output.WriteLine($"  {RulesListCommand.ProvisionWord(rule)} of every {rule.Shape.Name}; clause type: {rule.Clause.Type}");
        string[] authority = [string.Join(", ", rule.Clause.References), rule.Clause.Note];
        output.WriteLine($"  {string.Join("; ", authority.Where(text => text.Length > 0))}");
        if (rule.When is { } when)
        {
            output.WriteLine($"  applies when  {OneLine(when.Text)}");
        }

        output.WriteLine($"  {(rule.Check.How == CheckKind.Require ? "requires     " : "compares     ")} {OneLine(rule.Check.Value.Text)}");
        if (rule.Check.Limits.Count > 0)
        {
            output.WriteLine($"  {LimitWord(rule.Check.How),-13} {string.Join(" and ", rule.Check.Limits.Select(limit => OneLine(limit.Text)))}");
        }

        output.WriteLine($"  why           {OneLine(rule.Why)}");
        output.WriteLine($"  put right by  {string.Join(", ", rule.PutRightBy)}");
        output.WriteLine($"  departures    {(rule.AllowsDepartures ? "allowed" : "never")}");
        output.WriteLine($"  decides       {string.Join(", ", rule.Covers)}");
        output.WriteLine($"  cases         {rule.Node.Items("cases").Count}");
        output.WriteLine($"  file          {rule.Path}");
        foreach (var change in set.Changes.Where(change => change.Name == rule.Id && IsOfRule(change.What)))
        {
            output.WriteLine($"  changed       {change.What.Word()} from {change.Before} to {change.After} by {change.Set}, {change.Span}");
        }
    }

    private static bool IsOfRule(HouseChangeKind what) => what is HouseChangeKind.Rule or HouseChangeKind.Provision or HouseChangeKind.Departures;

    private static string LimitWord(CheckKind how) => how switch
    {
        CheckKind.AtMost => "at most",
        CheckKind.AtLeast => "at least",
        CheckKind.Within => "from, to",
        CheckKind.Equal => "equal to",
        _ => "one of",
    };

    private static string OneLine(string text) => string.Join(' ', text.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));
}
