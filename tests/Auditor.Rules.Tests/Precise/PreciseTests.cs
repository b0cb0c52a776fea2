using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;
using Auditor.Rules.Tests.Network;
using Auditor.Testing;
using CsCheck;

namespace Auditor.Rules.Tests.Precise;

/// <summary>Every quantity of every subject, and what every rule compares, worked out again in numbers of twice the digits.</summary>
public class PreciseTests
{
    private const double Same = 1e-9;

    /// <summary>What doubles leave where the difference of two like shares is nought.</summary>
    private const double Nought = 1e-15;

    private const double LastDigits = 1e-14;

    private const string NeutralCurrent = "I_N";

    private static readonly string[] LineCurrents = ["I_L1", "I_L2", "I_L3"];

    public static TheoryData<string> Examples() =>
        [.. Directory.EnumerateFiles(Repository.PathOf("examples"), "*.design.yaml", SearchOption.AllDirectories).Select(path => Path.GetRelativePath(Repository.Root, path)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Examples))]
    public void The_figures_of_the_examples_are_those_of_twice_the_digits(string path)
    {
        var problems = new Problems();
        var file = DesignFile.Read(Repository.PathOf(path), path, problems)!;
        var set = file.RuleSet is { Text: var name } && name.EndsWith(".yaml", StringComparison.Ordinal)
            ? RuleSetLoader.Load(Shipped.Home, name, Path.GetDirectoryName(Repository.PathOf(path))!, null, problems)!
            : Shipped.Set(file.RuleSet?.Text ?? Shipped.UnitedKingdom);
        var design = DesignBuilder.Build(file, new Evaluator(set), problems)!;
        Assert.False(problems.HasErrors, ProblemText.Render(problems.All));

        Assert.InRange(Compare(design, set), 100, int.MaxValue);
    }

    [Fact]
    public void The_figures_of_random_designs_are_those_of_twice_the_digits() => FeederTrees.Any.Sample(
        tree => Compare(AuditedDesign.Read(DesignText.Of(tree, withDiversity: true)).Design, Shipped.Set(Shipped.UnitedKingdom)) > 100,
        iter: 15, threads: 1);

    /// <summary>Fails where the two differ.</summary>
    /// <returns>How many numbers were compared.</returns>
    private static int Compare(Design design, RuleSet set)
    {
        var precise = new PreciseEvaluator(set);
        var numbers = 0;
        foreach (var subject in design.Subjects)
        {
            foreach (var slot in subject.Shape.Quantities)
            {
                var expected = precise.Quantity(subject, slot.Index);
                numbers += Agree(expected, subject.Quantity(slot.Index), $"{subject.Key} {slot.Symbol}", slot.Symbol == NeutralCurrent ? OfLikeSquares(subject, expected) : Nought);
            }

            foreach (var rule in set.RulesOf(subject.Shape).Where(rule => set.Rules.Contains(rule)))
            {
                foreach (var formula in rule.Check.Limits.Append(rule.Check.Value).Concat(rule.When is { } when ? [when] : []))
                {
                    numbers += Agree(precise.Formula(formula.Text, subject), formula.Evaluate(subject.Scope), $"{subject.Key} {rule.Id}: {formula.Text}");
                }
            }
        }

        return numbers;
    }

    /// <summary>
    /// What doubles leave of a neutral current where the line currents are alike: its square is a difference of squares of theirs, and
    /// is good to the last digits of those.
    /// </summary>
    private static double OfLikeSquares(DesignSubject board, object? expected)
    {
        var squares = LineCurrents.Select(symbol => board.Quantity(board.Shape.Quantity(symbol)!.Index).Number).Sum(current => current * current);
        return expected is DoubleDouble { High: var current } && current * current > LastDigits * squares ? LastDigits * squares / current : Math.Sqrt(LastDigits * squares);
    }

    private static int Agree(object? expected, in Value found, string where, double slack = Nought)
    {
        switch (expected)
        {
            case DoubleDouble number:
                Assert.True(found.Kind == ValueKind.Quantity, $"{where}: {found.Kind} for {number.High:R}");
                var off = ((DoubleDouble)found.Number - number).Abs().High;
                Assert.True(off <= (Same * Math.Abs(number.High)) + slack, $"{where}: {found.Number:R} for {number.High:R}");
                return 1;
            case IReadOnlyList<string> words:
                Assert.Equal(words, found.Words);
                return 0;
            default:
                Assert.True(
                    Equals(expected, found.Kind switch { ValueKind.Missing => null, ValueKind.Flag => found.Flag, ValueKind.Text => found.Text, _ => found.Kind }),
                    $"{where}: {found.Kind} for {expected ?? "missing"}");
                return 0;
        }
    }
}
