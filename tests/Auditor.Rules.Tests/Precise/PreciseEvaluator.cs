using System.Text.RegularExpressions;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Rules.Tests.Precise;

/// <summary>
/// Works the formulas of a rule set out again, from their text, in numbers of 31 digits. Of the program it takes what a design says, the
/// figures of tables and curves, and the way from subject to subject; nothing that the program has computed.
/// A value is a <see cref="DoubleDouble"/>, a text, a list of words or a flag; null where it is missing.
/// </summary>
internal sealed class PreciseEvaluator(RuleSet rules)
{
    private readonly Dictionary<string, Expression> _read = [];
    private readonly Dictionary<(ISubject Subject, int Slot), object?> _known = [];
    private readonly Dictionary<string, PreciseTable> _tables = rules.World.Lookups.ToDictionary(entry => entry.Key, entry => new PreciseTable(entry.Value));

    /// <summary>A quantity of a subject.</summary>
    public object? Quantity(ISubject subject, int slot)
    {
        if (!_known.TryGetValue((subject, slot), out var value))
        {
            value = Formula(rules.Quantity(subject.Shape, slot).Formula.Text, subject);
            _known.Add((subject, slot), value);
        }

        return value;
    }

    /// <summary>A formula of a subject.</summary>
    public object? Formula(string text, ISubject subject)
    {
        if (!_read.TryGetValue(text, out var expression))
        {
            expression = ExpressionReader.Read(text);
            _read.Add(text, expression);
        }

        return Evaluate(expression, new Frame(subject, null));
    }

    private object? Evaluate(Expression expression, Frame at) => expression switch
    {
        Expression.Number { Unit: null } number => (DoubleDouble)number.Written,
        Expression.Number number => (DoubleDouble)UnitCatalog.FindIdentifier(number.Unit!)!.ToCoherent(number.Written),
        Expression.Constant constant => constant.Value,
        Expression.Name name => Named(name.Parts, at),
        Expression.Pair pair => Paired(pair, at),
        Expression.Call call => Called(call, at),
        _ => throw new NotSupportedException(expression.ToString()),
    };

    private object? Named(IReadOnlyList<string> parts, Frame at)
    {
        if (parts is ["none"])
        {
            return Array.Empty<string>();
        }

        if (parts is ["param", ..])
        {
            return Taken(at.Subject.Parameter(rules.World.Parameters[string.Join('.', parts.Skip(1))].Index));
        }

        if (parts is ["this", ..])
        {
            return Named([.. parts.Skip(1)], at.Outer!);
        }

        var shape = at.Subject.Shape;
        if (shape.Way(parts[0]) is { } way)
        {
            return at.Subject.Go(way.Index) is { } next ? Named([.. parts.Skip(1)], new Frame(next, null)) : null;
        }

        var name = string.Join('.', parts);
        return shape.Quantity(name) is { } quantity ? Quantity(at.Subject, quantity.Index) : Taken(at.Subject.Input(shape.Input(name)!.Index));
    }

    private object? Paired(Expression.Pair pair, Frame at)
    {
        var left = Evaluate(pair.Left, at);
        if (pair.Sign is "&&" or "||" or "??")
        {
            return pair.Sign switch
            {
                "??" => left ?? Evaluate(pair.Right, at),
                var sign when left is bool flag && flag == (sign == "||") => left,
                var sign => Evaluate(pair.Right, at) switch
                {
                    bool flag when flag == (sign == "||") => flag,
                    bool flag when left is not null => flag,
                    _ => null,
                },
            };
        }

        return (left, Evaluate(pair.Right, at)) switch
        {
            (DoubleDouble a, DoubleDouble b) => Computed(pair.Sign, a, b),
            (null, _) or (_, null) => null,
            var (a, b) => a.Equals(b) == (pair.Sign == "=="),
        };
    }

    private static object? Computed(string sign, DoubleDouble a, DoubleDouble b) => sign switch
    {
        "+" => Finite(a + b),
        "-" => Finite(a - b),
        "*" => Finite(a * b),
        "/" => Finite(a / b),
        "^" => Finite(a.Power(b)),
        "==" => Slack.Same(a, b),
        "!=" => !Slack.Same(a, b),
        "<" => !Slack.AtLeast(a, b),
        "<=" => Slack.AtLeast(b, a),
        ">" => !Slack.AtLeast(b, a),
        _ => Slack.AtLeast(a, b),
    };

