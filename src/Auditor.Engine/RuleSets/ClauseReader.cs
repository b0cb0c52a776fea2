using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads the clause of a quantity or rule.</summary>
internal static class ClauseReader
{
    public static Clause Read(MappingNode owner)
    {
        var clause = owner.Mapping("clause");
        return new Clause(clause?.Text("type") ?? "", clause?.Texts("references") ?? [], clause?.Text("note") ?? "");
    }
}
