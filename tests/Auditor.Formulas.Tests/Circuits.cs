using CsCheck;

namespace Auditor.Formulas.Tests;

/// <summary>Random circuits, of which anything may be missing.</summary>
internal static class Circuits
{
    private static readonly string[] Texts = ["ring", "radial", "B", "C", "EN 60898", "BS 88-3", "any", ""];

    /// <summary>Values of the inputs that plain formulas name.</summary>
    public static Gen<Dictionary<string, double>> Values { get; } =
        Gen.OneOf(Gen.Int[-9, 9].Select(number => (double)number), Gen.Double[-1e3, 1e3], Gen.OneOf(0.0, 1e150, -1e-150)).Array[Grammar.Names.Length]
            .Select(Gen.Int[0, 9].Array[Grammar.Names.Length], (numbers, dice) => Grammar.Names.Select((name, i) => (name.Name, numbers[i], dice[i]))
                .Where(entry => entry.Item3 > 1).ToDictionary(entry => entry.Name, entry => entry.Item2));

    public static Gen<Thing> Any { get; } = Gen.Select(Gen.Int, Gen.Int[0, 10]).Select(pair => Make(new Random(pair.Item1), pair.Item2));

    public static Thing Of(Dictionary<string, double> values)
    {
        var circuit = new Thing(Plant.Circuit);
        foreach (var (name, value) in values)
        {
            circuit.Say(name, Formulas.Values.Value.Of(value));
        }

        return circuit;
    }

    private static Thing Make(Random random, int sparse)
    {
        var origin = Said(new Thing(Plant.Installation, "-"), random, sparse);
        var root = Said(new Thing(Plant.Board, "MSB"), random, sparse).Join("up", origin).Join("origin", origin);
        var feeder = Said(new Thing(Plant.Circuit, "MSB/1"), random, sparse).Join("up", root).Join("origin", origin);
        var below = Said(new Thing(Plant.Board, "DB"), random, sparse).Join("up", feeder).Join("origin", origin);
        feeder.Hold("legs", [.. Enumerable.Range(0, random.Next(4)).Select(_ => Said(new Thing(Plant.Leg), random, sparse).Join("up", feeder))]);
        return random.Next(2) == 0 ? feeder : feeder.Join("fed", below);
    }

    private static Thing Said(Thing thing, Random random, int sparse)
    {
        var slots = thing.Shape.Inputs.Select(input => (input.Name, input.Type)).Concat(thing.Shape.Quantities.Select(slot => (Name: slot.Symbol, slot.Type)))
            .Concat(Plant.Parameters.Values.Select(slot => (Name: "param." + slot.Name, slot.Type)));
        foreach (var (name, type) in slots.Where(_ => random.Next(10) >= sparse))
        {
            thing.Say(name, type.Kind switch
            {
                Types.FormulaKind.Quantity => Formulas.Values.Value.Of(random.Next(5) == 0 ? 0 : (random.NextDouble() - 0.3) * Math.Pow(10, random.Next(-6, 7))),
                Types.FormulaKind.Text => Formulas.Values.Value.Of(Texts[random.Next(Texts.Length)]),
                Types.FormulaKind.Words => Formulas.Values.Value.Of(random.Next(2) == 0 ? [] : ["lighting"]),
                _ => Formulas.Values.Value.Of(random.Next(2) == 0),
            });
        }

        return thing;
    }
}
