using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>A file of rule data that its schema has accepted.</summary>
/// <param name="Kind">What it is: lookup, table, curve, sheet, rule, adjustment, picture, set or register.</param>
/// <param name="Root">Its root mapping.</param>
/// <param name="Sha256">The SHA-256 of its bytes, in lower-case hexadecimal.</param>
internal sealed record RuleFile(string Kind, MappingNode Root, string Sha256)
{
    /// <summary>Display path.</summary>
    public string Path => Root.Span.Source.Path;
}
