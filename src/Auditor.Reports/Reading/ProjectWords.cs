using Auditor.Documents;
using Auditor.Engine.Installation;

namespace Auditor.Reports.Reading;

/// <summary>What a design says of the job.</summary>
internal static class ProjectWords
{
    /// <summary>Finds what the design says under a key of <c>project</c>; null where it says nothing.</summary>
    public static Func<string, string?> Of(Design design)
    {
        var project = design.File.Root.Mapping("project");
        return key => project?.Text(key);
    }
}
