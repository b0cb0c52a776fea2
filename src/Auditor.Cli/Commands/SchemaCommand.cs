using System.CommandLine;
using System.CommandLine.Completions;
using Auditor.Documents;

namespace Auditor.Cli.Commands;

/// <summary><c>schema</c>: prints one of the schemas.</summary>
internal static class SchemaCommand
{
    private const string Ending = ".schema.json";

    public static Command Make(Terminal terminal)
    {
        var name = new Argument<string>("NAME") { Description = "Name of the schema, such as design, provision or findings." };
        name.CompletionSources.Add(_ => Names().Select(known => new CompletionItem(known)));
        var command = new ExampleCommand(
            "schema", "Print the JSON Schema of design files, rule files or findings.",
            "auditor schema design") { name };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(name)!));
        return command;
    }

    private static int Run(Terminal terminal, string name)
    {
        if (Names().Contains(name))
        {
            terminal.Output.Write(File.ReadAllText(Shipped.Rules.SchemaPath(name)));
            return ExitCode.Clean;
        }

        var problems = new Problems();
        problems.Add(CommandMessages.UnknownSchema(name, Names()));
        terminal.Tell(problems);
        return ExitCode.Problems;
    }

    private static List<string> Names() =>
        [.. Directory.EnumerateFiles(Path.Combine(Shipped.Rules.Folder, "schema"), "*" + Ending).Select(path => Path.GetFileName(path)[..^Ending.Length]).Order(StringComparer.Ordinal)];
}
