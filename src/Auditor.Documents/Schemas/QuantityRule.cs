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
    /// <exception cref="InvalidDataException">A keyword has a value that means nothing.</exception>
    public static QuantityRule? From(IDictionary<string, object?> keywords)
    {
        if (!keywords.TryGetValue("quantity", out var name))
        {
            return null;
        }

        var kind = QuantityKind.Find(name as string ?? "")
            ?? throw new InvalidDataException($"`{name}` is not a kind of quantity; there are {string.Join(", ", QuantityKind.All.Select(each => each.Name))}");
        return new QuantityRule(kind, Flag(keywords, "signed"), Flag(keywords, "may-be-zero"), Limit(keywords, "at-least", kind), Limit(keywords, "at-most", kind));
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

    private static bool Flag(IDictionary<string, object?> keywords, string name) => keywords.TryGetValue(name, out var value)
        && (value as bool? ?? throw new InvalidDataException($"`{name}` takes `true` or `false`"));

    private static StatedQuantity? Limit(IDictionary<string, object?> keywords, string name, QuantityKind kind)
    {
        if (!keywords.TryGetValue(name, out var value))
        {
            return null;
        }

        return QuantityText.TryParse(value as string ?? "", out var limit, out _) && kind.Accepts(limit.Unit)
            ? limit
            : throw new InvalidDataException($"`{name}` takes {kind.Noun} as text, such as \"{kind.Example}\"");
    }
}
