namespace Auditor.Reports.Templates;

/// <summary>Text taken from a file in the folder of the template, or computed from one: as trustworthy as the template itself.</summary>
/// <param name="Text">The text.</param>
internal sealed record InlinedFile(string Text)
{
    public override string ToString() => Text;
}
