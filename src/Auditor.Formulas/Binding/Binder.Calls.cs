using Auditor.Documents;
using Auditor.Formulas.Terms;
using Auditor.Formulas.Types;
using Auditor.Quantities;
using Scriban.Syntax;

namespace Auditor.Formulas.Binding;

/// <summary>The closed list of functions.</summary>
internal sealed partial class Binder
{
    private static readonly Dictionary<string, string> Signatures = new()
    {
        ["min"] = "min(a, b, …)",
        ["max"] = "max(a, b, …)",
        ["sqrt"] = "sqrt(x)",
        ["abs"] = "abs(x)",
        ["log"] = "log(x)",
        ["log10"] = "log10(x)",
        ["exp"] = "exp(x)",
        ["sin"] = "sin(x)",
        ["cos"] = "cos(x)",
        ["acos"] = "acos(x)",
        ["choose"] = "choose(condition, then, otherwise)",
        ["given"] = "given(x)",
        ["one_of"] = "one_of(text, 'word', …)",
        ["has"] = "has(words, 'word')",
        ["matches"] = "matches(text, 'pattern')",
        ["table"] = "table('lookup', key, …)",
        ["round_up_to"] = "round_up_to('lookup', x)",
        ["trip_current"] = "trip_current(standard, type, rating, time)",
        ["trip_time"] = "trip_time(standard, type, rating, current)",
        ["sum_of"] = "sum_of(list, x)",
        ["min_of"] = "min_of(list, x)",
        ["max_of"] = "max_of(list, x)",
        ["count_of"] = "count_of(list, condition)",
        ["all_of"] = "all_of(list, condition)",
        ["any_of"] = "any_of(list, condition)",
    };

    private Term? BindCall(ScriptFunctionCall call, Site site)
    {
        var span = SpanOf(call);
        if (call.Target is not ScriptVariable { Name: var name })
        {
            return Fail(FormulaMessages.NotAllowed(span, "this call"));
        }

        if (!Signatures.TryGetValue(name, out var signature))
        {
            return Fail(FormulaMessages.UnknownFunction(SpanOf(call.Target), name, NearestWord.Find(name, Signatures.Keys)));
        }

        var arguments = call.Arguments.ToArray();
        if (!Fits(arguments.Length, name))
        {
            return Fail(FormulaMessages.Arguments(span, name, signature));
        }

        return name switch
        {
            "min" or "max" => BindExtreme(span, name, arguments, site),
            "choose" => BindChoose(span, arguments, site),
            "given" => BindGiven(span, arguments[0], site),
            "one_of" => BindOneOf(span, arguments, site),
            "has" => BindHas(span, arguments, site),
            "matches" => BindMatches(span, arguments, site),
            "table" => BindTable(span, arguments, site),
            "round_up_to" => BindRoundUp(span, arguments, site),
            "trip_current" or "trip_time" => BindCurve(span, name, arguments, site),
            "sqrt" or "abs" or "log" or "log10" or "exp" or "sin" or "cos" or "acos" => BindNumeric(span, name, arguments[0], site),
            _ => BindAggregate(span, name, arguments, site),
        };
    }

    private static bool Fits(int count, string name) => name switch
    {
        "min" or "max" or "one_of" or "table" => count >= 2,
        "choose" => count == 3,
        "trip_current" or "trip_time" => count == 4,
        "has" or "matches" or "round_up_to" or "sum_of" or "min_of" or "max_of" or "count_of" or "all_of" or "any_of" => count == 2,
        _ => count == 1,
    };

    private ExtremeTerm? BindExtreme(SourceSpan span, string name, ScriptExpression[] arguments, Site site)
    {
        var terms = arguments.Select(argument => BindQuantity(argument, site, $"`{name}`")).ToArray();
        if (Array.Exists(terms, term => term is null))
        {
            return null;
        }

        var odd = Array.Find(terms, term => !term!.Type.Equals(terms[0]!.Type));
        if (odd is null)
        {
            return new ExtremeTerm(terms[0]!.Type, span, name == "min", terms!);
        }

        Fail(FormulaMessages.Dimensions(odd.Span, "compare", terms[0]!.Type, odd.Type));
        return null;
    }

    private ChooseTerm? BindChoose(SourceSpan span, ScriptExpression[] arguments, Site site)
    {
        var condition = BindFlag(arguments[0], site, "the condition of `choose`");
        var then = Bind(arguments[1], site);
        var otherwise = Bind(arguments[2], site);
        if (condition is null || then is null || otherwise is null)
        {
            return null;
        }

        if (then.Type.Equals(otherwise.Type))
        {
            return new ChooseTerm(Joined(then.Type, otherwise), span, condition, then, otherwise);
        }

        Fail(FormulaMessages.Dimensions(span, "choose between", then.Type, otherwise.Type));
        return null;
    }

    private GivenTerm? BindGiven(SourceSpan span, ScriptExpression argument, Site site) =>
        BindAny(argument, site) is { } term ? new GivenTerm(span, term) : null;

    private NumericTerm? BindNumeric(SourceSpan span, string name, ScriptExpression argument, Site site)
    {
        if (BindQuantity(argument, site, $"`{name}`") is not { } term)
        {
            return null;
        }

        var dimension = term.Type.Dimension;
        if (name == "abs" && dimension.IsTemperature)
        {
            Fail(FormulaMessages.Needs(term.Span, "`abs`", NoTemperature, term.Type));
            return null;
        }

        if (name == "sqrt" && !dimension.TryPower(0.5, out dimension))
        {
            Fail(FormulaMessages.Overflow(span));
            return null;
        }

        if (name is not ("sqrt" or "abs") && !dimension.IsNone)
        {
            Fail(FormulaMessages.Needs(term.Span, $"`{name}`", "a pure number", term.Type));
            return null;
        }

        Func<double, double> function = name switch
        {
            "sqrt" => Math.Sqrt,
            "abs" => Math.Abs,
            "log" => Math.Log,
            "log10" => Math.Log10,
            "exp" => Math.Exp,
            "sin" => Math.Sin,
            "cos" => Math.Cos,
            _ => Math.Acos,
        };
        return new NumericTerm(FormulaType.Of(dimension), span, function, term);
    }

    private CurveTerm? BindCurve(SourceSpan span, string name, ScriptExpression[] arguments, Site site)
    {
        var givesCurrent = name == "trip_current";
        var standard = BindText(arguments[0], site, "the standard of the device");
        var type = BindText(arguments[1], site, "the type of the device");
        var rating = BindOf(arguments[2], site, Dimension.Current, "the rating", "a current");
        var given = givesCurrent
            ? BindOf(arguments[3], site, Dimension.Time, "`trip_current`", "a time")
            : BindOf(arguments[3], site, Dimension.Current, "`trip_time`", "a current");
        return standard is null || type is null || rating is null || given is null
            ? null
            : new CurveTerm(FormulaType.Of(givesCurrent ? Dimension.Current : Dimension.Time), span, world.Curves, givesCurrent, [standard, type, rating, given]);
    }

    private Term? BindOf(ScriptExpression argument, Site site, Dimension dimension, string what, string wanted)
    {
        var term = BindQuantity(argument, site, what);
        return term is null || term.Type.Dimension == dimension ? term : Fail(FormulaMessages.Needs(term.Span, what, wanted, term.Type));
    }
}
