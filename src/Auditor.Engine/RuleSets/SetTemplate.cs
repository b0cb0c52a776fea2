namespace Auditor.Engine.RuleSets;

/// <summary>A report template that a set brings.</summary>
/// <param name="FullPath">Where it lies.</param>
/// <param name="DisplayPath">The path to show.</param>
public sealed record SetTemplate(string FullPath, string DisplayPath);
