namespace Auditor.Reports.Templates;

/// <summary>Text that has been made inert already.</summary>
/// <param name="Text">The text.</param>
internal sealed record Markup(string Text)
{
    public override string ToString() => Text;
}
