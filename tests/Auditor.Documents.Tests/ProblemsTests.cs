using CsCheck;

namespace Auditor.Documents.Tests;

public class ProblemsTests
{
    private static readonly SourceText First = new("a.yaml", new string('x', 1000));
    private static readonly SourceText Second = new("b.yaml", new string('x', 1000));

    private static Problem At(SourceText source, int offset, string code = "code") => Problem.Error(code, "message", new SourceSpan(source, offset, offset + 1));

    [Fact]
    public void Problems_are_sorted_by_path_then_offset_then_code()
    {
        var problems = new Problems();
        problems.Add(At(Second, 1));
        problems.Add(At(First, 10));
        problems.Add(At(First, 2, "z"));
        problems.Add(At(First, 2, "a"));
        problems.Add(Problem.Error("nowhere", "message", null));

        Assert.Equal(["nowhere", "a", "z", "code", "code"], problems.Codes());
        Assert.Equal([null, 2, 2, 10, 1], problems.All.Select(problem => problem.Span?.Start));
    }

    [Fact]
    public void A_problem_added_twice_is_kept_once()
    {
        var problems = new Problems();
        problems.Add(At(First, 1));
        problems.Add(At(new SourceText("a.yaml", new string('x', 1000)), 1));

        Assert.Single(problems.All);
    }

    [Fact]
    public void A_hundred_problems_of_a_file_are_all_kept()
    {
        var problems = new Problems();
        for (var i = 0; i < 100; i++)
        {
            problems.Add(At(First, i));
        }

        Assert.Equal(100, problems.All.Count);
        Assert.DoesNotContain("too-many-problems", problems.Codes());
    }

    [Fact]
    public void Of_more_than_a_hundred_the_first_are_kept_and_the_rest_is_mentioned()
    {
        var problems = new Problems();
        for (var i = 200; i > 0; i--)
        {
            problems.Add(At(First, i));
        }

        problems.Add(At(Second, 1));

        Assert.Equal(102, problems.All.Count);
        Assert.Equal(Enumerable.Range(1, 100), problems.All.Take(100).Select(problem => problem.Span!.Value.Start));
        Assert.Equal("too-many-problems", problems.All[100].Code);
        Assert.Equal("b.yaml", problems.All[101].Span!.Value.Source.Path);
    }

    [Fact]
    public void A_warning_is_no_error()
    {
        var problems = new Problems();
        problems.Add(Problem.Warning("code", "message", null));
        Assert.False(problems.HasErrors);

        problems.Add(At(First, 1));
        Assert.True(problems.HasErrors);
    }

    [Fact]
    public void An_error_that_is_not_shown_still_counts()
    {
        var problems = new Problems();
        for (var i = 0; i < 100; i++)
        {
            problems.Add(Problem.Warning("code", "message", new SourceSpan(First, i, i)));
        }

        problems.Add(At(First, 500));

        Assert.True(problems.HasErrors);
        Assert.Equal(Severity.Error, problems.All[^1].Severity);
    }

    [Fact]
    public void The_order_of_adding_changes_nothing()
    {
        var additions = Gen.Select(Gen.Int[0, 400], Gen.Bool, Gen.OneOf("p", "q")).Array[0, 300];
        Gen.Select(additions, Gen.Int).Sample((items, seed) =>
        {
            var shuffled = items.ToArray();
            new Random(seed).Shuffle(shuffled);
            Assert.Equal(ProblemText.Render(Collect(items).All), ProblemText.Render(Collect(shuffled).All));
        });

        static Problems Collect((int Offset, bool IsFirst, string Code)[] items)
        {
            var problems = new Problems();
            Parallel.ForEach(items, item => problems.Add(At(item.IsFirst ? First : Second, item.Offset, item.Code)));
            return problems;
        }
    }
}
