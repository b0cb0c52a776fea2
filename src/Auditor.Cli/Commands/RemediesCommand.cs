using System.CommandLine;
using Auditor.Cli.Summaries;
using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Remedies;
using Auditor.Reports.Model;
using Auditor.Reports.Remedies;
using Serilog;
using Spectre.Console;

namespace Auditor.Cli.Commands;

/// <summary><c>remedies</c>: changes that would put findings right, each proven by a new audit.</summary>
internal static class RemediesCommand
{
    public static Command Make(Terminal terminal)
    {
        var design = new Argument<string>("DESIGN") { Description = "Design file. It is never changed." };
        var key = new Argument<string?>("KEY") { Description = "Only this finding, as `rule:subject`.", Arity = ArgumentArity.ZeroOrOne };
        var rules = RuleSetOption.Make();
        var decision = AcceptanceOptions.MakeDecision();
        var asOf = AsOfOption.Make();
        var number = new Option<int>("--number") { Description = "Which remedy of the finding goes into the .patch; 1 is the least change.", HelpName = "N", DefaultValueFactory = _ => 1 };
        var write = new Option<string[]>("--write") { Description = "Write the remedies (.md, .json), or one of them as a unified diff (.patch); repeatable.", HelpName = "FILE" };
        var quiet = new Option<bool>("--quiet", "-q") { Description = "Print no list." };
        var command = new ExampleCommand(
            "remedies", "Find changes that would put findings right and create no other, each proven by a new audit.",
            "auditor remedies site.design.yaml",
            "auditor remedies site.design.yaml disconnection-tn:DB/3",
            "auditor remedies site.design.yaml disconnection-tn:DB/3 --number 2 --write fix.patch") { design, key, rules, decision, asOf, number, write, quiet };
        command.SetAction(parsed => new RemediesRun(terminal, parsed.GetValue(key), parsed.GetValue(number), parsed.GetValue(write) ?? [], parsed.GetValue(quiet))
            .Execute(parsed.GetValue(design)!, parsed.GetValue(rules), parsed.GetValue(decision), parsed.GetValue(asOf)));
        return command;
    }

    /// <summary>One run of the command.</summary>
    private sealed record RemediesRun(Terminal Terminal, string? Key, int Number, IReadOnlyList<string> Writes, bool Quiet)
    {
        public int Execute(string path, string? ruleSet, Decision? decision, string? asOfText)
        {
            var problems = new Problems();
            var asOf = AsOfOption.Read(asOfText, problems);
            var targets = RemediesTarget.Read(Writes, problems);
            foreach (var target in targets.Where(target => target.IsPatch && Key is null))
            {
                problems.Add(CommandMessages.PatchOfMany(target.Path));
            }

            var audit = problems.HasErrors ? null : new Auditing(ruleSet, asOf, problems, new Acceptance(decision)).Run(path);
            var findings = audit is null ? [] : Findings(audit, problems);
            if (audit is null || problems.HasErrors)
            {
                Terminal.Tell(problems);
                return ExitCode.Problems;
            }

            var result = RemedySearch.Run(audit, findings);
            Log.Information("Judged {Judged} times for {Findings} findings", result.Judged, findings.Count);
            Write(result, targets, problems);
            if (!Quiet)
            {
                new RemedyList(Terminal.Console()).Write(RemediesModel.Build(result));
                Terminal.Console().WriteLine(Caution.Text);
            }

            return Terminal.Tell(problems) ? ExitCode.Problems : ExitCode.Clean;
        }

        private IReadOnlyList<Finding> Findings(AuditResult audit, Problems problems)
        {
            var wanting = RemedySearch.Wanting(audit);
            if (Key is null)
            {
                return wanting;
            }

            if (audit.Find(Key) is not { } finding)
            {
                problems.Add(CommandMessages.UnknownFinding(Key, NearestWord.Find(Key, wanting.Select(each => each.Key))));
            }
            else if (!wanting.Contains(finding))
            {
                problems.Add(CommandMessages.NothingToRemedy(finding.Key, finding.VerdictText));
            }
            else
            {
                return [finding];
            }

            return [];
        }

        private void Write(RemedyResult result, IReadOnlyList<RemediesTarget> targets, Problems problems)
        {
            var chosen = targets.Any(target => target.IsPatch) ? Chosen(result.Findings[0], result, problems) : null;
            foreach (var target in targets.Where(target => !target.IsPatch || chosen is not null))
            {
                target.Write(result, chosen, problems);
            }
        }

        /// <summary>The remedy of the patch, after the text as patched has been audited as a whole.</summary>
        private Remedy? Chosen(FindingRemedies each, RemedyResult result, Problems problems)
        {
            if (Number < 1 || Number > each.Remedies.Count)
            {
                problems.Add(CommandMessages.NoSuchRemedy(each.Finding.Key, Number, each.Remedies.Count));
                return null;
            }

            var remedy = each.Remedies[Number - 1];
            var patched = RemedySearch.Reaudit(result.Audit, remedy.Inputs, Designs.RereadOf(result.Audit.Design));
            if (patched is null || patched.Find(each.Finding.Key) is { Verdict: not Verdict.Conforms })
            {
                problems.Add(CommandMessages.PatchNotProven(each.Finding.Key));
                return null;
            }

            return remedy;
        }
    }
}
