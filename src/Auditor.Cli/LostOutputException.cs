namespace Auditor.Cli;

/// <summary>Stops a command whose results cannot be written; caught where the command was started.</summary>
/// <param name="reason">What the system says of it.</param>
internal sealed class LostOutputException(string reason) : Exception(reason);
