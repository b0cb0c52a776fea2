using Auditor.Quantities;

namespace Auditor.Documents;

/// <summary>What a schema asks of a quantity: its kind and how large it may be.</summary>
/// <param name="Kind">The kind.</param>
/// <param name="MayBeNegative">Whether it may be zero or negative.</param>
/// <param name="MayBeZero">Whether it may be zero.</param>
/// <param name="AtLeast">The least value allowed; null for none.</param>
/// <param name="AtMost">The greatest value allowed; null for none.</param>
internal sealed record QuantityRule(QuantityKind Kind, bool MayBeNegative, bool MayBeZero, StatedQuantity? AtLeast, StatedQuantity? AtMost)
{
    /// <summary>How far, as a share, a value may pass a limit before it counts as beyond: what conversion of units may cost.</summary>
    private const double Slack = 1e-9;

    /// <summary>Reads the rule from the keywords of a schema; null when the schema asks for no quantity.</summary>
    /// <param name="keyword">Tells whether the schema has a keyword, and its value: a text or a flag, null for any other.</param>
    /// <exception cref="InvalidDataException">A keyword has a value that means nothing.</exception>
    public static QuantityRule? From(Func<string, (bool IsGiven, object? Value)> keyword)
    {
        if (keyword("quantity") is not (true, var name))
        {
            return null;
        }

        var kind = QuantityKind.Find(name as string ?? "")
            ?? throw new InvalidDataException($"`{name}` is not a kind of quantity; there are {string.Join(", ", QuantityKind.All.Select(each => each.Name))}");
        return new QuantityRule(kind, Flag(keyword, "signed"), Flag(keyword, "may-be-zero"), Limit(keyword, "at-least", kind), Limit(keyword, "at-most", kind));
    }

    /// <summary>Says what is wrong with the scalar that states a quantity; null when nothing is.</summary>
    public Problem? Check(ScalarNode scalar)
    {
        if (!QuantityText.TryParse(scalar.Text, out var stated, out var fault))
        {
            return QuantityProblems.Unreadable(Kind, scalar, fault);
        }

        if (!Kind.Accepts(stated.Unit))
        {
            return stated.Unit.Equals(Unit.One) ? QuantityProblems.NeedsUnit(Kind, scalar) : QuantityProblems.WrongUnit(Kind, scalar, stated.Unit);
        }

        var value = stated.Quantity.Value;
        if (value == 0 && !MayBeZero && !MayBeNegative)
        {
            return QuantityProblems.Zero(Kind, scalar);
        }

        if (value < 0 && !MayBeNegative)
        {
            return QuantityProblems.Negative(Kind, scalar);
        }

        if (AtLeast is { } least && value < least.Quantity.Value - (Slack * Math.Abs(least.Quantity.Value)))
        {
            return QuantityProblems.TooSmall(Kind, scalar, least);
        }

        return AtMost is { } most && value > most.Quantity.Value + (Slack * Math.Abs(most.Quantity.Value))
            ? QuantityProblems.TooLarge(Kind, scalar, most)
            : null;
    }

    private static bool Flag(Func<string, (bool IsGiven, object? Value)> keyword, string name) => keyword(name) is (true, var value)
        && (value as bool? ?? throw new InvalidDataException($"`{name}` takes `true` or `false`"));

    private static StatedQuantity? Limit(Func<string, (bool IsGiven, object? Value)> keyword, string name, QuantityKind kind)
    {
        if (keyword(name) is not (true, var value))
        {
            return null;
        }

        return QuantityText.TryParse(value as string ?? "", out var limit, out _) && kind.Accepts(limit.Unit)
            ? limit
            : throw new InvalidDataException($"`{name}` takes {kind.Noun} as text, such as \"{kind.Example}\"");
    }
}
