using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;
using static Microsoft.CodeAnalysis.CSharp.SyntaxFactory;

namespace Auditor.Mutation;

/// <summary>
/// Plants every mutant of a file beside what stands there, behind a question to <see cref="Switch"/>: limits of comparisons, arithmetic,
/// "and" and "or", conditions turned round, statements left out, flags, least and greatest, any and all, a default given back.
/// </summary>
/// <param name="file">Path of the file within the source folder.</param>
/// <param name="next">The number of its first mutant.</param>
/// <param name="dropped">Mutants that do not compile, and so are not planted; they keep their numbers.</param>
internal sealed class Planter(string file, int next, IReadOnlySet<int> dropped) : CSharpSyntaxRewriter
{
    /// <summary>Kind of the annotation that a planted node bears, with the numbers of its mutants.</summary>
    public const string Mark = "mutants";

    private static readonly Dictionary<SyntaxKind, SyntaxKind[]> Operators = new()
    {
        [SyntaxKind.LessThanExpression] = [SyntaxKind.LessThanOrEqualExpression, SyntaxKind.GreaterThanOrEqualExpression],
        [SyntaxKind.LessThanOrEqualExpression] = [SyntaxKind.LessThanExpression, SyntaxKind.GreaterThanExpression],
        [SyntaxKind.GreaterThanExpression] = [SyntaxKind.GreaterThanOrEqualExpression, SyntaxKind.LessThanOrEqualExpression],
        [SyntaxKind.GreaterThanOrEqualExpression] = [SyntaxKind.GreaterThanExpression, SyntaxKind.LessThanExpression],
        [SyntaxKind.EqualsExpression] = [SyntaxKind.NotEqualsExpression],
        [SyntaxKind.NotEqualsExpression] = [SyntaxKind.EqualsExpression],
        [SyntaxKind.AddExpression] = [SyntaxKind.SubtractExpression],
        [SyntaxKind.SubtractExpression] = [SyntaxKind.AddExpression],
        [SyntaxKind.MultiplyExpression] = [SyntaxKind.DivideExpression],
        [SyntaxKind.DivideExpression] = [SyntaxKind.MultiplyExpression],
        [SyntaxKind.ModuloExpression] = [SyntaxKind.MultiplyExpression],
        [SyntaxKind.LogicalAndExpression] = [SyntaxKind.LogicalOrExpression],
        [SyntaxKind.LogicalOrExpression] = [SyntaxKind.LogicalAndExpression],
    };

    private static readonly Dictionary<string, string> Opposites = new(StringComparer.Ordinal)
    {
        ["Min"] = "Max",
        ["Max"] = "Min",
        ["Any"] = "All",
        ["All"] = "Any",
        ["AtMost"] = "AtLeast",
        ["AtLeast"] = "AtMost",
    };

    /// <summary>The mutants planted.</summary>
    public List<Mutant> Mutants { get; } = [];

    /// <summary>The number after that of the last mutant.</summary>
    public int Next { get; private set; } = next;

    public override SyntaxNode? Visit(SyntaxNode? node) => node switch
    {
        AttributeListSyntax or PatternSyntax or EnumDeclarationSyntax or ParameterListSyntax or CaseSwitchLabelSyntax => node,
        FieldDeclarationSyntax field when field.Modifiers.Any(SyntaxKind.ConstKeyword) => node,
        LocalDeclarationStatementSyntax { IsConst: true } => node,
        InvocationExpressionSyntax { Expression: IdentifierNameSyntax { Identifier.Text: "nameof" } } => node,
        _ => base.Visit(node),
    };

    public override SyntaxNode? VisitBinaryExpression(BinaryExpressionSyntax node)
    {
        var visited = (ExpressionSyntax)base.VisitBinaryExpression(node)!;
        return Operators.TryGetValue(node.Kind(), out var others) && !Declares(node)
            ? Plant(node, visited, [.. others.Select(other => (ExpressionSyntax)BinaryExpression(other, node.Left.WithoutTrivia(), node.Right.WithoutTrivia()))])
            : visited;
    }

    public override SyntaxNode? VisitPrefixUnaryExpression(PrefixUnaryExpressionSyntax node)
    {
        var visited = (ExpressionSyntax)base.VisitPrefixUnaryExpression(node)!;
        return node.IsKind(SyntaxKind.LogicalNotExpression) || node.IsKind(SyntaxKind.UnaryMinusExpression) ? Plant(node, visited, node.Operand) : visited;
    }

    public override SyntaxNode? VisitLiteralExpression(LiteralExpressionSyntax node) => node.Kind() switch
    {
        SyntaxKind.TrueLiteralExpression => Plant(node, node, LiteralExpression(SyntaxKind.FalseLiteralExpression)),
        SyntaxKind.FalseLiteralExpression => Plant(node, node, LiteralExpression(SyntaxKind.TrueLiteralExpression)),
        _ => node,
    };

