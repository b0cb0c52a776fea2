namespace Auditor.Engine.RuleSets;

/// <summary>
/// Parts of a directed graph within which every node reaches every other. Walks the graph with a stack of its own, so that no chain is
/// too long for it.
/// </summary>
internal static class StrongComponents
{
    /// <summary>The number of the component of each node.</summary>
    /// <param name="next">For each node the nodes that its edges lead to.</param>
    public static int[] Of(IReadOnlyList<IReadOnlyList<int>> next)
    {
        var component = new int[next.Count];
        Array.Fill(component, -1);
        var previous = Reversed(next);
        var found = 0;
        foreach (var root in Finished(next).AsEnumerable().Reverse().Where(root => component[root] < 0))
        {
            var open = new Stack<int>([root]);
            component[root] = found;
            while (open.TryPop(out var node))
            {
                foreach (var before in previous[node].Where(before => component[before] < 0))
                {
                    component[before] = found;
                    open.Push(before);
                }
            }

            found++;
        }

        return component;
    }

    /// <summary>The nodes in the order in which a walk into the depth leaves them.</summary>
    private static List<int> Finished(IReadOnlyList<IReadOnlyList<int>> next)
    {
        var order = new List<int>(next.Count);
        var seen = new bool[next.Count];
        for (var root = 0; root < next.Count; root++)
        {
            var path = new Stack<(int Node, int Edge)>();
            Enter(root);
            while (path.TryPop(out var at))
            {
                if (at.Edge == next[at.Node].Count)
                {
                    order.Add(at.Node);
                    continue;
                }

                path.Push((at.Node, at.Edge + 1));
                Enter(next[at.Node][at.Edge]);
            }

            void Enter(int node)
            {
                if (!seen[node])
                {
                    seen[node] = true;
                    path.Push((node, 0));
                }
            }
        }

        return order;
    }

    private static List<int>[] Reversed(IReadOnlyList<IReadOnlyList<int>> next)
    {
        var previous = next.Select(_ => new List<int>()).ToArray();
        for (var node = 0; node < next.Count; node++)
        {
            foreach (var target in next[node])
            {
                previous[target].Add(node);
            }
        }

        return previous;
    }
}
