using Auditor.Engine.Installation;

namespace Auditor.Reports.Pictures.SingleLine;

/// <summary>What stands on one line of a diagram.</summary>
internal enum ItemKind
{
    /// <summary>The origin, with the earthing terminal below it.</summary>
    Origin,

    /// <summary>A bonding conductor.</summary>
    Bonding,

    /// <summary>The head of a board, above its circuits.</summary>
    Board,

    /// <summary>A circuit.</summary>
    Circuit,
}

/// <summary>One line of a diagram.</summary>
/// <param name="Kind">What stands there.</param>
/// <param name="Subject">The subject.</param>
/// <param name="Depth">How many boards stand between it and a board at the origin.</param>
/// <param name="IsOwn">Whether the subject is drawn here; otherwise it is only referred to, and drawn in another diagram.</param>
/// <param name="Y">Height of its conductor from the top.</param>
internal sealed record Item(ItemKind Kind, DesignSubject Subject, int Depth, bool IsOwn, double Y = 0)
{
    /// <summary>Height that it takes.</summary>
    public double Height => Kind switch
    {
        ItemKind.Origin => 84,
        ItemKind.Bonding => 24,
        ItemKind.Board => 46,
        _ => Layout.RowHeight,
    };
}
