using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Formulas.Values;
using CsCheck;

namespace Auditor.Limits.Tests.Properties;

/// <summary>
/// Verdicts and figures do not depend on the order in which a design says things: its keys, its boards, their circuits, the legs of a run,
/// and whether a board stands in the design or in a file of its own. Of boards that state no feed only the first may be the one at the origin;
/// here it says so itself.
/// </summary>
public class OrderProperties
{
    private const int Designs = 40;

    /// <summary>Sums of the same numbers in another order differ by so much of themselves at the most.</summary>
    private const double Same = 1e-12;

    [Fact]
    public void Keys_boards_circuits_and_legs_may_stand_in_any_order() => Gen.Select(Plans.Any, Gen.Int[0, int.MaxValue]).Sample((plan, seed) =>
    {
        var problems = new Problems();
        var root = (MappingNode)YamlReader.Read(new SourceText("plan.design.yaml", plan.Text().Replace("  - id: MB\n", "  - id: MB\n    fed-from: origin\n", StringComparison.Ordinal)), problems)!;
        var shuffled = (MappingNode)Shuffled(root, new Random(seed));
        AssertSame(Build(root), Build(shuffled));
    }, iter: Designs);

    [Fact]
    public void A_board_may_stand_in_a_file_of_its_own() => Plans.Any.Sample(plan =>
    {
        var text = plan.Text();
        var at = text.IndexOf("  - id: SB\n", StringComparison.Ordinal);
        var board = string.Concat(text[at..].Split('\n').Select(line => (line.Length > 4 ? line[4..] : line) + "\n"));
        var whole = text[..at] + "  - include: second.board.yaml\n";
        var folder = Directory.CreateTempSubdirectory("apart-");
        try
        {
            File.WriteAllText(Path.Combine(folder.FullName, "plan.design.yaml"), whole);
            File.WriteAllText(Path.Combine(folder.FullName, "second.board.yaml"), board);
            var problems = new Problems();
            var file = DesignFile.Read(Path.Combine(folder.FullName, "plan.design.yaml"), "plan.design.yaml", problems)!;
            Assert.Equal("", ProblemText.Render(problems.All));
            AssertSame(plan.Build(Shipped.UnitedKingdom), Build(file.Root));
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }, iter: Designs);

    private static Node Shuffled(Node node, Random random)
    {
        switch (node)
        {
            case MappingNode mapping:
                var entries = mapping.Entries.Select(entry => entry with { Value = Shuffled(entry.Value, random) }).ToArray();
                random.Shuffle(entries);
                return new MappingNode(mapping.Span, entries);
            case SequenceNode sequence:
                var items = sequence.Items.Select(item => Shuffled(item, random)).ToArray();
                random.Shuffle(items);
                return new SequenceNode(sequence.Span, items);
            default:
                return node;
        }
    }

    private static Design Build(MappingNode root)
    {
        var problems = new Problems();
        Shipped.UnitedKingdom.Schema.Validation.Validate(root, problems);
        var design = DesignBuilder.Build(new DesignFile("plan.design.yaml", root, []), new Evaluator(Shipped.UnitedKingdom), problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return design!;
    }

    private static void AssertSame(Design one, Design other)
    {
        Assert.Equal(one.Subjects.Select(subject => subject.Key).Order(StringComparer.Ordinal), other.Subjects.Select(subject => subject.Key).Order(StringComparer.Ordinal));
        foreach (var subject in one.Subjects)
        {
            var twin = other.Find(subject.Key)!;
            Assert.All(subject.Shape.Quantities, slot => AssertSame(subject.Quantity(slot.Index), twin.Quantity(slot.Index), $"{subject.Key} {slot.Symbol}"));
            foreach (var rule in Shipped.UnitedKingdom.RulesOf(subject.Shape))
            {
                var (first, second) = (Judge.Decide(rule, subject.Scope), Judge.Decide(rule, twin.Scope));
                Assert.True(first.Verdict == second.Verdict && first.Marks == second.Marks, $"{rule.Id}:{subject.Key} {first.Verdict} and {second.Verdict}");
                AssertSame(first.Value, second.Value, $"{rule.Id}:{subject.Key}");
            }
        }
    }

    private static void AssertSame(in Value one, in Value other, string where)
    {
        Assert.True(one.Kind == other.Kind, $"{where}: {one.Kind} and {other.Kind}");
        switch (one.Kind)
        {
            case ValueKind.Text:
                Assert.Equal(one.Text, other.Text);
                break;
            case ValueKind.Words:
                Assert.Equal(one.Words.Order(StringComparer.Ordinal), other.Words.Order(StringComparer.Ordinal));
                break;
            default:
                var off = Math.Abs(one.Number - other.Number);
                Assert.True(off <= (Same * Math.Max(Math.Abs(one.Number), Math.Abs(other.Number))) + 1e-15, $"{where}: {one.Number:R} and {other.Number:R}");
                break;
        }
    }
}
