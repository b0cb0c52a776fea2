using System.Text.Json;
using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Engine.Installation;

/// <summary>Walks the object definition of one kind of subject and adds every input that it allows.</summary>
internal sealed class SchemaInputs(JsonElement root, SubjectShape shape, List<InputPlace?> places)
{
    /// <summary>Adds the inputs of the shape.</summary>
    public void Read()
    {
        if (DefinitionOf(shape.Name) is { } definition)
        {
            var types = Types(definition);
            Walk(definition, [], types is null ? -1 : 0, types);
        }
    }

    private JsonElement? DefinitionOf(string subject)
    {
        if (Subject(root) == subject)
        {
            return root;
        }

        foreach (var property in root.GetProperty("definitions").EnumerateObject())
        {
            if (Subject(property.Value) == subject)
            {
                return property.Value;
            }
        }

        return null;
    }

    private void Walk(JsonElement definition, IReadOnlyList<string> path, int namedAt, string? types)
    {
        if (!definition.TryGetProperty("properties", out var properties))
        {
            return;
        }

        foreach (var property in properties.EnumerateObject())
        {
            var isTypeName = property.Name == "type" && namedAt == path.Count;
            if (property.Name != "include" && !isTypeName)
            {
                Add(Resolve(property.Value), [.. path, property.Name], namedAt, types);
            }
        }
    }

    private void Add(JsonElement schema, IReadOnlyList<string> path, int namedAt, string? types)
    {
        if (schema.TryGetProperty("oneOf", out var alternatives))
        {
            foreach (var alternative in alternatives.EnumerateArray())
            {
                Add(Resolve(alternative), path, namedAt, types);
            }

            return;
        }

        if (Subject(schema) is not null || !schema.TryGetProperty("type", out var type))
        {
            return;
        }

        if (type.ValueKind == JsonValueKind.String && type.GetString() == "object")
        {
            var ownTypes = Types(schema);
            AddSlot(path, FormulaType.Group, null, new InputPlace(path, namedAt, types, InputBounds.None));
            Walk(schema, path, ownTypes is null ? namedAt : path.Count, ownTypes ?? types);
        }
        else if (TypeOf(schema, type) is var (input, unit))
        {
            AddSlot(path, input, unit, new InputPlace(path, namedAt, types, Bounds(schema)));
        }
    }

    private void AddSlot(IReadOnlyList<string> path, FormulaType type, Unit? unit, InputPlace place)
    {
        if (shape.AddInput(string.Join('.', path), type, unit))
        {
            places.Add(place);
        }
    }

    /// <summary>What the schema allows of a quantity. One that is not <c>signed</c> is never negative, but for temperatures.</summary>
    private static InputBounds Bounds(JsonElement schema)
    {
        if (!schema.TryGetProperty("quantity", out var kind))
        {
            return InputBounds.None;
        }

        var isSigned = schema.TryGetProperty("signed", out var signed) && signed.GetBoolean();
        var least = isSigned || QuantityKind.Find(kind.GetString()!) is { Dimension.IsTemperature: true } ? double.NegativeInfinity : 0;
        return new InputBounds(Bound(schema, "at-least") ?? least, Bound(schema, "at-most") ?? double.PositiveInfinity);
    }

    private static double? Bound(JsonElement schema, string name) =>
        schema.TryGetProperty(name, out var bound) && QuantityText.TryParse(bound.GetString()!, out var stated, out _) ? stated.Quantity.Value : null;

    private (FormulaType Type, Unit? Unit)? TypeOf(JsonElement schema, JsonElement type)
    {
        if (schema.TryGetProperty("quantity", out var quantity) && QuantityKind.Find(quantity.GetString()!) is { } kind)
        {
            return (FormulaType.Of(kind.Dimension), ShownIn(schema) ?? UsualUnit(kind));
        }

        var word = type.ValueKind == JsonValueKind.Array ? type.EnumerateArray().First().GetString() : type.GetString();
        return word switch
        {
            "string" => (Words(schema) is { } words ? FormulaType.OneOf(words) : FormulaType.Text, null),
            "boolean" => (FormulaType.Flag, null),
            "integer" or "number" => (FormulaType.Number, Unit.One),
            "array" => ListType(schema) is { } list ? (list, null) : null,
            _ => null,
        };
    }

    /// <summary>The unit that the schema asks to show the input in, where the usual one of its kind would read badly (30 mA).</summary>
    private static Unit? ShownIn(JsonElement schema) =>
        schema.TryGetProperty("shown-in", out var unit) ? UnitCatalog.Find(unit.GetString()!) : null;

    private static Unit UsualUnit(QuantityKind kind) =>
        QuantityText.TryParse(kind.Example, out var example, out _) ? example.Unit : UnitCatalog.Of(kind.Dimension)[0];

    private FormulaType? ListType(JsonElement schema)
    {
        if (!schema.TryGetProperty("items", out var items))
        {
            return null;
        }

        return Words(Resolve(items)) is { } words ? FormulaType.WordsOf(words) : null;
    }

    private static List<string>? Words(JsonElement schema) =>
        schema.TryGetProperty("enum", out var allowed) ? [.. allowed.EnumerateArray().Select(word => word.ToString())] : null;

    private JsonElement Resolve(JsonElement schema)
    {
        while (schema.TryGetProperty("$ref", out var reference))
        {
            schema = root.GetProperty("definitions").GetProperty(reference.GetString()!["#/definitions/".Length..]);
        }

        return schema;
    }

    private static string? Subject(JsonElement schema) => schema.TryGetProperty("subject", out var subject) ? subject.GetString() : null;

    private static string? Types(JsonElement schema) => schema.TryGetProperty("named", out var named) ? named.GetString() : null;
}
