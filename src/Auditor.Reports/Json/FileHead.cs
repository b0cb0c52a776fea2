using Auditor.Engine.Installation;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Json;

/// <summary>Writes what files for programs say first.</summary>
internal static class FileHead
{
    /// <summary>By which tool, from which files, and by which rule set.</summary>
    public static void Write(JsonOutput output, Design design)
    {
        Source(output);
        output.Object("ruleSet", () =>
        {
            var title = design.Evaluator.Rules.Title;
            output.Text("name", title.Id);
            output.TextOrNull("edition", title.Edition);
            output.Text("sha256", title.Sha256);
        });
    }

    /// <summary>By which tool, and from which files.</summary>
    public static void Source(JsonOutput output)
    {
        output.Object("tool", () =>
        {
            output.Text("name", ThisTool.Name);
            output.Text("version", ThisTool.Version);
        });
        output.Array("inputs", output.Places.Inputs, file => output.Object(null, () =>
        {
            output.Text("path", file.Path);
            output.Text("sha256", file.Sha256);
        }));
    }
}
