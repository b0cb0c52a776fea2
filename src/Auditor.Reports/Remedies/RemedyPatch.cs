using System.Text;
using Auditor.Engine.Installation;
using Auditor.Engine.Remedies;

namespace Auditor.Reports.Remedies;

/// <summary>Writes a remedy as a unified diff of the design's files, for a person to apply. Comments and layout stay as they are.</summary>
public static class RemedyPatch
{
    /// <summary>Writes the diff in UTF-8.</summary>
    /// <param name="design">The design.</param>
    /// <param name="remedy">The remedy.</param>
    /// <param name="pathOf">Gives the path to write for the display path of a file.</param>
    public static byte[] Write(Design design, Remedy remedy, Func<string, string> pathOf) => Encoding.UTF8.GetBytes(string.Concat(
        DesignEdits.Of(design, remedy.Inputs).Select(file => UnifiedDiff.Write(pathOf(file.Before.Path), file.Before.Text, file.After))));
}
