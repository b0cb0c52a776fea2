using Auditor.Formulas.Types;

namespace Auditor.Cli.Importing;

/// <summary>A column that a circuit list may have.</summary>
/// <param name="Name">Its name in the header: the path in a circuit of the design file.</param>
/// <param name="Type">What its cells hold.</param>
internal sealed record CircuitColumn(string Name, FormulaType Type)
{
    /// <summary>The column that names the board of a circuit.</summary>
    public const string Board = "board";

    /// <summary>The column that names the circuit.</summary>
    public const string Id = "id";

    /// <summary>The column that names the board that a circuit feeds.</summary>
    public const string Feeds = "feeds";

    /// <summary>Whether its cells name a board or circuit.</summary>
    public bool IsIdentifier => Name is Board or Id or Feeds;

    /// <summary>The keys that lead to its value in the mapping of a circuit.</summary>
    public IReadOnlyList<string> Keys { get; } = Name.Split('.');

    /// <summary>What its cells hold, in words.</summary>
    public string Holds => Type switch
    {
        { Kind: FormulaKind.Words, Vocabulary: { } words } => "words with semicolons between, of: " + string.Join(", ", words),
        { Vocabulary: { } words } => "one of: " + string.Join(", ", words),
        _ => Type.ToString(),
    };
}
