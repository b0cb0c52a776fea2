using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Tests;

/// <summary>A subject that is what a test says of it; anything not said is missing.</summary>
internal sealed class Thing : ISubject
{
    private readonly Dictionary<string, Value> _said = [];
    private readonly Dictionary<string, Thing> _ways = [];
    private readonly Dictionary<string, List<Thing>> _lists = [];

    public Thing(SubjectShape shape, string key = "T")
    {
        Shape = shape;
        Key = key;
        Scope = new Scope(this, null, null);
    }

    public SubjectShape Shape { get; }

    public string Key { get; }

    public Scope Scope { get; }

    /// <summary>How often a quantity was asked for.</summary>
    public int Asked { get; private set; }

    /// <summary>Says inputs, quantities and parameters by their names in formulas, each as a design file would: <c>Z = 0.4 ohm, assumed</c>.</summary>
    public Thing Say(params (string Name, string Text)[] said)
    {
        foreach (var (name, text) in said)
        {
            _said[name] = Read(text);
        }

        return this;
    }

    public Thing Say(string name, Value value)
    {
        _said[name] = value;
        return this;
    }

    public Thing Join(string way, Thing there)
    {
        _ways[way] = there;
        return this;
    }

    public Thing Hold(string list, params Thing[] items)
    {
        _lists[list] = [.. items];
        return this;
    }

    public Value Input(int slot) => Of(Shape.Inputs[slot].Name, AbsenceKind.Input, "is not given");

    public Value Quantity(int slot)
    {
        Asked++;
        return Of(Shape.Quantities[slot].Symbol, AbsenceKind.Input, "is not known");
    }

    public Value Parameter(int slot) => Of("param." + Plant.Parameters.Values.Single(parameter => parameter.Index == slot).Name, AbsenceKind.Input, "is not set");

    public ISubject? Go(int way) => _ways.GetValueOrDefault(Shape.Ways.Single(each => each.Index == way).Name);

    public IReadOnlyList<ISubject> Collection(int index) =>
        _lists.GetValueOrDefault(Shape.Collections.Single(each => each.Index == index).Name) ?? [];

    private Value Of(string name, AbsenceKind kind, string why) =>
        _said.TryGetValue(name, out var value) ? value : Value.Missing(new Absence(kind, Key, name, $"`{name}` {why}", ""));

    private static Value Read(string text)
    {
        if (text is "true" or "false")
        {
            return Value.Of(text == "true");
        }

        return QuantityText.TryParse(text, out var stated, out _)
            ? Value.Of(stated.Quantity.Value, stated.Standing == Standing.Assumed ? Marks.Assumed : Marks.None)
            : Value.Of(text);
    }
}