    private object? Called(Expression.Call call, Frame at)
    {
        var arguments = call.Arguments;
        switch (call.Function)
        {
            case "given":
                return Evaluate(arguments[0], at) is not null;
            case "choose":
                return Evaluate(arguments[0], at) is bool holds ? Evaluate(arguments[holds ? 1 : 2], at) : null;
            case "sum_of" or "min_of" or "max_of" or "count_of" or "all_of" or "any_of":
                return Gathered(call.Function, at.Subject.Collection(at.Subject.Shape.Collection(((Expression.Name)arguments[0]).Parts[0])!.Index), arguments[1], at);
        }

        var values = arguments.Select(argument => Evaluate(argument, at)).ToArray();
        return Array.Exists(values, value => value is null) ? null : Applied(call.Function, values!);
    }

    private object? Applied(string function, object[] values) => (function, values) switch
    {
        ("-", [DoubleDouble x]) => -x,
        ("!", [bool flag]) => !flag,
        ("min", [DoubleDouble, ..]) => values.Cast<DoubleDouble>().Aggregate((a, b) => b < a ? b : a),
        ("max", [DoubleDouble, ..]) => values.Cast<DoubleDouble>().Aggregate((a, b) => b > a ? b : a),
        ("sqrt", [DoubleDouble x]) => Finite(x.Sqrt()),
        ("abs", [DoubleDouble x]) => x.Abs(),
        ("one_of", [string text, ..]) => values.Skip(1).Contains(text),
        ("has", [IReadOnlyList<string> words, string word]) => words.Contains(word),
        ("matches", [string text, string pattern]) => Regex.IsMatch(text, $@"\A(?:{pattern})\z", RegexOptions.CultureInvariant, TimeSpan.FromSeconds(10)),
        ("table", [string name, ..]) => _tables[name].Find(values[1..]),
        ("round_up_to", [string name, DoubleDouble x]) => _tables[name].RoundUp(x),
        ("trip_current", [string standard, string type, DoubleDouble rating, DoubleDouble time]) =>
            rules.World.Curves.Find(standard, type) is { } curve ? PreciseCurve.TripCurrent(curve, rating, time) : null,
        ("trip_time", [string standard, string type, DoubleDouble rating, DoubleDouble current]) =>
            rules.World.Curves.Find(standard, type) is { } curve ? PreciseCurve.TripTime(curve, rating, current) : null,
        _ => throw new NotSupportedException($"{function} of {values.Length}"),
    };

    private object? Gathered(string function, IReadOnlyList<ISubject> items, Expression item, Frame at)
    {
        var values = items.Select(subject => Evaluate(item, new Frame(subject, at))).ToArray();
        var isMissing = Array.Exists(values, value => value is null);
        return function switch
        {
            "all_of" => values.Contains(false) ? false : isMissing ? null : true,
            "any_of" => values.Contains(true) ? true : isMissing ? null : false,
            _ when isMissing => null,
            "count_of" => (DoubleDouble)values.Count(value => value is true),
            "sum_of" => Finite(values.Aggregate((DoubleDouble)0, (sum, value) => sum + (DoubleDouble)value!)),
            _ when values.Length == 0 => null,
            "min_of" => values.Cast<DoubleDouble>().Aggregate((a, b) => b < a ? b : a),
            _ => values.Cast<DoubleDouble>().Aggregate((a, b) => b > a ? b : a),
        };
    }

    private static DoubleDouble? Finite(DoubleDouble number) => number.IsFinite ? number : null;

    /// <summary>What the program took from a design or a set.</summary>
    private static object? Taken(Value value) => value.Kind switch
    {
        ValueKind.Missing => null,
        ValueKind.Quantity => (DoubleDouble)value.Number,
        ValueKind.Flag => value.Flag,
        ValueKind.Words => value.Words,
        _ => value.Text,
    };

    private sealed record Frame(ISubject Subject, Frame? Outer);
}
