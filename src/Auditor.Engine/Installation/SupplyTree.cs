using Auditor.Documents;

namespace Auditor.Engine.Installation;

/// <summary>Joins boards to the circuits that feed them, and refuses anything that is not a tree rooted at the origin.</summary>
internal static class SupplyTree
{
    /// <summary>Boards below one another at the most; keeps the evaluation within the stack.</summary>
    public const int MostDeep = 64;

    /// <summary>Links the tree; false with problems added when it is none.</summary>
    public static bool Link(IReadOnlyList<DesignSubject> boards, IReadOnlyList<DesignSubject> circuits, Problems problems)
    {
        var byId = boards.ToDictionary(board => board.Key);
        var sound = true;
        foreach (var circuit in circuits)
        {
            if (circuit.Node.Scalar("feeds") is { } feeds)
            {
                sound &= Feed(circuit, feeds, byId, problems);
            }
        }

        for (var i = 0; i < boards.Count; i++)
        {
            sound &= Root(boards[i], isFirst: i == 0, problems);
        }

        var told = new HashSet<DesignSubject>();
        foreach (var board in boards)
        {
            sound &= ReachesOrigin(board, told, problems);
        }

        return sound;
    }

    private static bool Feed(DesignSubject circuit, ScalarNode feeds, Dictionary<string, DesignSubject> boards, Problems problems)
    {
        if (!boards.TryGetValue(feeds.Text, out var board))
        {
            problems.Add(DesignMessages.UnknownBoard(feeds.Span, feeds.Text, NearestWord.Find(feeds.Text, boards.Keys)));
            return false;
        }

        if (board.Parent is { } first)
        {
            problems.Add(DesignMessages.FedTwice(feeds.Span, board.Key, first.Node.Find("feeds")!.Span));
            return false;
        }

        board.Parent = circuit;
        circuit.FedBoard = board;
        return true;
    }

    private static bool Root(DesignSubject board, bool isFirst, Problems problems)
    {
        var fedFrom = board.Node.Scalar("fed-from");
        if (board.Parent is { } feeder)
        {
            if (fedFrom is not null)
            {
                problems.Add(DesignMessages.FedTwice(fedFrom.Span, board.Key, feeder.Node.Find("feeds")!.Span));
            }

            return fedFrom is null;
        }

        if (isFirst || fedFrom is not null)
        {
            board.Parent = board.Installation;
            return true;
        }

        problems.Add(DesignMessages.Orphan(board.Node.Find("id")!.Span, board.Key));
        return false;
    }

    /// <summary>Follows the supply of a board; a circle is told once, at its first board.</summary>
    private static bool ReachesOrigin(DesignSubject board, HashSet<DesignSubject> told, Problems problems)
    {
        var way = new List<DesignSubject> { board };
        for (var at = board.Parent; at is not null; at = at.Parent)
        {
            if (at.Shape != board.Shape)
            {
                continue;
            }

            if (way.Contains(at))
            {
                TellCircle(way[way.IndexOf(at)..], told, problems);
                return false;
            }

            way.Add(at);
            if (way.Count > MostDeep)
            {
                problems.Add(DesignMessages.TooDeep(board.Node.Find("id")!.Span, MostDeep));
                return false;
            }
        }

        return true;
    }

    private static void TellCircle(List<DesignSubject> circle, HashSet<DesignSubject> told, Problems problems)
    {
        if (circle.TrueForAll(told.Add))
        {
            var names = circle.Append(circle[0]).Reverse().Select(board => board.Key);
            problems.Add(DesignMessages.FeedsItself(circle[0].Node.Find("id")!.Span, string.Join(" feeds ", names)));
        }
    }
}
