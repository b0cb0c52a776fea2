using System.Text.Json;
using Auditor.Documents;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.Installation;

/// <summary>
/// The design schema, read for what it says about inputs: which there are at each kind of subject, and what each holds.
/// Adding an input to the schema makes it known to formulas; no code changes.
/// </summary>
public sealed class DesignSchema
{
    private readonly Dictionary<SubjectShape, List<InputPlace?>> _places = [];

    private readonly Dictionary<SubjectShape, InputTree> _trees = [];

    private readonly Dictionary<SubjectShape, int[]> _builtIn = [];

    private readonly Dictionary<SubjectShape, List<(IReadOnlyList<string> Keys, string List)>> _named = [];

    private DesignSchema(Shapes shapes, Schema validation)
    {
        Shapes = shapes;
        Validation = validation;
    }

    /// <summary>The kinds of subject, with the inputs of the schema.</summary>
    public Shapes Shapes { get; }

    /// <summary>The schema as a validator of design files.</summary>
    public Schema Validation { get; }

    /// <summary>Reads a design schema.</summary>
    /// <exception cref="JsonException">The text is not JSON.</exception>
    public static DesignSchema Parse(SourceText text)
    {
        var validation = Task.Run(() => Schema.Parse(text));
        var schema = new DesignSchema(new Shapes(), validation.GetAwaiter().GetResult());
        using var json = JsonDocument.Parse(text.Text);
        foreach (var shape in schema.Shapes.All)
        {
            var places = shape.Inputs.Select(_ => (InputPlace?)null).ToList();
            schema._places.Add(shape, places);
            new SchemaInputs(json.RootElement, shape, places).Read();
            schema._trees.Add(shape, InputTree.Of(places));
            schema._builtIn.Add(shape, [.. Enumerable.Range(0, places.Count).Where(slot => places[slot] is null)]);
            schema._named.Add(shape, Groups(places));
        }

        return schema;
    }

    /// <summary>The mappings of a kind of subject whose <c>type</c> names an entry of <c>types</c>.</summary>
    internal IReadOnlyList<(IReadOnlyList<string> Keys, string List)> NamedGroups(SubjectShape shape) => _named[shape];

    /// <summary>Where an input stands in the design file; null for those that the tree itself answers.</summary>
    internal InputPlace? PlaceOf(SubjectShape shape, int slot) => _places[shape][slot];

    /// <summary>The inputs of a kind of subject as a tree of keys.</summary>
    internal InputTree TreeOf(SubjectShape shape) => _trees[shape];

    /// <summary>Slot numbers of the inputs that the tree of subjects itself answers.</summary>
    internal IReadOnlyList<int> BuiltIn(SubjectShape shape) => _builtIn[shape];

    /// <summary>Between which values an input may lie.</summary>
    public InputBounds BoundsOf(SubjectShape shape, InputSlot slot) => PlaceOf(shape, slot.Index)?.Bounds ?? InputBounds.None;

    private static List<(IReadOnlyList<string> Keys, string List)> Groups(IEnumerable<InputPlace?> places) =>
        [.. places.Where(place => place?.Types is not null)
            .DistinctBy(place => string.Join('.', place!.Keys.Take(place.NamedAt)))
            .Select(place => ((IReadOnlyList<string>)[.. place!.Keys.Take(place.NamedAt)], place.Types!))];
}
