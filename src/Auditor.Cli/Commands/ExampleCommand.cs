using System.CommandLine;

namespace Auditor.Cli.Commands;

/// <summary>A command whose help ends with examples.</summary>
/// <param name="name">Its name.</param>
/// <param name="description">What it does, in a sentence.</param>
/// <param name="examples">Command lines as a user would type them.</param>
internal sealed class ExampleCommand(string name, string description, params string[] examples) : Command(name, description)
{
    /// <summary>Command lines as a user would type them.</summary>
    public IReadOnlyList<string> Examples { get; } = examples;
}
