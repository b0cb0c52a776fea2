using Auditor.Reports.Files;

namespace Auditor.Reports.Templates;

/// <summary>A template, or a file that stands beside one.</summary>
/// <param name="FullPath">Where it lies.</param>
/// <param name="DisplayPath">The path to show in problems.</param>
public sealed record TemplateFile(string FullPath, string DisplayPath)
{
    /// <summary>The shipped template of a format.</summary>
    /// <exception cref="ArgumentException">The format is not written from a template.</exception>
    public static TemplateFile Shipped(ReportFormat format) =>
        ShippedAs(format.TemplateName ?? throw new ArgumentException($"no template writes {format.Ending}", nameof(format)));

    /// <summary>The shipped template of the report on limits, in Markdown.</summary>
    public static TemplateFile ShippedLimits { get; } = ShippedAs("limits.scriban-md");

    /// <summary>The shipped template of the report on remedies, in Markdown.</summary>
    public static TemplateFile ShippedRemedies { get; } = ShippedAs("remedies.scriban-md");

    /// <summary>The template at a path that the caller gives.</summary>
    public static TemplateFile At(string path) => new(Path.GetFullPath(path), path.Replace('\\', '/'));

    internal static TemplateFile ShippedAs(string name) => new(Path.Combine(AppContext.BaseDirectory, "templates", name), "templates/" + name);

    /// <summary>A file of that name, or path relative to the template, in the folder of the template.</summary>
    internal TemplateFile Beside(string name) => new(
        Path.GetFullPath(Path.Combine(Path.GetDirectoryName(FullPath)!, name)), DisplayPath[..(DisplayPath.LastIndexOf('/') + 1)] + name);
}
