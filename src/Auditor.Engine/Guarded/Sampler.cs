using Auditor.Engine.Findings;
using Auditor.Engine.Variation;
using MathNet.Numerics.Distributions;
using MathNet.Numerics.Random;

namespace Auditor.Engine.Guarded;

/// <summary>
/// Draws designs at random from within the tolerances, all inputs at once and each by itself, and counts in how many each rule is kept
/// (JCGM 101). The same seed gives the same counts, however many threads there are.
/// </summary>
public static class Sampler
{
    private const int Block = 128;

    /// <summary>The shares of the rules.</summary>
    /// <param name="map">The map of the design.</param>
    /// <param name="inputs">Its toleranced inputs.</param>
    /// <param name="rules">The rules to judge in every sample.</param>
    /// <param name="samples">How many samples to draw.</param>
    /// <param name="seed">Where the random numbers begin.</param>
    public static IReadOnlyDictionary<RuleAt, SampleShare> Run(
        DependencyMap map, IReadOnlyList<TolerancedInput> inputs, IReadOnlyList<RuleAt> rules, int samples, int seed)
    {
        var kept = new int[rules.Count];
        var blocks = (samples + Block - 1) / Block;
        Parallel.For(0, blocks, () => (Probe: new Probe(map, inputs, []), Kept: new int[rules.Count]), (block, _, own) =>
        {
            Draw(own.Probe, rules, Math.Min(Block, samples - (block * Block)), new Xoshiro256StarStar(seed + block), own.Kept);
            return own;
        }, own =>
        {
            for (var i = 0; i < kept.Length; i++)
            {
                Interlocked.Add(ref kept[i], own.Kept[i]);
            }
        });
        return rules.Select((at, i) => (at, new SampleShare(samples, kept[i]))).ToDictionary(pair => pair.at, pair => pair.Item2);
    }

    private static void Draw(Probe probe, IReadOnlyList<RuleAt> rules, int samples, Xoshiro256StarStar random, int[] kept)
    {
        for (var sample = 0; sample < samples; sample++)
        {
            for (var input = 0; input < probe.Inputs.Count; input++)
            {
                probe.Move(input, Draw(probe.Inputs[input], random));
            }

            for (var i = 0; i < rules.Count; i++)
            {
                if (probe.Judge(rules[i]).Verdict is null or Verdict.Conforms)
                {
                    kept[i]++;
                }
            }
        }
    }

    private static double Draw(TolerancedInput input, Xoshiro256StarStar random)
    {
        if (input.Kind == ToleranceKind.Stated)
        {
            return ContinuousUniform.Sample(random, input.Low, input.High);
        }

        const double coverage = 2;
        return Normal.Sample(random, input.Stated, (input.High - input.Stated) / coverage);
    }
}
