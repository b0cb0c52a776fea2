using Auditor.Cli.Importing;
using Auditor.Documents;

namespace Auditor.Cli.Starting;

/// <summary>The design files to start from. Each is a whole design, so that the audit of a new file shows what it looks at.</summary>
internal static class StartingDesign
{
    private const string Title = "Name of the job";

    /// <summary>The text of a design file.</summary>
    /// <param name="phases">Number of phases of the supply.</param>
    /// <param name="title">What to call the job.</param>
    /// <returns>The text; null when there is none for that number of phases.</returns>
    public static string? Text(int phases, string title)
    {
        using var stream = typeof(StartingDesign).Assembly.GetManifestResourceStream($"{phases}-phase.design.yaml");
        if (stream is null)
        {
            return null;
        }

        using var reader = new StreamReader(stream);
        var scalar = new ScalarNode(new SourceText("", title).WholeSpan(), title, ScalarKind.Text);
        return reader.ReadToEnd().Replace($"title: {Title}\n", $"title: {DesignText.Scalar(scalar)}\n", StringComparison.Ordinal);
    }
}
