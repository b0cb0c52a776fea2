using System.Collections.Concurrent;
using System.Text.Json;
using NJsonSchema;

namespace Auditor.Documents;

/// <summary>
/// What may be said in a kind of file. JSON Schema draft-07 without the keywords that the validator does not check, and with these
/// more: <c>quantity</c> (the name of a <see cref="QuantityKind"/>), and beside it <c>signed</c>, <c>may-be-zero</c>, <c>at-least</c>
/// and <c>at-most</c>. Safe to use from several threads.
/// </summary>
public sealed class Schema
{
    private readonly QuickSchema _quick;
    private readonly Lazy<(JsonSchema Schema, NodeValidator Validator)> _explaining;
    private readonly ConcurrentDictionary<JsonSchema, QuantityRule?> _rules = new(ReferenceEqualityComparer.Instance);

    private Schema(QuickSchema quick, string text)
    {
        _quick = quick;
        _explaining = new(() => (JsonSchema.FromJsonAsync(text, ".", schema => new LocalReferences(schema)).GetAwaiter().GetResult(), new NodeValidator(RuleOf)));
    }

    /// <summary>Reads a schema.</summary>
    /// <exception cref="InvalidDataException">The text is not a schema, or asks for what is not supported; the message says where.</exception>
    public static Schema Parse(SourceText jsonText)
    {
        try
        {
            using var json = JsonDocument.Parse(jsonText.Text);
            SchemaKeywords.Check(json.RootElement);
            return new Schema(new QuickSchemaReader(json.RootElement).Read(), jsonText.Text);
        }
        catch (JsonException fault)
        {
            throw new InvalidDataException($"{jsonText.Path}:{fault.LineNumber + 1}:{fault.BytePositionInLine + 1}: the text is not JSON", fault);
        }
        catch (Exception fault) when (fault is InvalidDataException or InvalidOperationException or ArgumentException)
        {
            throw new InvalidDataException($"{jsonText.Path}: {fault.Message}", fault);
        }
    }

    /// <summary>Checks a document against the schema.</summary>
    /// <param name="root">The root value of the document.</param>
    /// <param name="problems">
    /// Receives every place where the document departs from the schema. What a partial mapping or list seems to lack is not reported.
    /// </param>
    public void Validate(Node root, Problems problems)
    {
        if (Look(root) != Acceptance.Yes)
        {
            Explain(RefusedParts.Of(root, _quick), problems);
        }
    }

    /// <summary>Looks whether the schema takes a document.</summary>
    internal Acceptance Look(Node root) => _quick.Look(root);

    /// <summary>Has the validator check a document, which tells what is wrong with it.</summary>
    internal void Explain(Node root, Problems problems)
    {
        var (schema, validator) = _explaining.Value;
        foreach (var error in ErrorUnfolding.Unfold(validator.Validate(NodeTokens.From(root), schema)))
        {
            problems.Add(SchemaProblems.Word(error));
        }
    }

    private QuantityRule? RuleOf(JsonSchema schema) => schema.ExtensionData is { } keywords && keywords.ContainsKey("quantity")
        ? _rules.GetOrAdd(schema, _ => QuantityRule.From(name => (keywords.TryGetValue(name, out var value), value)))
        : null;

    /// <summary>Keeps references inside the schema: nothing is read from another file or from the network.</summary>
    private sealed class LocalReferences(JsonSchema schema) : JsonReferenceResolver(new JsonSchemaAppender(schema, new DefaultTypeNameGenerator()))
    {
        public override Task<NJsonSchema.References.IJsonReference> ResolveFileReferenceAsync(string filePath, CancellationToken cancellationToken = default)
            => throw new NotSupportedException("`$ref` refers to the same file only");

        public override Task<NJsonSchema.References.IJsonReference> ResolveUrlReferenceAsync(string url, CancellationToken cancellationToken = default)
            => throw new NotSupportedException("`$ref` refers to the same file only");
    }
}
