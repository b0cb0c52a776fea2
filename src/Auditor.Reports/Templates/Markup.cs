namespace Auditor.Reports.Templates;

/// <summary>
/// Markup of our own making, in which every text has been made inert: the one kind of value that a template inserts as it is.
/// </summary>
/// <param name="Text">The markup.</param>
public sealed record Markup(string Text)
{
    /// <inheritdoc/>
    public override string ToString() => Text;
}
