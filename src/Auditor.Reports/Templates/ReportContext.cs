using System.Collections;
using System.Globalization;
using System.Text;
using Auditor.Documents;
using Auditor.Reports.Model;
using Scriban;
using Scriban.Functions;
using Scriban.Runtime;
using Scriban.Syntax;

namespace Auditor.Reports.Templates;

/// <summary>What a template can reach while it is written, and the one gate through which everything that it inserts goes.</summary>
internal sealed class ReportContext : TemplateContext
{
    /// <summary>Marks of lists and quotations before a text are looked for so far back.</summary>
    private const int LongestLead = 64;

    private readonly Ink _ink;
    private readonly TemplateFolder _folder;
    private long _evaluations;

    public ReportContext(object model, Ink ink, TemplateFolder folder)
        : base(Functions(ink))
    {
        _ink = ink;
        _folder = folder;
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
    }

    /// <summary>Whether the caution has been inserted.</summary>
    public bool HasShownCaution { get; private set; }

    /// <inheritdoc/>
    public override TemplateContext Write(Scriban.Parsing.SourceSpan span, object? textAsObject)
    {
        if (textAsObject is Markup markup)
        {
            return Write(markup.Text);
        }

        HasShownCaution |= ReferenceEquals(textAsObject, Caution.Text);
        return Write(_ink.Inert(ObjectToString(textAsObject) ?? "", StartsBlock()));
    }

    /// <inheritdoc/>
    public override object? Evaluate(ScriptNode? scriptNode, bool aliasReturnedFunction)
    {
        if (++_evaluations > _folder.Limits.Evaluations)
        {
            throw new TemplateFault(scriptNode?.Span ?? default, at => TemplateMessages.TooMuch(at, _folder.Limits.Evaluations));
        }

        return base.Evaluate(scriptNode, aliasReturnedFunction);
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

    private static bool MissMember(TemplateContext context, Scriban.Parsing.SourceSpan span, object target, string member, out object? value)
    {
        string[] known = target is IEnumerable
            ? ["size"]
            : [.. target.GetType().GetProperties().Select(property => StandardMemberRenamer.Rename(property.Name)).Order(StringComparer.Ordinal)];
        throw new TemplateFault(span, at => TemplateMessages.UnknownMember(at, member, NearestWord.Find(member, known), known));
    }

    private static bool MissVariable(TemplateContext context, Scriban.Parsing.SourceSpan span, ScriptVariable variable, out object? value) =>
        throw new TemplateFault(span, at => TemplateMessages.UnknownVariable(
            at, variable.Name, NearestWord.Find(variable.Name, ["report", .. context.BuiltinObject.GetMembers()])));

    /// <summary>Whether what comes next stands where Markdown looks for a heading, a list or a quotation.</summary>
    private bool StartsBlock()
    {
        var written = Output is StringBuilderOutput output ? output.Builder : new StringBuilder();
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
