using Auditor.Engine.Installation;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Json;

/// <summary>Writes what files of limits and of remedies say first: by which tool, from which files, by which rule set.</summary>
internal static class FileHead
{
    public static void Write(JsonOutput output, Design design)
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
        output.Object("ruleSet", () =>
        {
            var title = design.Evaluator.Rules.Title;
            output.Text("name", title.Id);
            output.TextOrNull("edition", title.Edition);
            output.Text("sha256", title.Sha256);
        });
    }
}
