using System.Globalization;
using System.Text.RegularExpressions;

namespace Auditor.Rules.Tests.Precise;

/// <summary>Reads the text of a formula without the program: by descent, one level of precedence after the other.</summary>
internal sealed partial class ExpressionReader
{
    /// <summary>From the loosest to the tightest.</summary>
    private static readonly string[][] Levels = [["??"], ["||"], ["&&"], ["==", "!="], ["<", "<=", ">", ">="], ["+", "-"], ["*", "/"]];

    private readonly List<string> _tokens;
    private int _at;

    private ExpressionReader(string text) => _tokens = [.. Token().Matches(text).Select(match => match.Value)];

    private string Next => _at < _tokens.Count ? _tokens[_at] : "";

    /// <summary>Reads a whole formula.</summary>
    public static Expression Read(string text)
    {
        var reader = new ExpressionReader(text);
        Assert.Equal(string.Concat(text.Where(letter => !char.IsWhiteSpace(letter))), string.Concat(string.Concat(reader._tokens).Where(letter => !char.IsWhiteSpace(letter))));
        var whole = reader.ReadLevel(0);
        Assert.Equal("", reader.Next);
        return whole;
    }

    private Expression ReadLevel(int level)
    {
        if (level == Levels.Length)
        {
            return ReadSigned();
        }

        var left = ReadLevel(level + 1);
        while (Levels[level].Contains(Next))
        {
            left = new Expression.Pair(Take(), left, ReadLevel(level + 1));
        }

        return left;
    }

    private Expression ReadSigned() => Next is "-" or "!" ? new Expression.Call(Take(), [ReadSigned()]) : ReadPower();

    private Expression ReadPower()
    {
        var left = ReadPart();
        return Next == "^" ? new Expression.Pair(Take(), left, ReadPart()) : left;
    }

    private Expression ReadPart()
    {
        var token = Take();
        if (token == "(")
        {
            var inner = ReadLevel(0);
            Assert.Equal(")", Take());
            return inner;
        }

        if (char.IsAsciiDigit(token[0]))
        {
            return new Expression.Number(double.Parse(token, CultureInfo.InvariantCulture), Next.Length > 0 && char.IsAsciiLetter(Next[0]) ? Take() : null);
        }

        if (token[0] is '\'' or '"')
        {
            return new Expression.Constant(token[1..^1]);
        }

        if (token is "true" or "false")
        {
            return new Expression.Constant(token == "true");
        }

        Assert.Matches("^[A-Za-z]", token);
        return Next == "(" ? new Expression.Call(token, ReadArguments()) : new Expression.Name(token.Split('.'));
    }

    private List<Expression> ReadArguments()
    {
        var arguments = new List<Expression>();
        do
        {
            Take();
            arguments.Add(ReadLevel(0));
        }
        while (Next == ",");

        Assert.Equal(")", Take());
        return arguments;
    }

    private string Take() => _tokens[_at++];

    [GeneratedRegex("""[0-9]+(\.[0-9]+)?([eE][-+]?[0-9]+)?|[A-Za-z_][A-Za-z_0-9]*(\.[A-Za-z_][A-Za-z_0-9]*)*|'[^']*'|"[^"]*"|\?\?|\|\||&&|[=!<>]=|[-+*/^<>!(),]""", RegexOptions.ExplicitCapture, matchTimeoutMilliseconds: 10_000)]
    private static partial Regex Token();
}
