namespace Auditor.Cli.Tests;

/// <summary>What a run of the program left.</summary>
internal sealed record ToolResult(int Code, string Output, string Error);
