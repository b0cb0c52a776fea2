namespace Auditor.Documents;

/// <summary>What may be said in a kind of file.</summary>
public sealed class Schema
{
    /// <summary>Reads a schema (JSON Schema draft-07, the part that this project uses).</summary>
    public static Schema Parse(SourceText jsonText) => throw new NotSupportedException(jsonText.Path);

    /// <summary>Checks a document against the schema.</summary>
    public void Validate(Node root, Problems problems) => throw new NotSupportedException(root.Span.Text);
}
