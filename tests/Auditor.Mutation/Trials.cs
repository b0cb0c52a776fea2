using System.Diagnostics;
using System.Reflection;

namespace Auditor.Mutation;

/// <summary>
/// What a process of its own does within the folder of a test project: tell which tests come by which mutants, or try mutants one after
/// the other. It says each result on a line of its own that begins with <see cref="Prefix"/>.
/// </summary>
internal sealed class Trials
{
    public const string Prefix = "@@ ";

    private const int ShortestLimit = 20_000;
    private const int Slice = 200;

    private readonly FieldInfo _active;
    private readonly FieldInfo _seen;
    private readonly IReadOnlyList<TestCase> _tests;
    private readonly HashSet<int> _warm = [];

    /// <summary>Loads the tests.</summary>
    /// <param name="wanted">Name of their assembly, and after a colon those of the classes, where not all are wanted.</param>
    public Trials(string wanted)
    {
        var at = Assembly.Load("Auditor.Formulas").GetType(Switch.FullName)!;
        _active = at.GetField("Active")!;
        _seen = at.GetField("Seen")!;
        var parts = wanted.Split(':');
        _tests = TestCase.In(Assembly.Load(parts[0]), parts.Length > 1 ? parts[1].Split(',') : []);
    }

    /// <summary>For each test: whether it passes without a mutant, its milliseconds, and the mutants that it comes by each time it runs.</summary>
    /// <param name="most">The greatest number of a mutant.</param>
    public void Cover(int most)
    {
        for (var number = 0; number < _tests.Count; number++)
        {
            // The first time what is made once is made; a mutant there is met by whichever test comes first, and by no other.
            var seenOnce = Run(number, most, out _, out _);
            var seen = Run(number, most, out var thrown, out var milliseconds);
            Say($"{number}\t{(thrown is null ? "passes" : $"fails: {thrown.GetBaseException().Message.ReplaceLineEndings(" ")}")}\t{milliseconds}\t{Numbers(seen)}\t{Numbers(seenOnce)}\t{_tests[number].Name}");
        }
    }

    /// <summary>Tries mutants: a line before each, and one after it with what came of it.</summary>
    /// <param name="plan">Lines of a mutant, then the numbers of its tests with the milliseconds that each takes, the quickest first.</param>
    public void Try(IEnumerable<string> plan)
    {
        foreach (var line in plan)
        {
            var parts = line.Split('\t');
            Say($"{parts[0]}\ttried");
            Say($"{parts[0]}\t{Outcome(int.Parse(parts[0]), parts[1..])}");
        }
    }

    private string Outcome(int mutant, string[] tests)
    {
        foreach (var (number, milliseconds) in tests.Select(test => test.Split(':')).Select(pair => (int.Parse(pair[0]), int.Parse(pair[1]))))
        {
            if (_warm.Add(number))
            {
                _tests[number].Run();
            }

            _active.SetValue(null, mutant);
            Exception? thrown = null;
            var thread = new Thread(() => thrown = _tests[number].Run(), maxStackSize: 8 << 20);
            thread.Start();
            if (!EndsWithin(ShortestLimit + (30 * milliseconds), thread))
            {
                Say($"{mutant}\ttimeout\t{_tests[number].Name}");
                Environment.Exit(0);
            }

            _active.SetValue(null, 0);
            if (thrown is null)
            {
                continue;
            }

            if (_tests[number].Run() is not null)
            {
                // What the mutant left behind in what is made once would make every later one look found.
                Say($"{mutant}\tspoilt\t{_tests[number].Name}");
                Environment.Exit(0);
            }

            return $"killed\t{_tests[number].Name}";
        }

        return "survived";
    }

    /// <summary>In slices: while the whole process is paused no time passes.</summary>
    private static bool EndsWithin(int milliseconds, Thread thread)
    {
        for (var waited = 0; waited < milliseconds; waited += Slice)
        {
            if (thread.Join(Slice))
            {
                return true;
            }
        }

        return false;
    }

    private bool[] Run(int number, int most, out Exception? thrown, out long milliseconds)
    {
        var seen = new bool[most + 1];
        _seen.SetValue(null, seen);
        var watch = Stopwatch.StartNew();
        thrown = _tests[number].Run();
        milliseconds = watch.ElapsedMilliseconds;
        _seen.SetValue(null, null);
        return seen;
    }

    private static string Numbers(bool[] seen) => string.Join(' ', Enumerable.Range(0, seen.Length).Where(number => seen[number]));

    private static void Say(string line)
    {
        Console.Out.WriteLine(Prefix + line);
        Console.Out.Flush();
    }
}
