namespace Auditor.Engine.Comparisons;

/// <summary>Something that differs between two revisions and that findings may rest on.</summary>
public abstract record Change;
