using Auditor.Engine.Installation;

namespace Auditor.Reports.Pictures.SingleLine;

/// <summary>
/// Places the lines of one diagram below one another: the origin, then each board with its circuits, a board that a circuit feeds right
/// below that circuit and set in, as in an outline.
/// </summary>
internal sealed class Layout(Scene scene)
{
    public const double RowHeight = 36;
    private const double HeadHeight = 46;
    private const double BondingHeight = 24;
    private const double GapAbove = 14;

    private readonly List<Item> _items = [];
    private double _y = 26;

    /// <summary>The lines from the top.</summary>
    public IReadOnlyList<Item> Items => _items;

    /// <summary>Height of the diagram without its legend.</summary>
    public double Height => _y;

    /// <summary>How deep boards stand below one another.</summary>
    public int Depth => _items.Count == 0 ? 0 : _items.Max(item => item.Depth);

    /// <summary>The whole installation.</summary>
    public static Layout Whole(Scene scene)
    {
        var layout = new Layout(scene);
        layout.Origin();
        layout.Roots(folded: false);
        return layout;
    }

    /// <summary>Origin, boards and what feeds them; all other circuits are left to the diagrams of the boards.</summary>
    public static Layout Overview(Scene scene)
    {
        var layout = new Layout(scene);
        layout.Origin();
        layout.Roots(folded: true);
        return layout;
    }

    /// <summary>Some circuits of a board; those that feed boards are only referred to, since the overview shows them.</summary>
    public static Layout Part(Scene scene, DesignSubject board, IEnumerable<DesignSubject> circuits)
    {
        var layout = new Layout(scene);
        layout.Add(ItemKind.Board, board, 0, false, HeadHeight);
        foreach (var circuit in circuits)
        {
            layout.Add(ItemKind.Circuit, circuit, 0, circuit.FedBoard is null, RowHeight);
        }

        return layout;
    }

    private void Origin()
    {
        Add(ItemKind.Origin, scene.Installation, 0, true, 84);
        foreach (var bonding in scene.Bondings)
        {
            Add(ItemKind.Bonding, bonding, 0, true, BondingHeight);
        }

        _y += 12;
    }

    private void Roots(bool folded)
    {
        foreach (var board in scene.Boards.Where(board => board.Parent == scene.Installation))
        {
            Board(board, 0, folded);
        }
    }

    private void Board(DesignSubject board, int depth, bool folded)
    {
        _y += depth == 0 && _items[^1].Kind != ItemKind.Origin ? GapAbove : 0;
        Add(ItemKind.Board, board, depth, true, HeadHeight);
        foreach (var circuit in scene.CircuitsOf[board].Where(circuit => !folded || circuit.FedBoard is not null))
        {
            Add(ItemKind.Circuit, circuit, depth, true, RowHeight);
            if (circuit.FedBoard is { } fed)
            {
                Board(fed, depth + 1, folded);
            }
        }

        if (folded && scene.CircuitsOf[board].Any(circuit => circuit.FedBoard is null))
        {
            Add(ItemKind.Folded, board, depth, false, RowHeight);
        }
    }

    private void Add(ItemKind kind, DesignSubject subject, int depth, bool isOwn, double height)
    {
        _items.Add(new Item(kind, subject, _y, depth, isOwn));
        _y += height;
    }
}
