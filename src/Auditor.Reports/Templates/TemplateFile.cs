using Auditor.Reports.Files;

namespace Auditor.Reports.Templates;

/// <summary>A template file.</summary>
/// <param name="FullPath">Where it lies.</param>
/// <param name="DisplayPath">The path to show in problems.</param>
public sealed record TemplateFile(string FullPath, string DisplayPath)
{
    /// <summary>The template that comes with the program; only for formats that are written from one.</summary>
    public static TemplateFile Shipped(ReportFormat format)
    {
        var name = format.TemplateName ?? throw new ArgumentException("the format is not written from a template", nameof(format));
        return new TemplateFile(Path.Combine(AppContext.BaseDirectory, "templates", name), "templates/" + name);
    }

    /// <summary>The template at a path that the caller gives.</summary>
    public static TemplateFile At(string path) => new(Path.GetFullPath(path), path);
}
