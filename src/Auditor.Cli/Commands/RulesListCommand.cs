using System.CommandLine;
using Auditor.Cli.Summaries;
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
            "list", "List the rules, parameters, tables, curves, quantities and templates in force, with the file each comes from, and what house sets change.",
            "auditor rules list",
            "auditor rules list --rules house/firm.set.yaml",
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
            RuleSetText.Write(terminal.Output, set);
        }
        else
        {
            WriteCoverage(terminal.Output, set, register);
        }

        return ExitCode.Clean;
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
