using System.CommandLine;
using Auditor.Cli.Importing;
using Auditor.Cli.Starting;
using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Commands;

/// <summary><c>import</c>: makes a design file from a circuit list in CSV.</summary>
internal static class ImportCommand
{
    public static Command Make(Terminal terminal)
    {
        var file = new Argument<string?>("FILE") { Description = "Circuit list: comma-separated values with a header, one row for each circuit.", Arity = ArgumentArity.ZeroOrOne };
        var columns = new Option<bool>("--columns") { Description = "List the columns that a circuit list may have, and stop." };
        var supply = SupplyOptions.Make();
        var write = new Option<string?>("--write") { Description = "Write the design file here instead of to standard output; a file that is there is left alone.", HelpName = "FILE" };
        var rules = RuleSetOption.Make();
        var command = new Command("import", """
            Make a design file from a circuit list in CSV (RFC 4180).

            The first row names the columns: `board` and `id` are due, all others are paths in a circuit of the design file, such as
            name, phase, device.rating, cable.length or load.current. A cell reads as in a design file (`2.5 mm²`, `18 m`); several words
            have semicolons between them; an empty cell says nothing. A board that no row feeds is fed from the origin.

            Examples:
              auditor import circuits.csv --earthing TN-S --phases 3 --voltage '400 V' --write site.design.yaml
              auditor import --columns
            """) { file, columns, write, rules };
        foreach (var option in supply)
        {
            command.Add(option.Option);
        }

        command.SetAction(parsed => parsed.GetValue(columns)
            ? List(terminal)
            : Run(terminal, parsed.GetValue(file), [.. supply.Select(option => option.Read(parsed))], parsed.GetValue(write), parsed.GetValue(rules)));
        return command;
    }

    private static int List(Terminal terminal)
    {
        foreach (var column in CircuitColumns.Of(Shipped.DesignSchema().Shapes))
        {
            terminal.Output.WriteLine($"{column.Name,-40} {column.Holds}");
        }

        return ExitCode.Clean;
    }

    private static int Run(Terminal terminal, string? path, SupplyFact[] supply, string? write, string? ruleSet)
    {
        var problems = new Problems();
        if (path is null)
        {
            problems.Add(ImportMessages.NoFile());
        }

        Array.ForEach(supply, fact => fact.Check(problems));
        var source = path is null ? null : SourceReader.Read(Path.GetFullPath(path), path.Replace('\\', '/'), problems);
        var rules = source is null ? null : RuleSetOption.Load(ruleSet, problems);
        var text = source is null || rules is null ? null : Text(source, rules, [.. supply.Select(fact => fact.Entry).OfType<MappingEntry>()], problems);
        if (problems.HasErrors)
        {
            terminal.Tell(problems);
            return ExitCode.Problems;
        }

        if (write is null)
        {
            terminal.Output.Write(text);
        }
        else
        {
            NewFile.Write(write, text!, problems);
        }

        return terminal.Tell(problems) ? ExitCode.Problems : ExitCode.Clean;
    }

    /// <summary>The text of the design file that a circuit list makes; null, with problems added, when it makes none.</summary>
    internal static string? Text(SourceText source, RuleSet rules, IReadOnlyList<MappingEntry> supply, Problems problems)
    {
        if (CircuitList.Read(source, CircuitColumns.Of(rules.Schema.Shapes), problems) is not { } list || supply.Count == 0)
        {
            return null;
        }

        var own = new Problems();
        var root = new ImportedDesign(list).Make(supply);
        rules.Schema.Validation.Validate(root, own);
        DesignBuilder.Build(new DesignFile(source.Path, root, []), new Evaluator(rules), own);
        foreach (var problem in own.All)
        {
            problems.Add(list.WithCell(problem));
        }

        return problems.HasErrors ? null : Heading(source) + DesignText.Write(root);
    }

    private static string Heading(SourceText source) => $"""
        # Made from {Path.GetFileName(source.Path)}. A circuit list says nothing of the job, the rest of the supply, earthing and bonding, and the boards:
        # add what an audit misses. `auditor schema design` prints all that may be said.

        """;
}