    public override SyntaxNode? VisitInvocationExpression(InvocationExpressionSyntax node)
    {
        var visited = (ExpressionSyntax)base.VisitInvocationExpression(node)!;
        return node.Expression is MemberAccessExpressionSyntax { Name: IdentifierNameSyntax { Identifier.Text: var name } } access && Opposites.TryGetValue(name, out var other) && !Declares(node)
            ? Plant(node, visited, node.WithExpression(access.WithName(IdentifierName(other))))
            : visited;
    }

    public override SyntaxNode? VisitConditionalExpression(ConditionalExpressionSyntax node)
    {
        var visited = (ConditionalExpressionSyntax)base.VisitConditionalExpression(node)!;
        return visited.WithCondition(Turned(node.Condition, visited.Condition));
    }

    public override SyntaxNode? VisitIfStatement(IfStatementSyntax node)
    {
        var visited = (IfStatementSyntax)base.VisitIfStatement(node)!;
        return visited.WithCondition(Turned(node.Condition, visited.Condition));
    }

    public override SyntaxNode? VisitExpressionStatement(ExpressionStatementSyntax node)
    {
        var visited = (StatementSyntax)base.VisitExpressionStatement(node)!;
        var (id, marked) = Number(node, $"{node} → nothing");
        return dropped.Contains(id) ? visited : IfStatement(PrefixUnaryExpression(SyntaxKind.LogicalNotExpression, Question(id)), Block(visited)).WithAdditionalAnnotations(marked);
    }

    public override SyntaxNode? VisitReturnStatement(ReturnStatementSyntax node)
    {
        var visited = (ReturnStatementSyntax)base.VisitReturnStatement(node)!;
        return node.Expression is null ? visited : visited.WithExpression(Emptied(node.Expression, visited.Expression!)).WithReturnKeyword(Token(TriviaList(), SyntaxKind.ReturnKeyword, TriviaList(Space)));
    }

    public override SyntaxNode? VisitArrowExpressionClause(ArrowExpressionClauseSyntax node)
    {
        var visited = (ArrowExpressionClauseSyntax)base.VisitArrowExpressionClause(node)!;
        var givesNothing = node.Parent is MethodDeclarationSyntax { ReturnType: PredefinedTypeSyntax { Keyword.RawKind: (int)SyntaxKind.VoidKeyword } } or ConstructorDeclarationSyntax;
        return givesNothing ? visited : visited.WithExpression(Emptied(node.Expression, visited.Expression));
    }

    private ExpressionSyntax Turned(ExpressionSyntax condition, ExpressionSyntax visited) =>
        condition is BinaryExpressionSyntax or PrefixUnaryExpressionSyntax || Declares(condition)
            ? visited
            : Plant(condition, visited, PrefixUnaryExpression(SyntaxKind.LogicalNotExpression, ParenthesizedExpression(condition.WithoutTrivia())));

    private ExpressionSyntax Emptied(ExpressionSyntax given, ExpressionSyntax visited) => given.Kind() is SyntaxKind.NullLiteralExpression or SyntaxKind.FalseLiteralExpression or SyntaxKind.ThrowExpression
        ? visited
        : Plant(given, visited, PostfixUnaryExpression(SyntaxKind.SuppressNullableWarningExpression, LiteralExpression(SyntaxKind.DefaultLiteralExpression)));

    /// <summary>A mutant stands before what it takes the place of, with its parts as they were written: only one is at work at a time.</summary>
    private ExpressionSyntax Plant(ExpressionSyntax node, ExpressionSyntax visited, params ExpressionSyntax[] others)
    {
        var planted = visited.WithoutTrivia();
        foreach (var other in others.Reverse())
        {
            var (id, marked) = Number(node, $"{node} → {other.NormalizeWhitespace()}");
            planted = dropped.Contains(id)
                ? planted
                : ParenthesizedExpression(ConditionalExpression(Question(id), ParenthesizedExpression(other.WithoutTrivia()), Wrapped(planted))).WithAdditionalAnnotations(marked);
        }

        return planted;
    }

    private static ExpressionSyntax Wrapped(ExpressionSyntax planted) =>
        planted is ParenthesizedExpressionSyntax or LiteralExpressionSyntax or CollectionExpressionSyntax or ImplicitObjectCreationExpressionSyntax ? planted : ParenthesizedExpression(planted);

    private (int Id, SyntaxAnnotation Mark) Number(SyntaxNode node, string change)
    {
        var id = Next++;
        if (!dropped.Contains(id))
        {
            Mutants.Add(new Mutant(id, $"{file}:{node.GetLocation().GetLineSpan().StartLinePosition.Line + 1}", string.Join(' ', change.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries))));
        }

        return (id, new SyntaxAnnotation(Mark, $"{id}"));
    }

    private static InvocationExpressionSyntax Question(int id) =>
        InvocationExpression(ParseExpression($"global::{Switch.FullName}.Is"), ArgumentList(SingletonSeparatedList(Argument(LiteralExpression(SyntaxKind.NumericLiteralExpression, Literal(id))))));

    /// <summary>A name that a part declares cannot be declared in two places.</summary>
    private static bool Declares(SyntaxNode node) => node.DescendantNodes().Any(part => part is SingleVariableDesignationSyntax);
}
