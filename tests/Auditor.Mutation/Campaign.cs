namespace Auditor.Mutation;

/// <summary>Tries mutants against one test project after the other, each until a test notices it.</summary>
/// <param name="mutants">The mutants.</param>
/// <param name="log">Where every outcome is noted as it comes.</param>
internal sealed class Campaign(IReadOnlyList<Mutant> mutants, TextWriter log)
{
    /// <summary>What becomes of a mutant that tests come by only while something is made once.</summary>
    public const string OnlyOnce = "met only once";

    /// <summary>Tests that take longer are left out: a mutant that survives runs all that come by it.</summary>
    private const int MostMilliseconds = 3_000;

    /// <summary>What became of each mutant that some test came by: killed, timeout, crashed, survived or <see cref="OnlyOnce"/>.</summary>
    public Dictionary<int, string> Outcomes { get; } = [];

    /// <summary>Takes over what an earlier campaign noted of the same mutants.</summary>
    public void GoOnFrom(IEnumerable<string> lines)
    {
        foreach (var parts in lines.Select(line => line.Split('\t')))
        {
            if (int.TryParse(parts[0], out var id))
            {
                Outcomes[id] = parts[1];
            }
        }
    }

    /// <summary>Tries what no earlier project noticed.</summary>
    public void Run(TestProject project, string work)
    {
        var wanted = mutants.Where(mutant => Outcomes.GetValueOrDefault(mutant.Id, OnlyOnce) is "survived" or OnlyOnce).Select(mutant => mutant.Id).ToHashSet();
        var covering = wanted.ToDictionary(id => id, _ => new List<(int Test, int Milliseconds)>());
        var once = new HashSet<int>();
        foreach (var test in project.Run("cover", $"{mutants.Max(mutant => mutant.Id)}"))
        {
            var milliseconds = int.Parse(test[2]);
            if (test[1] != "passes" || milliseconds > MostMilliseconds)
            {
                log.WriteLine($"left out: {test[^1]}: {test[1]}, {milliseconds} ms");
                continue;
            }

            foreach (var id in Numbers(test[3]).Where(wanted.Contains))
            {
                covering[id].Add((int.Parse(test[0]), milliseconds));
            }

            once.UnionWith(Numbers(test[4]).Where(wanted.Contains));
        }

        var left = new Queue<int>(wanted.Where(id => covering[id].Count > 0).Order());
        foreach (var id in once.Except(left).Where(id => !Outcomes.ContainsKey(id)).Order())
        {
            Note(id, OnlyOnce, "");
        }

        var spoilt = new HashSet<int>();
        while (left.Count > 0)
        {
            var plan = Path.Combine(work, "plan");
            File.WriteAllLines(plan, left.Select(id => $"{id}\t{string.Join('\t', covering[id].OrderBy(test => test.Milliseconds).Select(test => $"{test.Test}:{test.Milliseconds}"))}"));
            var current = 0;
            foreach (var said in project.Run("try", plan))
            {
                current = int.Parse(said[0]);
                if (said[1] == "tried")
                {
                    continue;
                }

                if (said[1] == "spoilt" && spoilt.Add(current))
                {
                    // Once more, in a process where it comes first.
                    current = 0;
                    continue;
                }

                Note(current, said[1] == "spoilt" ? "killed" : said[1], said.Length > 2 ? said[2] : "");
                left.Dequeue();
                current = 0;
            }

            if (current != 0)
            {
                Note(current, "crashed", "");
                left.Dequeue();
            }
        }
    }

    private void Note(int id, string outcome, string test)
    {
        Outcomes[id] = outcome;
        log.WriteLine($"{id}\t{outcome}\t{test}");
        log.Flush();
    }

    private static IEnumerable<int> Numbers(string list) => list.Split(' ', StringSplitOptions.RemoveEmptyEntries).Select(int.Parse);
}
