using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>A file of rule data that its schema has accepted.</summary>
/// <param name="Kind">What it is: lookup, table, curve, sheet, rule, adjustment or picture.</param>
/// <param name="Root">Its root mapping.</param>
internal sealed record RuleFile(string Kind, MappingNode Root)
{
    /// <summary>Display path.</summary>
    public string Path => Root.Span.Source.Path;
}
