using Auditor.Quantities;

namespace Auditor.Documents;

/// <summary>The wording of all problems of quantities that a schema asks for.</summary>
internal static class QuantityProblems
{
    public static Problem Unreadable(QuantityKind kind, ScalarNode scalar, QuantityFault fault)
    {
        var isNoUnit = fault.Message.EndsWith("is not a unit", StringComparison.Ordinal);
        var hasGuess = fault.Help.StartsWith("did you mean", StringComparison.Ordinal);
        return Problem.Error("unreadable-quantity", $"{kind.Noun} is due here, but {fault.Message}", scalar.SpanOf(fault.Start, fault.Length),
            isNoUnit ? $"{(hasGuess ? fault.Help : $"write for example `{kind.Example}`")}; {Accepted(kind)}" : fault.Help);
    }

    public static Problem NeedsUnit(QuantityKind kind, ScalarNode scalar)
        => Problem.Error("unit-missing", $"{kind.Noun} needs its unit", scalar.Span, $"write for example `{kind.Example}`; {Accepted(kind)}");

    public static Problem WrongUnit(QuantityKind kind, ScalarNode scalar, Unit unit)
        => Problem.Error("wrong-unit", $"`{unit}` is not a unit of {kind.Noun[(kind.Noun.IndexOf(' ') + 1)..]}", scalar.Span, $"write for example `{kind.Example}`; {Accepted(kind)}");

    public static Problem Zero(QuantityKind kind, ScalarNode scalar)
        => Problem.Error("out-of-range", $"{kind.Noun} cannot be zero here", scalar.Span, "leave the key out if the value is not known");

    public static Problem Negative(QuantityKind kind, ScalarNode scalar)
        => Problem.Error("out-of-range", $"{kind.Noun} cannot be negative here", scalar.Span, "check the sign");

    public static Problem TooSmall(QuantityKind kind, ScalarNode scalar, StatedQuantity least)
        => Problem.Error("out-of-range", $"{kind.Noun} of {ProblemText.Quote(scalar.Text)} is beyond any sense: it must be at least {least}", scalar.Span,
            "check the number and the unit");

    public static Problem TooLarge(QuantityKind kind, ScalarNode scalar, StatedQuantity most)
        => Problem.Error("out-of-range", $"{kind.Noun} of {ProblemText.Quote(scalar.Text)} is beyond any sense: it must be at most {most}", scalar.Span,
            "check the number and the unit");

    private static string Accepted(QuantityKind kind) => kind.Dimension.IsNone
        ? "a number alone and % are accepted"
        : $"accepted units: {string.Join(", ", kind.AcceptedUnits)}";
}
