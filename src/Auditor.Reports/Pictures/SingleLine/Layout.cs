using Auditor.Engine.Installation;

namespace Auditor.Reports.Pictures.SingleLine;

/// <summary>
/// Places the lines of one diagram below one another: the origin, then each board with its circuits, a board that a circuit feeds right
/// below that circuit and set in, as in an outline.
/// </summary>
internal sealed class Layout
{
    public const double RowHeight = 36;

    /// <summary>Height that fills a printed A4 page at the width of the diagram.</summary>
    public const double Page = 1400;

    private const double Top = 26;
    private const double Gap = 14;

    private readonly List<Item> _items = [];
    private double _y = Top;

    /// <summary>The lines from the top.</summary>
    public IReadOnlyList<Item> Items => _items;

    /// <summary>Height of the diagram without its legend.</summary>
    public double Height => _y;

    /// <summary>How deep boards stand below one another.</summary>
    public int Depth => _items.Max(item => item.Depth);

    /// <summary>The whole installation in one diagram.</summary>
    public static Layout Whole(Scene scene)
    {
        var layout = new Layout();
        foreach (var block in Blocks(scene, folded: false))
        {
            layout.Add(block);
        }

        return layout;
    }

    /// <summary>
    /// Origin, boards and what feeds them; all other circuits are left to the diagrams of the boards. Where a page is full the next begins with
    /// the board at the origin whose circuits go on.
    /// </summary>
    public static IReadOnlyList<Layout> Overview(Scene scene)
    {
        var pages = new List<Layout> { new() };
        Item? board = null;
        foreach (var block in Blocks(scene, folded: true))
        {
            if (pages[^1]._y + block.Sum(item => item.Height) > Page && pages[^1]._items.Count > 1)
            {
                pages.Add(new Layout());
                pages[^1].Add(block[0].Kind == ItemKind.Circuit ? [board! with { IsOwn = false }] : []);
            }

            board = block[0].Kind == ItemKind.Board ? block[0] : board;
            pages[^1].Add(block);
        }

        return pages;
    }

    /// <summary>Some circuits of a board; those that feed boards are only referred to, since the overview shows them.</summary>
    /// <param name="board">The board.</param>
    /// <param name="circuits">The circuits.</param>
    /// <param name="isFirst">Whether they are the first of the board, and it is drawn here; otherwise it is only referred to.</param>
    public static Layout Part(DesignSubject board, IEnumerable<DesignSubject> circuits, bool isFirst)
    {
        var layout = new Layout();
        layout.Add([new Item(ItemKind.Board, board, 0, isFirst), .. circuits.Select(circuit => new Item(ItemKind.Circuit, circuit, 0, circuit.FedBoard is null))]);
        return layout;
    }

    /// <summary>What may not be torn apart: the origin, the head of a board there, each of its circuits with all that it feeds.</summary>
    private static IEnumerable<List<Item>> Blocks(Scene scene, bool folded)
    {
        yield return [new Item(ItemKind.Origin, scene.Installation, 0, true), .. scene.Bondings.Select(bonding => new Item(ItemKind.Bonding, bonding, 0, true))];
        foreach (var board in scene.Boards.Where(board => board.Parent == scene.Installation))
        {
            yield return [Head(scene, board, 0, folded)];
            foreach (var circuit in Circuits(scene, board, folded))
            {
                yield return [.. WithFed(scene, circuit, 0, folded)];
            }
        }
    }

    /// <summary>A board with circuits has a diagram of its own where circuits are left out here.</summary>
    private static Item Head(Scene scene, DesignSubject board, int depth, bool folded) =>
        new(ItemKind.Board, board, depth, !folded || !scene.CircuitsOf[board].Any());

    private static IEnumerable<DesignSubject> Circuits(Scene scene, DesignSubject board, bool folded) =>
        scene.CircuitsOf[board].Where(circuit => !folded || circuit.FedBoard is not null);

    private static IEnumerable<Item> WithFed(Scene scene, DesignSubject circuit, int depth, bool folded)
    {
        yield return new Item(ItemKind.Circuit, circuit, depth, true);
        if (circuit.FedBoard is { } fed)
        {
            yield return Head(scene, fed, depth + 1, folded);
            foreach (var item in Circuits(scene, fed, folded).SelectMany(below => WithFed(scene, below, depth + 1, folded)))
            {
                yield return item;
            }
        }
    }

    private void Add(IEnumerable<Item> block)
    {
        foreach (var item in block)
        {
            _y += item is { Kind: ItemKind.Board, Depth: 0 } && _items.Count > 0 ? Gap : 0;
            _items.Add(item with { Y = _y });
            _y += item.Height;
        }
    }
}
