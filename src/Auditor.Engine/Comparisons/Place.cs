namespace Auditor.Engine.Comparisons;

/// <summary>A place in a file of a revision.</summary>
/// <param name="File">Path relative to the folder of the design; of rule data, the path as the rule set shows it.</param>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column, from 1.</param>
public sealed record Place(string File, int Line, int Column)
{
    /// <summary>The place as <c>path:line:column</c>.</summary>
    public override string ToString() => $"{File}:{Line}:{Column}";
}
