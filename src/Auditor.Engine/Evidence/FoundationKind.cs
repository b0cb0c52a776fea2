namespace Auditor.Engine.Evidence;

/// <summary>Why a reader should know of it.</summary>
public enum FoundationKind
{
    /// <summary>An input of the design marked <c>assumed</c>.</summary>
    AssumedInput,

    /// <summary>A figure of the rule data entered from memory.</summary>
    FigureFromMemory,
}
