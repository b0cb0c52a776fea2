using System.Collections.Concurrent;
using Newtonsoft.Json;
using Newtonsoft.Json.Linq;
using NJsonSchema;

namespace Auditor.Documents;

/// <summary>
/// What may be said in a kind of file. JSON Schema draft-07 without the keywords that the validator does not check, and with these
/// more: <c>quantity</c> (the name of a <see cref="QuantityKind"/>), and beside it <c>signed</c>, <c>may-be-zero</c>, <c>at-least</c>
/// and <c>at-most</c>. Safe to use from several threads.
/// </summary>
public sealed class Schema
{
    private readonly JsonSchema _schema;
    private readonly NodeValidator _validator;
    private readonly ConcurrentDictionary<JsonSchema, QuantityRule?> _rules = new(ReferenceEqualityComparer.Instance);

    private Schema(JsonSchema schema)
    {
        _schema = schema;
        _validator = new NodeValidator(RuleOf);
    }

    /// <summary>Reads a schema.</summary>
    /// <exception cref="InvalidDataException">The text is not a schema, or asks for what is not supported; the message says where.</exception>
    public static Schema Parse(SourceText jsonText)
    {
        try
        {
            SchemaKeywords.Check(JToken.Parse(jsonText.Text));
            return new Schema(JsonSchema.FromJsonAsync(jsonText.Text, ".", schema => new LocalReferences(schema)).GetAwaiter().GetResult());
        }
        catch (JsonReaderException fault)
        {
            throw new InvalidDataException($"{jsonText.Path}:{fault.LineNumber}:{fault.LinePosition}: the text is not JSON", fault);
        }
        catch (Exception fault) when (fault is InvalidDataException or InvalidOperationException or JsonException or NotSupportedException)
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
        foreach (var error in ErrorUnfolding.Unfold(_validator.Validate(NodeTokens.From(root), _schema)))
        {
            problems.Add(SchemaProblems.Word(error));
        }
    }

    private QuantityRule? RuleOf(JsonSchema schema)
        => schema.ExtensionData is { } keywords && keywords.ContainsKey("quantity") ? _rules.GetOrAdd(schema, _ => QuantityRule.From(keywords)) : null;

    /// <summary>Keeps references inside the schema: nothing is read from another file or from the network.</summary>
    private sealed class LocalReferences(JsonSchema schema) : JsonReferenceResolver(new JsonSchemaAppender(schema, new DefaultTypeNameGenerator()))
    {
        public override Task<NJsonSchema.References.IJsonReference> ResolveFileReferenceAsync(string filePath, CancellationToken cancellationToken = default)
            => throw new NotSupportedException("`$ref` refers to the same file only");

        public override Task<NJsonSchema.References.IJsonReference> ResolveUrlReferenceAsync(string url, CancellationToken cancellationToken = default)
            => throw new NotSupportedException("`$ref` refers to the same file only");
    }
}
