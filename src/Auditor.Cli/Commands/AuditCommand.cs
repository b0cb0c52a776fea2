using System.CommandLine;
using Auditor.Cli.Revisions;
using Auditor.Cli.Summaries;
using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Registers;
using Auditor.Reports.Comparisons;
using Auditor.Reports.Json;
using Auditor.Reports.Model;
using Spectre.Console;

namespace Auditor.Cli.Commands;

/// <summary><c>audit</c>: audits designs, tells what needs action, and writes reports.</summary>
internal static class AuditCommand
{
    public static Command Make(Terminal terminal)
    {
        var designs = new Argument<string[]>("DESIGN") { Description = "Design files; for a folder, every *.design.yaml below it.", Arity = ArgumentArity.OneOrMore };
        var rules = RuleSetOption.Make();
        var write = new Option<string[]>("--write") { Description = "Write a report (.html, .md, .txt, .json, .sarif, .xml for JUnit, .csv); repeatable. {name} stands for the design's path without .design.yaml.", HelpName = "FILE" };
        var template = new Option<string?>("--template") { Description = "Template to use for .html, .md and .txt instead of the shipped one, or of that of a house set.", HelpName = "FILE" };
        var evidence = new Option<bool>("--evidence") { Description = "Put every input and every quantity with its derivation into the .json." };
        var asOf = AsOfOption.Make();
        var failOn = FailOnOption.Make();
        var against = new Option<string?>("--against")
        {
            Description = "Earlier findings (.json), design, or REVISION:path: only what is new or worse since then counts for the exit code. {name} as with --write.",
            HelpName = "FINDINGS",
        };
        var acceptance = new AcceptanceOptions();
        var quiet = new Option<bool>("--quiet", "-q") { Description = "Print no summary." };
        var command = new ExampleCommand(
            "audit", "Audit design files against a rule set.",
            "auditor audit examples/bakery/bakery.design.yaml",
            "auditor audit designs --fail-on nonconforming",
            "auditor audit site.design.yaml --write site.html --write site.json",
            "auditor audit designs --write '{name}.report.md' --as-of 2026-12-01",
            "auditor audit designs --against '{name}.findings.json'",
            "auditor audit site.design.yaml --decision guarded --sample 2000") { designs, rules, write, template, evidence, asOf, failOn, against, quiet };
        acceptance.AddTo(command);
        command.SetAction(parsed => new AuditRun(
            terminal, problems => acceptance.Read(parsed, problems), parsed.GetValue(rules), parsed.GetValue(write) ?? [], parsed.GetValue(template),
            new FindingsOptions(parsed.GetValue(evidence)), parsed.GetValue(failOn), parsed.GetValue(against), parsed.GetValue(quiet))
            .Execute(parsed.GetValue(designs)!, parsed.GetValue(asOf)));
        return command;
    }

    /// <summary>One run of the command.</summary>
    private sealed record AuditRun(
        Terminal Terminal, Func<Problems, Acceptance> Acceptance, string? RuleSet, IReadOnlyList<string> Writes, string? Template,
        FindingsOptions Options, FailOn FailOn, string? Against, bool Quiet)
    {
        public int Execute(string[] arguments, string? asOfText)
        {
            var problems = new Problems();
            var paths = DesignPaths.Expand(arguments, problems);
            var asOf = AsOfOption.Read(asOfText, problems);
            var acceptance = Acceptance(problems);
            var targets = ReportTarget.Read(Writes, paths.Count, problems);
            if (targets is null || problems.HasErrors)
            {
                Terminal.Tell(problems);
                return ExitCode.Problems;
            }

            if (Against is not null)
            {
                ReportTarget.CheckName(Against, paths.Count, problems);
            }

            var register = targets.Count == 0 ? null : Task.Run(() => Register.Load(Shipped.Rules, problems));
            var auditing = new Auditing(RuleSet, asOf, problems, acceptance);
            var results = paths.Select(auditing.Run).OfType<AuditResult>().ToArray();
            var reader = new RevisionReader(auditing, problems);
            var audited = problems.HasErrors ? [] : results.Select(result => new Audited(result, Compare(result, reader))).ToArray();
            if (problems.HasErrors)
            {
                // No report of a run in which anything could not be audited: a part must not be read as the whole.
                Terminal.Tell(problems);
                return ExitCode.Problems;
            }

            foreach (var target in targets)
            {
                Array.ForEach(audited, one => target.Write(one.Result, one.Against, register!.GetAwaiter().GetResult(), Template, Options, problems));
            }

            if (!Quiet)
            {
                Summarise(audited);
            }

            return Terminal.Tell(problems) ? ExitCode.Problems : Code(audited);
        }

        private RevisionComparison? Compare(AuditResult result, RevisionReader reader)
        {
            var path = result.Design.File.Path;
            var earlier = Against is null ? null : reader.Read(ReportTarget.Named(Against, path));
            return earlier is null ? null : RevisionComparison.Of(earlier, Revision.Of(path, result));
        }

        private int Code(Audited[] audited)
        {
            var counts = audited.Any(one => one.Against is { } comparison
                ? comparison.Findings.Any(change => FailOn.Counts(change))
                : one.Result.Findings.Any(finding => FailOn.Counts(finding)));
            return counts ? ExitCode.Found : ExitCode.Clean;
        }

        private void Summarise(Audited[] audited)
        {
            var summary = new Summary(Terminal.Console());
            Array.ForEach(audited, one => summary.Write(one.Result));
            var changes = new ComparisonSummary(Terminal.Console());
            foreach (var comparison in audited.Select(one => one.Against).OfType<RevisionComparison>())
            {
                changes.Write(ComparisonModel.Build(comparison));
            }

            Terminal.Console().WriteLine(Caution.Text);
        }
    }

    /// <summary>An audit, and how it stands against an earlier one where the caller named one.</summary>
    private sealed record Audited(AuditResult Result, RevisionComparison? Against);
}
