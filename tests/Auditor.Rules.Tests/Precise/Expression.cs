namespace Auditor.Rules.Tests.Precise;

/// <summary>A part of a formula as <see cref="ExpressionReader"/> reads it.</summary>
internal abstract record Expression
{
    /// <summary>A number, with the name of its unit where it has one.</summary>
    public sealed record Number(double Written, string? Unit) : Expression;

    /// <summary>A text in quotes, or <c>true</c> or <c>false</c>.</summary>
    public sealed record Constant(object Value) : Expression;

    /// <summary>A name, with what stands before its dots.</summary>
    public sealed record Name(IReadOnlyList<string> Parts) : Expression;

    /// <summary>An operation of two parts.</summary>
    public sealed record Pair(string Sign, Expression Left, Expression Right) : Expression;

    /// <summary>A sign before a part, or a function of parts.</summary>
    public sealed record Call(string Function, IReadOnlyList<Expression> Arguments) : Expression;
}
