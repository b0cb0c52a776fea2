namespace Auditor.Browser.Tests;

/// <summary>Tests that take times, and so run when no other does.</summary>
[CollectionDefinition(nameof(Alone), DisableParallelization = true)]
public class Alone;
