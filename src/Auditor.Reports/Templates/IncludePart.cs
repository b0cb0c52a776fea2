using Scriban;
using Scriban.Functions;
using Scriban.Runtime;
using Scriban.Syntax;

namespace Auditor.Reports.Templates;

/// <summary>The function <c>include</c>. What an included template writes went through the gate when it was written.</summary>
internal sealed class IncludePart : IScriptCustomFunction
{
    private readonly IncludeFunction _include = new();

    public int RequiredParameterCount => _include.RequiredParameterCount;

    public int ParameterCount => _include.ParameterCount;

    public ScriptVarParamKind VarParamKind => _include.VarParamKind;

    public Type ReturnType => typeof(Markup);

    public ScriptParameterInfo GetParameterInfo(int index) => _include.GetParameterInfo(index);

    public object Invoke(TemplateContext context, ScriptNode? callerContext, ScriptArray arguments, ScriptBlockStatement? blockStatement) =>
        ((ReportContext)context).Part(() => _include.Invoke(context, callerContext, arguments, blockStatement));

    public ValueTask<object?> InvokeAsync(
        TemplateContext context, ScriptNode? callerContext, ScriptArray arguments, ScriptBlockStatement? blockStatement) =>
        ValueTask.FromResult<object?>(Invoke(context, callerContext, arguments, blockStatement));
}
