using System.Collections;
using System.Diagnostics;
using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using Auditor.Documents;
using Auditor.Reports.Model;
using Scriban;
using Scriban.Functions;
using Scriban.Runtime;
using Scriban.Syntax;
using SourceSpan = Scriban.Parsing.SourceSpan;

namespace Auditor.Reports.Templates;

/// <summary>What a template can reach while it is written, and the one gate through which everything that it inserts goes.</summary>
internal sealed class ReportContext : TemplateContext
{
    /// <summary>Marks of lists and quotations before a text are looked for so far back.</summary>
    private const int LongestLead = 64;

    /// <summary>The time is looked at after so many evaluations.</summary>
    private const int EvaluationsBetweenLooks = 4096;

    private readonly Ink _ink;
    private readonly TemplateFolder _folder;
    private readonly WrittenHtml? _html;
    private readonly string _loosened;
    private readonly Stopwatch _watch = Stopwatch.StartNew();
    private long _evaluations;

    /// <summary>What was evaluated last: when a value is written, that which gave it.</summary>
    private ScriptNode? _evaluated;

    public ReportContext(object model, string loosened, Ink ink, TemplateFolder folder)
        : base(Functions(ink))
    {
        _ink = ink;
        _folder = folder;
        _html = ink.Watch();
        _loosened = loosened;
        HasShownLoosened = loosened.Length == 0;
        StrictVariables = true;
        EnableRelaxedMemberAccess = false;
        EnableRelaxedIndexerAccess = false;
        AutoIndent = false;
        LoopLimit = folder.Limits.LoopSteps;
        RecursiveLimit = folder.Limits.IncludeDepth;
        OutputLimit = folder.Limits.Characters;
        OnOutputLimit = ScriptLimitBehavior.Throw;
        OnStringLimit = ScriptLimitBehavior.Throw;
        TryGetMember = MissMember;
        TryGetVariable = MissVariable;
        PushCulture(CultureInfo.InvariantCulture);
        var global = new ScriptObject();
        global.SetValue("report", model, readOnly: true);
        PushGlobal(global);
        if (_html is not null)
        {
            BuiltinObject.SetValue("inline", DynamicCustomFunction.Create((TemplateContext _, SourceSpan at, string? name) => Inline(at, name)), readOnly: true);
            BuiltinObject.SetValue("hash", DynamicCustomFunction.Create((TemplateContext _, SourceSpan at, string? name) => Hash(at, name)), readOnly: true);
        }
    }

    private StringBuilder Written => Output is StringBuilderOutput output ? output.Builder : new StringBuilder();

    /// <summary>Whether the caution has been inserted.</summary>
    public bool HasShownCaution { get; private set; }

    /// <summary>Whether what house rules loosen has been inserted, or there is nothing of the kind.</summary>
    public bool HasShownLoosened { get; private set; }

    /// <inheritdoc/>
    public override TemplateContext Write(SourceSpan span, object? textAsObject)
    {
        if (textAsObject is InlinedFile file)
        {
            return Write(file.Text);
        }

        if (textAsObject is Markup markup)
        {
            return _html?.TakesMarkup(Written) == false ? throw new TemplateFault(_evaluated?.Span ?? span, TemplateMessages.NoMarkupHere) : Write(markup.Text);
        }

        HasShownCaution |= ReferenceEquals(textAsObject, Caution.Text);
        HasShownLoosened |= ReferenceEquals(textAsObject, _loosened);
        var inert = _ink.Inert(ObjectToString(textAsObject) ?? "", _html is null && StartsBlock());
        return Write(_html is null ? inert : _html.Fit(inert, Written) ?? throw new TemplateFault(_evaluated?.Span ?? span, TemplateMessages.NoTextHere));
    }

    /// <summary>Writes a part where the report has got to.</summary>
    public Markup Part(Func<object?> write)
    {
        _html?.Enter();
        var text = write()?.ToString() ?? "";
        _html?.Leave();
        return new Markup(text);
    }

    /// <inheritdoc/>
    public override object? Evaluate(ScriptNode? scriptNode, bool aliasReturnedFunction)
    {
        if (++_evaluations > _folder.Limits.Evaluations)
        {
            throw new TemplateFault(scriptNode?.Span ?? default, at => TemplateMessages.TooMuch(at, _folder.Limits.Evaluations));
        }

        if (_evaluations % EvaluationsBetweenLooks == 0 && _watch.Elapsed > _folder.Limits.Time)
        {
            throw new TemplateFault(scriptNode?.Span ?? default, at => TemplateMessages.TooLong(at, _folder.Limits.Time));
        }

        var value = base.Evaluate(scriptNode, aliasReturnedFunction);
        _evaluated = scriptNode;
        return value;
    }

    /// <inheritdoc/>
    public override string GetTemplatePathFromName(string? templateName, ScriptNode? callerContext) =>
        _folder.PathOf(templateName ?? "", callerContext?.Span ?? default);

    /// <inheritdoc/>
    protected override Template CreateTemplate(string templatePath, ScriptNode? callerContext) =>
        _folder.Include(templatePath, callerContext?.Span ?? default);

    private static ScriptObject Functions(Ink ink)
    {
        var functions = new ScriptObject();
        functions.SetValue("array", new ArrayFunctions(), readOnly: true);
        functions.SetValue("string", new StringFunctions(), readOnly: true);
        functions.SetValue("include", new IncludePart(), readOnly: true);
        functions.SetValue("prose", DynamicCustomFunction.Create((string? text) => new Markup(ink.Prose(text ?? ""))), readOnly: true);
        functions.SetValue("code", DynamicCustomFunction.Create((string? text) => new Markup(ink.Code(text ?? ""))), readOnly: true);
        return functions;
    }

    private static bool MissMember(TemplateContext context, SourceSpan span, object target, string member, out object? value)
    {
        string[] known = target is IEnumerable
            ? ["size"]
            : [.. context.GetMemberAccessor(target).GetMembers(context, span, target).Order(StringComparer.Ordinal)];
        throw new TemplateFault(span, at => TemplateMessages.UnknownMember(at, member, NearestWord.Find(member, known), known));
    }

    private static bool MissVariable(TemplateContext context, SourceSpan span, ScriptVariable variable, out object? value) =>
        throw new TemplateFault(span, at => TemplateMessages.UnknownVariable(
            at, variable.Name, NearestWord.Find(variable.Name, ["report", .. context.BuiltinObject.GetMembers()])));

    private InlinedFile Inline(SourceSpan at, string? name) =>
        _html!.TakesFile(Written) ? new InlinedFile(_folder.TextOf(name ?? "", at)) : throw new TemplateFault(at, TemplateMessages.NoFileHere);

    private InlinedFile Hash(SourceSpan at, string? name) =>
        new("sha256-" + Convert.ToBase64String(SHA256.HashData(Encoding.UTF8.GetBytes(_folder.TextOf(name ?? "", at)))));

    /// <summary>Whether what comes next stands where Markdown looks for a heading, a list or a quotation.</summary>
    private bool StartsBlock()
    {
        var written = Written;
        var farthest = Math.Max(0, written.Length - LongestLead);
        for (var i = written.Length - 1; i >= farthest && written[i] != '\n'; i--)
        {
            if (!(written[i] is ' ' or '\t' or '>' or '*' or '+' or '-' or '.' or ')' || char.IsAsciiDigit(written[i])))
            {
                return false;
            }
        }

        return true;
    }
}
