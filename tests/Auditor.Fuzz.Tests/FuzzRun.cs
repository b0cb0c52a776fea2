using System.Diagnostics;

namespace Auditor.Fuzz.Tests;

/// <summary>Has a kind judge its inputs one after the other, on a thread of its own, which the caller watches.</summary>
/// <param name="name">Name of the kind.</param>
/// <param name="kind">The kind.</param>
/// <param name="count">How many inputs.</param>
/// <param name="seed">Where chance begins.</param>
internal sealed class FuzzRun(string name, FuzzKind kind, int count, int seed)
{
    private const int MostFaults = 20;

    /// <summary>No input may take more, in time of the processor: the clock runs on while others have the processor.</summary>
    private static readonly TimeSpan Longest = TimeSpan.FromSeconds(10);

    /// <summary>No input may take more by the clock: one that waits takes no time of the processor.</summary>
    private static readonly TimeSpan LongestWait = TimeSpan.FromMinutes(5);

    /// <summary>An input that takes more is kept in a file, for somebody to look at.</summary>
    private static readonly TimeSpan Slow = TimeSpan.FromSeconds(1);

    private static readonly TimeSpan BetweenLooks = TimeSpan.FromMilliseconds(200);

    private readonly string _keep = Path.Combine(Path.GetTempPath(), $"auditor-fuzz-{name.Replace(' ', '-')}-{seed}");
    private readonly int[] _judged = new int[3];
    private readonly Lock _lock = new();
    private (TimeSpan Processor, long Clock) _began;
    private (TimeSpan Time, int Input) _slowest;

    /// <summary>What went wrong, each with the file in which its input is kept.</summary>
    public List<string> Faults { get; } = [];

    /// <summary>Goes through all inputs.</summary>
    /// <returns>A line that tells how it went.</returns>
    /// <exception cref="TimeoutException">An input does not come to an end.</exception>
    public string Execute()
    {
        var watch = Stopwatch.StartNew();
        var before = Environment.CpuUsage.TotalTime;
        Begin();
        var worker = new Thread(JudgeAll) { IsBackground = true };
        worker.Start();
        while (!worker.Join(BetweenLooks))
        {
            lock (_lock)
            {
                if (Environment.CpuUsage.TotalTime - _began.Processor > Longest || Stopwatch.GetElapsedTime(_began.Clock) > LongestWait)
                {
                    throw new TimeoutException($"an input does not come to an end; it is kept in {_keep}-last.bin");
                }
            }
        }

        var spent = Environment.CpuUsage.TotalTime - before;
        File.Delete(_keep + "-last.bin");
        return $"{name}: {count} inputs from seed {seed}, {_judged[(int)Judgement.Taken]} with a result, {_judged[(int)Judgement.Refused]} with problems, {Faults.Count} faults; "
            + $"{spent.TotalMilliseconds * 1000 / count:0} µs of processor each, the slowest (number {_slowest.Input}) {_slowest.Time.TotalMilliseconds:0} ms; {watch.Elapsed.TotalSeconds:0} s; "
            + $"peak memory {Process.GetCurrentProcess().PeakWorkingSet64 / (1024 * 1024)} MiB";
    }

    private void JudgeAll()
    {
        var mutator = new Mutator(kind.Seeds, new Random(seed));
        using var last = new LastInput(_keep + "-last.bin");
        for (var i = 0; i < count && Faults.Count < MostFaults; i++)
        {
            var input = mutator.Next();
            last.Keep(input);
            Begin();
            try
            {
                var judgement = kind.Judge(input);
                _judged[(int)judgement]++;
                if (judgement == Judgement.Neither)
                {
                    KeepFault(i, input, "neither a result nor a problem");
                }
            }
            catch (Exception fault)
            {
                KeepFault(i, input, fault.ToString());
            }

            var time = Environment.CpuUsage.TotalTime - _began.Processor;
            if (time > Slow)
            {
                File.WriteAllBytes($"{_keep}-{i}-slow.bin", input);
            }

            _slowest = time > _slowest.Time ? (time, i) : _slowest;
        }
    }

    private void Begin()
    {
        lock (_lock)
        {
            _began = (Environment.CpuUsage.TotalTime, Stopwatch.GetTimestamp());
        }
    }

    private void KeepFault(int number, byte[] input, string fault)
    {
        var path = $"{_keep}-{number}.bin";
        File.WriteAllBytes(path, input);
        Faults.Add($"input {number}, kept in {path}: {fault}");
    }
}
