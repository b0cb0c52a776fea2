using Scriban.Syntax;

namespace Auditor.Reports.Templates;

/// <summary>
/// Finds the statements that catch output as text. Such text is inserted once more, and nobody could tell any longer which of it is markup
/// of the template and which came from the design.
/// </summary>
internal sealed class RefusedStatements : ScriptVisitor
{
    private readonly List<(Scriban.Parsing.SourceSpan Span, string Word)> _found = [];

    public IReadOnlyList<(Scriban.Parsing.SourceSpan Span, string Word)> Found => _found;

    public override void Visit(ScriptFunction node) => _found.Add((node.Span, node.NameOrDoToken is ScriptKeyword ? "do" : "func"));

    public override void Visit(ScriptAnonymousFunction node) => _found.Add((node.Span, "do"));

    public override void Visit(ScriptCaptureStatement node) => _found.Add((node.Span, "capture"));

    public override void Visit(ScriptWrapStatement node) => _found.Add((node.Span, "wrap"));
}
