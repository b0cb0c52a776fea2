using Auditor.Engine.Installation;

namespace Auditor.Engine.Comparisons;

/// <summary>A subject of one revision.</summary>
/// <param name="key">Stable key.</param>
/// <param name="kind">Kind of subject, as its shape is called.</param>
/// <param name="name">The name that the design gives it; null for none.</param>
/// <param name="parent">Key of the subject that it belongs to or is fed from; null for the installation.</param>
public sealed class RevisionSubject(string key, string kind, string? name, string? parent)
{
    /// <summary>Kind of a departure on record.</summary>
    internal const string Departure = "departure";

    /// <summary>Kind of a change that a house set makes.</summary>
    internal const string Change = "change";

    private const string BondingPrefix = "bonding/";

    /// <summary>Stable key.</summary>
    public string Key { get; } = key;

    /// <summary>Kind of subject, as its shape is called.</summary>
    public string Kind { get; } = kind;

    /// <summary>The name that the design gives it; null for none.</summary>
    public string? Name { get; } = name;

    /// <summary>Key of the subject that it belongs to or is fed from; null for the installation.</summary>
    public string? Parent { get; } = parent;

    /// <summary>Where it is named; null where a findings file does not tell.</summary>
    public Place? Place { get; init; }

    /// <summary>What the design states of it, by path; null where a findings file does not tell.</summary>
    public IReadOnlyList<RevisionInput>? Stated { get; init; }

    /// <summary>Whether it is no part of the installation but on record about the audit: such subjects are compared on their own.</summary>
    public bool IsOnRecord => Kind is Departure or Change;

    /// <summary>Its key without that of what it belongs to: the id of a board or circuit, what a bonding conductor leads to.</summary>
    public string Id => IsOnRecord ? Key : Kind == "bonding" && Key.StartsWith(BondingPrefix, StringComparison.Ordinal)
        ? Key[BondingPrefix.Length..]
        : Key[(Key.LastIndexOf('/') + 1)..];

    /// <summary>Keys that it had in earlier revisions, as the design declares; empty where it declares none or the file does not tell.</summary>
    public IReadOnlyList<string> Formerly => [.. (Input("formerly")?.Text ?? "").Split(", ", StringSplitOptions.RemoveEmptyEntries)];

    /// <summary>The subject itself; null when the revision was read from a findings file.</summary>
    internal DesignSubject? Source { get; init; }

    /// <summary>An input that the design states of it, or null.</summary>
    public RevisionInput? Input(string path) => Stated?.FirstOrDefault(input => input.Path == path);
}
