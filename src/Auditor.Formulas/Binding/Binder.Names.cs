using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Terms;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using Scriban.Syntax;

namespace Auditor.Formulas.Binding;

/// <summary>Names: quantities, inputs, parameters, ways and the outer subject.</summary>
internal sealed partial class Binder
{
    private const string EmptyList = "none";
    private const string OuterSubject = "this";

    private Term? BindName(ScriptExpression expression, Site site)
    {
        var parts = new List<string>();
        if (!Flatten(expression, parts))
        {
            return Fail(FormulaMessages.NotAllowed(SpanOf(expression), "this"));
        }

        var span = SpanOf(expression);
        if (parts is [EmptyList])
        {
            return new LiteralTerm(FormulaType.Words, span, Value.Of([]));
        }

        return parts is ["param", var first, ..] ? BindParameter(span, string.Join('.', parts.Skip(1)), first) : BindPath(span, parts, 0, site);
    }

    private static bool Flatten(ScriptExpression expression, List<string> parts)
    {
        switch (expression)
        {
            case ScriptVariable variable:
                parts.Add(variable.Name);
                return true;
            case ScriptThisExpression:
                parts.Add(OuterSubject);
                return true;
            case ScriptMemberExpression { Target: { } target, Member: { } member }:
                var flat = Flatten(target, parts);
                parts.Add(member.Name);
                return flat;
            default:
                return false;
        }
    }

    private Term? BindParameter(SourceSpan span, string name, string nearTo) =>
        world.Parameters.TryGetValue(name, out var slot)
            ? new ParameterTerm(span, slot)
            : Fail(FormulaMessages.UnknownParameter(span, name, NearestWord.Find(nearTo, world.Parameters.Keys)));

    private Term? BindPath(SourceSpan span, List<string> parts, int from, Site site)
    {
        var head = parts[from];
        if (head == OuterSubject)
        {
            return from == parts.Count - 1 ? Fail(FormulaMessages.WayAlone(span, head)) : BindOuter(span, parts, from, site);
        }

        if (site.Shape.Way(head) is { } way)
        {
            return from == parts.Count - 1 ? Fail(FormulaMessages.WayAlone(span, head)) : BindWay(span, parts, from, way, site);
        }

        return BindOwn(span, string.Join('.', parts.Skip(from)), site, from == 0 ? null : parts[from - 1]);
    }

    private Term? BindOuter(SourceSpan span, List<string> parts, int from, Site site)
    {
        if (site.Outer is not { } outer)
        {
            return Fail(FormulaMessages.NoOuter(span));
        }

        site.UsesOuter = true;
        return BindPath(span, parts, from + 1, outer) is { } inner ? new OuterTerm(span, inner) : null;
    }

    private WayTerm? BindWay(SourceSpan span, List<string> parts, int from, Way way, Site site)
    {
        var byShape = new Dictionary<SubjectShape, Term>();
        Term? first = null;
        foreach (var target in way.Targets)
        {
            var term = BindPath(span, parts, from + 1, site.At(way, target));
            if (term is null)
            {
                return null;
            }

            first ??= term;
            if (!term.Type.Equals(first.Type))
            {
                Fail(FormulaMessages.Dimensions(span, "read as one", first.Type, term.Type));
                return null;
            }

            byShape.Add(target, term);
        }

        return new WayTerm(first!.Type, span, way, byShape);
    }

    private Term? BindOwn(SourceSpan span, string name, Site site, string? way)
    {
        if (site.Shape.Quantity(name) is { } quantity)
        {
            _references.Add(new Reference(site.Route, site.Shape, null, quantity));
            return new QuantityTerm(span, quantity);
        }

        if (site.Shape.Input(name) is { } input)
        {
            _references.Add(new Reference(site.Route, site.Shape, input, null));
            return new InputTerm(span, input);
        }

        if (site.Shape.Collection(name) is not null)
        {
            return Fail(FormulaMessages.Collection(span, name));
        }

        if (way is null && UnitCatalog.FindIdentifier(name) is not null)
        {
            return Fail(FormulaMessages.LooseUnit(span, name));
        }

        var nearest = NearestWord.Find(name, site.Shape.AllNames());
        return Fail(way is null
            ? FormulaMessages.UnknownName(span, name, site.Shape.Name, nearest)
            : FormulaMessages.UnknownWayTarget(span, way, name, site.Shape.Name, nearest));
    }
}
