using System.CommandLine;
using Auditor.Cli.Revisions;
using Auditor.Cli.Summaries;
using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Reports.Comparisons;
using Auditor.Reports.Files;
using Auditor.Reports.Model;
using Auditor.Reports.Templates;
using Spectre.Console;

namespace Auditor.Cli.Commands;

/// <summary><c>compare</c>: what a revision of a design changed, and what moved each finding.</summary>
internal static class CompareCommand
{
    public static Command Make(Terminal terminal)
    {
        var before = new Argument<string>("BEFORE") { Description = "Design file, findings file (.json), or REVISION:path of the git repository of the current folder." };
        var after = new Argument<string>("AFTER") { Description = "The same." };
        var rules = RuleSetOption.Make();
        var write = new Option<string[]>("--write") { Description = "Write the comparison (.md, .json, .sarif); repeatable.", HelpName = "FILE" };
        var template = new Option<string?>("--template") { Description = "Template to use instead of the shipped one for .md.", HelpName = "FILE" };
        var asOf = AsOfOption.Make();
        var failOn = FailOnOption.Make();
        var quiet = new Option<bool>("--quiet", "-q") { Description = "Print no summary." };
        var command = new ExampleCommand(
            "compare", "Tell what changed from one state of a design to another; the exit code is 1 when findings are new or worse.",
            "auditor compare main:designs/site.design.yaml designs/site.design.yaml",
            "auditor compare HEAD~1:./site.design.yaml HEAD:./site.design.yaml --write changes.md",
            "auditor compare site.findings.json site.design.yaml --fail-on nonconforming") { before, after, rules, write, template, asOf, failOn, quiet };
        command.SetAction(parsed => new CompareRun(
            terminal, parsed.GetValue(rules), parsed.GetValue(write) ?? [], parsed.GetValue(template), parsed.GetValue(failOn), parsed.GetValue(quiet))
            .Execute(parsed.GetValue(before)!, parsed.GetValue(after)!, parsed.GetValue(asOf)));
        return command;
    }

    /// <summary>One run of the command.</summary>
    private sealed record CompareRun(
        Terminal Terminal, string? RuleSet, IReadOnlyList<string> Writes, string? Template, FailOn FailOn, bool Quiet)
    {
        public int Execute(string before, string after, string? asOfText)
        {
            var problems = new Problems();
            var asOf = AsOfOption.Read(asOfText, problems);
            var formats = Writes.Select(path => (path, Format: ReportFormat.Of(path, ComparisonReport.Formats, problems))).ToArray();
            if (problems.HasErrors)
            {
                Terminal.Tell(problems);
                return ExitCode.Problems;
            }

            var reader = new RevisionReader(new Auditing(RuleSet, asOf, problems), problems);
            var earlier = reader.Read(before);
            var later = reader.Read(after);
            if (earlier is null || later is null || problems.HasErrors)
            {
                Terminal.Tell(problems);
                return ExitCode.Problems;
            }

            var comparison = RevisionComparison.Of(earlier, later);
            foreach (var (path, format) in formats)
            {
                Write(comparison, path, format!, problems);
            }

            if (!Quiet)
            {
                new ComparisonSummary(Terminal.Console()).Write(ComparisonModel.Build(comparison));
                Terminal.Console().WriteLine(Caution.Text);
            }

            if (Terminal.Tell(problems))
            {
                return ExitCode.Problems;
            }

            return comparison.Findings.Any(change => FailOn.Counts(change)) ? ExitCode.Found : ExitCode.Clean;
        }

        private void Write(RevisionComparison comparison, string path, ReportFormat format, Problems problems)
        {
            if (ComparisonReport.Write(comparison, format, Template is null ? null : TemplateFile.At(Template), problems) is { } bytes)
            {
                ReportFile.Write(path, bytes, problems);
            }
        }
    }
}
