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

        return sound && boards.All(board => ReachesOrigin(board, problems));
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

    private static bool ReachesOrigin(DesignSubject board, Problems problems)
    {
        var way = new List<string> { board.Key };
        for (var at = board.Parent; at is not null; at = at.Parent)
        {
            if (at == board)
            {
                problems.Add(DesignMessages.FeedsItself(board.Node.Find("id")!.Span, string.Join(" feeds ", way.Append(board.Key).Reverse())));
                return false;
            }

            if (at.Shape == board.Shape)
            {
                way.Add(at.Key);
            }

            if (way.Count > MostDeep)
            {
                problems.Add(DesignMessages.TooDeep(board.Node.Find("id")!.Span, MostDeep));
                return false;
            }
        }

        return true;
    }
}
