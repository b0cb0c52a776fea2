using System.Diagnostics;
using System.Globalization;

namespace Auditor.Fuzz.Tests;

/// <summary>
/// Bad inputs of every kind that the program reads get a result or problems: no exception, no waiting, and no more memory than
/// <see cref="MostMemory"/>, which the runtime of this test enforces as well. `AUDITOR_FUZZ` is how many inputs, shared out among
/// the kinds; `AUDITOR_FUZZ_SEED` where chance begins.
/// </summary>
public sealed class FuzzTests(ITestOutputHelper output)
{
    private const long MostMemory = 1L << 30;
    private const int Whole = 1000;

    private static readonly int Count = Number("AUDITOR_FUZZ", 8_000);
    private static readonly int Seed = Number("AUDITOR_FUZZ_SEED", 20261201);

    public static TheoryData<string> Kinds => [.. FuzzKinds.All.Select(kind => kind.Name)];

    [Theory]
    [MemberData(nameof(Kinds))]
    public void Bad_inputs_get_a_result_or_problems(string name)
    {
        var (_, share, open) = FuzzKinds.All.Single(kind => kind.Name == name);
        using var kind = open();

        var run = new FuzzRun(name, kind, Math.Max(1, (int)((long)Count * share / Whole)), Seed);
        output.WriteLine(run.Execute());

        Assert.Empty(run.Faults);
        Assert.InRange(Process.GetCurrentProcess().PeakWorkingSet64, 1, MostMemory);
    }

    /// <summary>The first of what a kind begins with is without fault; else nothing beyond the first fault would ever be reached.</summary>
    [Theory]
    [MemberData(nameof(Kinds))]
    public void Inputs_are_made_of_a_good_one_and_others(string name)
    {
        using var kind = FuzzKinds.All.Single(kind => kind.Name == name).Open();

        Assert.NotEmpty(kind.Seeds);
        Assert.Equal(Judgement.Taken, kind.Judge(kind.Seeds[0]));
    }

    [Fact]
    public void The_shares_make_up_the_whole() => Assert.Equal(Whole, FuzzKinds.All.Sum(kind => kind.Share));

    private static int Number(string variable, int otherwise) =>
        int.TryParse(Environment.GetEnvironmentVariable(variable), NumberStyles.None, CultureInfo.InvariantCulture, out var number) ? number : otherwise;
}
