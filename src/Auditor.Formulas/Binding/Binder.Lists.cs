using Auditor.Documents;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Terms;
using Auditor.Formulas.Types;
using Auditor.Quantities;
using Scriban.Syntax;

namespace Auditor.Formulas.Binding;

/// <summary>Words, tables and collections.</summary>
internal sealed partial class Binder
{
    private OneOfTerm? BindOneOf(SourceSpan span, ScriptExpression[] arguments, Site site)
    {
        var text = BindText(arguments[0], site, "`one_of`");
        var words = arguments.Skip(1).Select(argument => WordOf(argument, text?.Type.Vocabulary)).ToArray();
        return text is null || Array.Exists(words, word => word is null) ? null : new OneOfTerm(span, text, words!);
    }

    private HasTerm? BindHas(SourceSpan span, ScriptExpression[] arguments, Site site)
    {
        var list = Bind(arguments[0], site, FormulaKind.Words, "`has`", "a list of words");
        var word = WordOf(arguments[1], list?.Type.Vocabulary);
        return list is null || word is null ? null : new HasTerm(span, list, word);
    }

    private MatchesTerm? BindMatches(SourceSpan span, ScriptExpression[] arguments, Site site)
    {
        var text = BindText(arguments[0], site, "`matches`");
        if (arguments[1] is not ScriptLiteral { Value: string pattern })
        {
            Fail(FormulaMessages.NotAllowed(SpanOf(arguments[1]), "anything but a pattern in quotes"));
            return null;
        }

        if (TextPattern.TryMake(pattern, out var made, out var fault))
        {
            return text is null ? null : new MatchesTerm(span, text, made);
        }

        Fail(FormulaMessages.Pattern(SpanOf(arguments[1]), fault));
        return null;
    }

    private string? WordOf(ScriptExpression argument, IReadOnlyList<string>? allowed)
    {
        if (argument is not ScriptLiteral { Value: string word })
        {
            Fail(FormulaMessages.NotAllowed(SpanOf(argument), "anything but a word in quotes"));
            return null;
        }

        if (allowed is not null && !allowed.Contains(word))
        {
            Fail(FormulaMessages.UnknownWord(SpanOf(argument), word, allowed, NearestWord.Find(word, allowed)));
            return null;
        }

        return word;
    }

    private Lookup? LookupOf(ScriptExpression argument)
    {
        if (argument is not ScriptLiteral { Value: string name })
        {
            Fail(FormulaMessages.NotAllowed(SpanOf(argument), "anything but the name of a lookup in quotes"));
            return null;
        }

        if (world.Lookups.TryGetValue(name, out var lookup))
        {
            return lookup;
        }

        Fail(FormulaMessages.UnknownLookup(SpanOf(argument), name, NearestWord.Find(name, world.Lookups.Keys)));
        return null;
    }

    private TableTerm? BindTable(SourceSpan span, ScriptExpression[] arguments, Site site)
    {
        var lookup = LookupOf(arguments[0]);
        var keys = arguments.Skip(1).Select(argument => Bind(argument, site)).ToArray();
        if (lookup is null || Array.Exists(keys, key => key is null))
        {
            return null;
        }

        if (keys.Length != lookup.Keys.Count)
        {
            Fail(FormulaMessages.Arguments(span, "table", $"table('{lookup.Name}', {string.Join(", ", lookup.Keys.Select(key => key.Name))})"));
            return null;
        }

        for (var i = 0; i < keys.Length; i++)
        {
            var wanted = TypeOf(lookup.Keys[i].Unit);
            if (!keys[i]!.Type.Equals(wanted))
            {
                Fail(FormulaMessages.Needs(keys[i]!.Span, $"key `{lookup.Keys[i].Name}` of {lookup.Name}", wanted.ToString(), keys[i]!.Type));
                return null;
            }
        }

        return new TableTerm(TypeOf(lookup.Unit), span, lookup, keys!);
    }

    private static FormulaType TypeOf(Unit? unit) => unit is null ? FormulaType.Text : FormulaType.Of(unit.Dimension);

    private RoundUpTerm? BindRoundUp(SourceSpan span, ScriptExpression[] arguments, Site site)
    {
        var series = LookupOf(arguments[0]);
        var operand = BindQuantity(arguments[1], site, "`round_up_to`");
        if (series is null || operand is null)
        {
            return null;
        }

        if (series.Keys is not [{ Unit: { } unit }])
        {
            Fail(FormulaMessages.Arguments(span, "round_up_to", "round_up_to('lookup with one numeric key', x)"));
            return null;
        }

        var wanted = FormulaType.Of(unit.Dimension);
        if (operand.Type.Equals(wanted))
        {
            return new RoundUpTerm(span, series, operand);
        }

        Fail(FormulaMessages.Needs(operand.Span, $"`round_up_to` over {series.Name}", wanted.ToString(), operand.Type));
        return null;
    }

    private Term? BindAggregate(SourceSpan span, string name, ScriptExpression[] arguments, Site site)
    {
        var parts = new List<string>();
        var collection = Flatten(arguments[0], parts) && parts.Count == 1 ? site.Shape.Collection(parts[0]) : null;
        if (collection is null)
        {
            return Fail(FormulaMessages.NotCollection(SpanOf(arguments[0]), site.Shape.Name, site.Shape.Collections.Select(list => list.Name)));
        }

        var inner = site.In(collection);
        var gathers = name is "sum_of" or "min_of" or "max_of";
        var item = gathers ? BindQuantity(arguments[1], inner, $"`{name}`") : BindFlag(arguments[1], inner, $"`{name}`");
        if (item is null)
        {
            return null;
        }

        var (how, type) = name switch
        {
            "sum_of" => (Aggregate.Sum, item.Type),
            "min_of" => (Aggregate.Min, item.Type),
            "max_of" => (Aggregate.Max, item.Type),
            "count_of" => (Aggregate.Count, FormulaType.Number),
            "all_of" => (Aggregate.All, FormulaType.Flag),
            _ => (Aggregate.Any, FormulaType.Flag),
        };
        return how == Aggregate.Sum && item.Type.Dimension.IsTemperature
            ? Fail(FormulaMessages.Needs(item.Span, "`sum_of`", NoTemperature, item.Type))
            : new AggregateTerm(type, span, how, collection, item, inner.UsesOuter);
    }
}
