using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Json;

/// <summary>Reads findings files that <see cref="FindingsJson"/> wrote, to be compared with.</summary>
public static class FindingsFile
{
    private const string SchemaName = "findings";

    /// <summary>Reads a findings file.</summary>
    /// <param name="fullPath">Where it lies.</param>
    /// <param name="displayPath">The path to show in problems and reports.</param>
    /// <param name="home">Where the schema of findings files stands.</param>
    /// <param name="problems">Receives what is wrong; never throws for a bad file.</param>
    /// <returns>What it tells of the revision that was audited; null when it cannot be read.</returns>
    public static Revision? Read(string fullPath, string displayPath, RuleHome home, Problems problems)
    {
        var own = new Problems();
        var root = SourceReader.Read(fullPath, displayPath, own) is { } source ? YamlReader.Read(source, own) : null;
        if (root is not null)
        {
            home.Schema(SchemaName).Validate(root, own);
        }

        if (root is MappingNode checkable && !own.HasErrors)
        {
            FindingsCheck.Run(checkable, own);
        }

        foreach (var problem in own.All)
        {
            problems.Add(problem);
        }

        return own.HasErrors || root is not MappingNode findings ? null : new FindingsReader(displayPath, findings).Read();
    }
}
