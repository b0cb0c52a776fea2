using System.CommandLine;
using Auditor.Documents;
using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Formulas.Subjects;

namespace Auditor.Cli.Commands;

/// <summary><c>evidence</c>: how a finding or a quantity came about, down to design lines and table cells.</summary>
internal static class EvidenceCommand
{
    public static Command Make(Terminal terminal)
    {
        var design = new Argument<string>("DESIGN") { Description = "Design file." };
        var key = new Argument<string[]>("KEY")
        {
            Description = "Finding (`rule:subject`), or subject and symbol (`MSB/3 Zs`; `- U0` for the installation).",
            Arity = ArgumentArity.OneOrMore,
        };
        var rules = RuleSetOption.Make();
        var asOf = AsOfOption.Make();
        var command = new ExampleCommand(
            "evidence", "Show the derivation of a finding or a quantity, down to lines of the design and cells of tables.",
            "auditor evidence site.design.yaml disconnection-tn:DB/3",
            "auditor evidence site.design.yaml DB/3 Zs",
            "auditor evidence site.design.yaml - U0") { design, key, rules, asOf };
        command.SetAction(parsed => Run(
            terminal, parsed.GetValue(design)!, string.Join(' ', parsed.GetValue(key)!), parsed.GetValue(rules), parsed.GetValue(asOf)));
        return command;
    }

    private static int Run(Terminal terminal, string path, string key, string? ruleSet, string? asOfText)
    {
        var problems = new Problems();
        var asOf = AsOfOption.Read(asOfText, problems);
        var result = problems.HasErrors ? null : new Auditing(ruleSet, asOf, problems).Run(path);
        if (result is null)
        {
            terminal.Tell(problems);
            return ExitCode.Problems;
        }

        if (Find(result, key) is not { } derivations)
        {
            problems.Add(CommandMessages.UnknownKey(key, NearestWord.Find(key, result.Findings.Select(finding => finding.Key))));
            terminal.Tell(problems);
            return ExitCode.Problems;
        }

        if (result.Find(key) is { } finding)
        {
            terminal.Output.WriteLine($"{finding.Key}: {finding.VerdictText}");
            terminal.Output.WriteLine($"  {finding.Message}");
            terminal.Output.WriteLine();
        }

        DerivationText.Write(terminal.Output, derivations);
        return ExitCode.Clean;
    }

    private static IReadOnlyList<Derivation>? Find(AuditResult result, string key)
    {
        var builder = new EvidenceBuilder(result.Rules);
        if (result.Find(key) is { } finding)
        {
            return builder.Of(finding);
        }

        var space = key.LastIndexOf(' ');
        var subject = space > 0 ? result.Design.Find(key[..space]) : null;
        QuantitySlot? slot = subject?.Shape.Quantity(key[(space + 1)..]);
        return slot is null ? null : [builder.Of(subject!, slot)];
    }
}
