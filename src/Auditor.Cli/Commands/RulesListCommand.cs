using System.CommandLine;
using Auditor.Documents;
using Auditor.Engine.Registers;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Commands;

/// <summary><c>rules list</c>: the rules and parameters in force, and the file each comes from.</summary>
internal static class RulesListCommand
{
    public static Command Make(Terminal terminal)
    {
        var rules = RuleSetOption.Make();
        var coverage = new Option<bool>("--coverage") { Description = "Show instead how many rows of the register the rules decide, part by part." };
        var command = new ExampleCommand(
            "list", "List the rules and parameters in force, with the file each comes from.",
            "auditor rules list",
            "auditor rules list --coverage") { rules, coverage };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(rules), parsed.GetValue(coverage)));
        return command;
    }

    private static int Run(Terminal terminal, string? name, bool coverage)
    {
        var problems = new Problems();
        var set = RuleSetOption.Load(name, problems);
        var register = coverage ? Register.Load(Shipped.Rules, problems) : null;
        if (terminal.Tell(problems) || set is null)
        {
            return ExitCode.Problems;
        }

        if (register is null)
        {
            WriteSet(terminal.Output, set);
        }
        else
        {
            WriteCoverage(terminal.Output, set, register);
        }

        return ExitCode.Clean;
    }

    private static void WriteSet(TextWriter output, RuleSet set)
    {
        output.WriteLine($"{set.Title.Id}: {set.Title.Text}");
        output.WriteLine($"edition: {set.Title.Edition}");
        output.WriteLine($"built from: {string.Join(" → ", set.Title.Chain)}");
        output.WriteLine();
        foreach (var rule in set.Rules)
        {
            output.WriteLine($"{rule.Id,-40} {rule.Shape.Name,-12} {ProvisionWord(rule),-14} {rule.Clause.Type,-26} {rule.Path}");
        }

        output.WriteLine();
        foreach (var parameter in set.Parameters)
        {
            output.WriteLine($"param {parameter.Id,-40} {parameter.Text,-12} {parameter.Span}");
        }
    }

    /// <summary>The provision in a word.</summary>
    internal static string ProvisionWord(Rule rule) => rule.Provision == Provision.Requirement ? "requirement" : "recommendation";

    private static void WriteCoverage(TextWriter output, RuleSet set, Register register)
    {
        var covered = Register.Covered(set);
        var total = 0;
        var decidable = 0;
        foreach (var part in register.Rows.GroupBy(row => row.Part))
        {
            var rows = part.Where(row => row.IsDecidable).ToArray();
            var count = rows.Count(row => covered.Contains(row.Id));
            total += count;
            decidable += rows.Length;
            output.WriteLine($"{part.Key,-32} {count,4} of {rows.Length,4}");
        }

        output.WriteLine($"{"all parts",-32} {total,4} of {decidable,4} rows that data can decide; {register.Rows.Count - decidable} more need a person's judgement");
    }
}
