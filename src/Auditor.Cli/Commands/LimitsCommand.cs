using System.CommandLine;
using Auditor.Cli.Summaries;
using Auditor.Documents;
using Auditor.Engine.Adjustments;
using Auditor.Engine.Installation;
using Auditor.Engine.Limits;
using Auditor.Reports.Limits;
using Serilog;

namespace Auditor.Cli.Commands;

/// <summary><c>limits</c>: how far each adjustable input may go before each rule bites.</summary>
internal static class LimitsCommand
{
    public static Command Make(Terminal terminal)
    {
        var design = new Argument<string>("DESIGN") { Description = "Design file." };
        var rules = RuleSetOption.Make();
        var subject = new Option<string?>("--subject") { Description = "Only this subject; for a board, its circuits as well. `-` is the installation.", HelpName = "KEY" };
        var input = new Option<string?>("--input") { Description = "Only this input, such as cable.length or readings.zs.", HelpName = "PATH" };
        var write = new Option<string[]>("--write") { Description = "Write the limits (.md, .csv, .json); repeatable.", HelpName = "FILE" };
        var quiet = new Option<bool>("--quiet", "-q") { Description = "Print no table." };
        var command = new ExampleCommand(
            "limits", "Find how far each adjustable input may go, everything else as designed, before each rule bites.",
            "auditor limits site.design.yaml --subject DB/3",
            "auditor limits site.design.yaml --input cable.length",
            "auditor limits site.design.yaml --write site-sheet.md --write limits.csv") { design, rules, subject, input, write, quiet };
        command.SetAction(parsed => Run(
            terminal, parsed.GetValue(design)!, parsed.GetValue(rules), new Choice(parsed.GetValue(subject), parsed.GetValue(input)),
            parsed.GetValue(write) ?? [], parsed.GetValue(quiet)));
        return command;
    }

    private static int Run(Terminal terminal, string path, string? ruleSet, Choice choice, string[] writes, bool quiet)
    {
        var problems = new Problems();
        var targets = LimitsTarget.Read(writes, problems);
        var design = problems.HasErrors ? null : new Designs(ruleSet, problems).Read(path);
        var inputs = design is null ? [] : choice.Of(design, problems);
        if (design is null || problems.HasErrors)
        {
            terminal.Tell(problems);
            return ExitCode.Problems;
        }

        var result = LimitSearch.Run(design, inputs);
        Log.Information("Judged {Judged} times for {Inputs} inputs", result.Judged, inputs.Count);
        foreach (var target in targets)
        {
            target.Write(result, problems);
        }

        if (!quiet)
        {
            new LimitTable(terminal.Console()).Write(LimitsModel.Build(result));
        }

        return terminal.Tell(problems) ? ExitCode.Problems : ExitCode.Clean;
    }

    /// <summary>Which inputs the caller asks for.</summary>
    private sealed record Choice(string? Subject, string? Input)
    {
        public IReadOnlyList<Adjustable> Of(Design design, Problems problems)
        {
            var all = Adjustables.WithLimits(design);
            if (Subject is not null && design.Find(Subject) is null)
            {
                problems.Add(CommandMessages.UnknownSubject(Subject, NearestWord.Find(Subject, design.Subjects.Select(subject => subject.Key))));
            }

            var paths = design.Evaluator.Rules.Adjustments.Where(adjustment => adjustment.HasLimits).Select(adjustment => adjustment.Path).Distinct().ToArray();
            if (Input is not null && !paths.Contains(Input))
            {
                problems.Add(CommandMessages.NotAdjustable(Input, NearestWord.Find(Input, paths), paths));
            }

            return [.. all.Where(input => (Subject is null || Belongs(input.Subject, Subject)) && (Input is null || input.Adjustment.Path == Input))];
        }

        private static bool Belongs(DesignSubject subject, string key) => subject.Key == key || subject.Key.StartsWith(key + "/", StringComparison.Ordinal);
    }
}
