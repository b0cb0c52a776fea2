using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using CsCheck;

namespace Auditor.Formulas.Tests;

public class FormulaProperties
{
    private static readonly Gen<string> Fragments = Gen.OneOf(
        "Z", "n", "kind", "on", "serves", "rcd", "legs", "length", "up", "this", "param", "none", "cmin",
        "sum_of", "choose", "given", "table", "min", "sqrt", "'", "\"", "`", "'C'",
        "(", ")", "(", ")", "[", "]", "{", "}", ",", ".", "..", "?.", "+", "-", "*", "/", "^", "==", "!=", "<", ">=", "&&", "||", "!", "??", "?", ":", "|", "=", ";", "#", "##",
        "$", "@", "%", "1", "2.5", "0x1", "1e5", "1e999999999", "V", "mm2", "ohm", "true", "null",
        "if", "end", "for", "func", "do", "ret", "in", "\\", "\\u", "\n", "\t", "Ω", "🗲", "²", " ", " ", " ");

    private static readonly Gen<string> Texts = Gen.OneOf(
        Fragments.Array[0, 25].Select(string.Concat), Fragments.Array[0, 12].Select(words => string.Join(' ', words)),
        Gen.Char[' ', '~'].Array[0, 30].Select(chars => new string(chars)),
        Gen.String);

    [Fact]
    public void No_text_makes_the_binder_throw_or_fail_in_silence() => Texts.Sample(
        text =>
        {
            var formula = Bound.TryFormula(text, Plant.Circuit, out var problems);

            Assert.Equal(formula is null, problems.HasErrors);
            Assert.All(problems.All, problem => Assert.InRange(problem.Span!.Value.End, problem.Span.Value.Start, text.Length));
            Assert.NotNull(ProblemText.Render(problems.All));
        },
        iter: 20_000);

    [Fact]
    public void Arithmetic_agrees_with_plain_doubles() => Gen.Select(Grammar.Plain, Circuits.Values).Where((piece, _) => Fits(piece.Text)).Sample(
        (piece, values) =>
        {
            var value = Bound.Value(piece.Text, Circuits.Of(values));

            if (piece.Value(values) is not double expected)
            {
                Assert.True(value.IsMissing);
                return;
            }

            Assert.Equal(ValueKind.Quantity, value.Kind);
            Assert.True(expected == value.Number || Math.Abs(expected - value.Number) <= 1e-12 * Math.Abs(expected), $"{piece.Text}: {value.Number:R} for {expected:R}");
        },
        iter: 4_000);

    [Fact]
    public void No_formula_throws_on_any_subject_and_each_gives_what_its_type_says() =>
        Gen.Select(Grammar.Rich, Circuits.Any).Where((piece, _) => Fits(piece.Text)).Sample(
            (piece, circuit) =>
            {
                var formula = Bound.Formula(piece.Text);
                var value = formula.Evaluate(circuit.Scope);
                var traced = formula.Evaluate(new Scope(circuit, null, new Spy()));

                Assert.Equal(FormulaType.Number, formula.Type);
                Assert.True(value.IsMissing || (value.Kind == ValueKind.Quantity && double.IsFinite(value.Number)));
                Assert.True(value.IsMissing == (value.Kind == ValueKind.Missing) && (!value.IsMissing || value.Absences.Items.Count is > 0 and <= Absences.Most));
                Assert.Equal(Described(value), Described(traced));
            },
            iter: 4_000);

    [Fact]
    public void What_is_told_of_a_part_stands_where_the_part_stands() =>
        Gen.Select(Grammar.Rich, Circuits.Any).Where((piece, _) => Fits(piece.Text)).Sample(
            (piece, circuit) =>
            {
                var spy = new Spy();
                Bound.Formula(piece.Text).Evaluate(new Scope(circuit, null, spy));

                var gathered = spy.Told.Select(told => told.Span).Where(span => span.Text.Contains("_of(legs")).ToArray();
                foreach (var (span, value, _) in spy.Told.Where(told => told.Span.Text != "rcd" && !gathered.Any(whole => Lies(told.Span, whole))))
                {
                    Assert.Equal(Described(value), Described(Bound.Formula(span.Text).Evaluate(circuit.Scope)));
                }
            },
            iter: 2_000);

    [Fact]
    public void A_fault_is_placed_at_just_the_part_that_is_wrong() =>
        Gen.Select(Grammar.Rich, Gen.Int[0, 1000], Gen.Bool).Where((piece, _, _) => Fits(piece.Text)).Sample(
            (piece, dice, isName) =>
            {
                var (start, length) = piece.Parts[dice % piece.Parts.Count];
                var part = piece.Text.Substring(start, length);
                var (before, wrong, after) = isName ? ("", "unknown_to_all", "") : ("choose(", $"(({part}) && on)", ", 1, 1)");
                var text = piece.Text[..start] + before + wrong + after + piece.Text[(start + length)..];
                if (!Fits(text) || Bound.TryFormula(part, Plant.Circuit, out _)?.Type.Kind != FormulaKind.Quantity)
                {
                    return;
                }

                Bound.TryFormula(text, Plant.Circuit, out var problems);

                var problem = Assert.Single(problems.All);
                Assert.Equal(isName ? wrong : part, problem.Span!.Value.Text);
                Assert.Equal(start + before.Length + (isName ? 0 : 2), problem.Span.Value.Start);
            },
            iter: 4_000);

    private static bool Fits(string text)
    {
        Bound.TryFormula(text, Plant.Circuit, out var problems);
        return problems.All.All(problem => problem.Code is not ("formula-too-long" or "formula-too-deep"));
    }

    private static bool Lies(SourceSpan part, SourceSpan whole) => part != whole && part.Start >= whole.Start && part.End <= whole.End;

    private static string Described(in Value value) => value.IsMissing ? Bound.Reasons(value) : $"{Bound.Shown(value)} {value.Marks}";
}
