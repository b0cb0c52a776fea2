using Auditor.Documents;
using Scriban;
using Scriban.Parsing;
using Scriban.Syntax;
using SourceSpan = Auditor.Documents.SourceSpan;

namespace Auditor.Reports.Templates;

/// <summary>
/// The folder of a template: reads the template and what it includes, and turns faults into problems with their place. Nothing outside
/// the folder is read, whatever a name or a symbolic link says.
/// </summary>
internal sealed class TemplateFolder(TemplateFile top, TemplateLimits limits, Problems problems)
{
    private readonly Dictionary<string, SourceText> _sources = new(StringComparer.Ordinal);

    public TemplateLimits Limits => limits;

    /// <summary>Reads and parses the template; null, with problems added, when that fails.</summary>
    public Template? ParseTop() => Read(top) is { } source ? Parse(source) : null;

    /// <summary>Parses a template that was read; null, with problems added, when it is wrong.</summary>
    public Template? Parse(SourceText source)
    {
        var parsed = Template.Parse(source.Text, source.Path, new ParserOptions { ExpressionDepthLimit = limits.Nesting });
        foreach (var message in parsed.Messages.Where(message => message.Type == ParserMessageType.Error))
        {
            problems.Add(TemplateMessages.Syntax(Span(message.Span), message.Message));
        }

        if (parsed.HasErrors)
        {
            return null;
        }

        var refused = new RefusedStatements();
        parsed.Page?.Accept(refused);
        foreach (var (span, word) in refused.Found)
        {
            problems.Add(TemplateMessages.Refused(Span(span), word));
        }

        return refused.Found.Count == 0 ? parsed : null;
    }

    /// <summary>The path to show of a file to include.</summary>
    /// <param name="name">Its path relative to the template, with forward slashes.</param>
    /// <param name="caller">Where it is included.</param>
    /// <exception cref="TemplateFault">It does not lie in the folder of the template.</exception>
    public string PathOf(string name, Scriban.Parsing.SourceSpan caller) =>
        IsInside(name) ? top.Beside(name).DisplayPath : throw new TemplateFault(caller, at => TemplateMessages.OutsideFolder(at, name));

    /// <summary>Reads and parses an included template.</summary>
    /// <param name="displayPath">Its path, as <see cref="PathOf"/> gave it.</param>
    /// <param name="caller">Where it is included.</param>
    /// <exception cref="TemplateFault">It cannot be used; the problems say why.</exception>
    public Template Include(string displayPath, Scriban.Parsing.SourceSpan caller)
    {
        var name = displayPath[(top.DisplayPath.LastIndexOf('/') + 1)..];
        var parsed = Read(top.Beside(name)) is { } source ? Parse(source) : null;
        return parsed ?? throw new TemplateFault(caller, at => TemplateMessages.NotIncluded(at, name));
    }

    /// <summary>The text of a script or a style sheet in the folder, lines ended by LF.</summary>
    /// <param name="name">Its path relative to the template, with forward slashes.</param>
    /// <param name="caller">Where it is asked for.</param>
    /// <exception cref="TemplateFault">It cannot be used; the problems say why.</exception>
    public string TextOf(string name, Scriban.Parsing.SourceSpan caller)
    {
        var path = PathOf(name, caller);
        var source = _sources.GetValueOrDefault(path) ?? Read(top.Beside(name)) ?? throw new TemplateFault(caller, at => TemplateMessages.NotIncluded(at, name));
        return source.Text.Contains("</", StringComparison.Ordinal) || source.Text.Contains("<!--", StringComparison.Ordinal)
            ? throw new TemplateFault(caller, at => TemplateMessages.ClosesElement(at, name))
            : source.Text.Replace("\r\n", "\n", StringComparison.Ordinal);
    }

    /// <summary>Adds the problem of a fault met while the report was written.</summary>
    public byte[]? Refuse(ScriptRuntimeException fault)
    {
        var place = Span(fault.Span);
        problems.Add(fault is TemplateFault own ? own.Problem(place) : TemplateMessages.Fault(place, fault.OriginalMessage));
        return null;
    }

    /// <summary>Adds a problem of the template as a whole.</summary>
    public byte[]? Refuse(Func<SourceSpan, Problem> problem)
    {
        problems.Add(problem(new SourceSpan(_sources[top.DisplayPath], 0, 0)));
        return null;
    }

    private SourceText? Read(TemplateFile file)
    {
        var source = SourceReader.Read(file.FullPath, file.DisplayPath, problems, ReadingLimits.Default with { Bytes = limits.Bytes });
        if (source is not null)
        {
            _sources[file.DisplayPath] = source;
        }

        return source;
    }

    /// <summary>A span of the template language, whose end is its last character, as one of ours.</summary>
    private SourceSpan Span(Scriban.Parsing.SourceSpan span)
    {
        var source = _sources[span.FileName is { } name && _sources.ContainsKey(name) ? name : top.DisplayPath];
        var start = Math.Clamp(span.Start.Offset, 0, source.Text.Length);
        return new SourceSpan(source, start, Math.Clamp(span.End.Offset + 1, start, source.Text.Length));
    }

    private bool IsInside(string name)
    {
        var root = Path.GetDirectoryName(top.FullPath)!;
        var full = top.Beside(name).FullPath;
        if (Path.IsPathRooted(name) || name.Contains('\\') || !full.StartsWith(root.TrimEnd('/') + "/", StringComparison.Ordinal))
        {
            return false;
        }

        for (var at = full; at.Length > root.Length; at = Path.GetDirectoryName(at)!)
        {
            if (new FileInfo(at).LinkTarget is not null)
            {
                return false;
            }
        }

        return true;
    }
}
