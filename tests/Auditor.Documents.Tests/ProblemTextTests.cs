namespace Auditor.Documents.Tests;

public class ProblemTextTests
{
    private static string Render(string text, int start, int end, string? help = null)
        => ProblemText.Render([Problem.Error("code", "message", new SourceSpan(new SourceText("a.yaml", text), start, end), help)]);

    [Fact]
    public void A_problem_is_shown_with_its_line_and_a_mark()
        => Assert.Equal("""
            a.yaml:2:4: error code: message
                2 | b: two
                  |    ^^^
                  = help

            """, Render("a: 1\nb: two\n", 8, 11, "help"));

    [Fact]
    public void A_warning_without_a_place_is_one_line()
        => Assert.Equal("warning code: message\n", ProblemText.Render([Problem.Warning("code", "message", null)]));

    [Fact]
    public void A_second_place_is_shown_in_the_same_way()
    {
        var source = new SourceText("a.yaml", "a: 1\nb: 2\n");
        var problem = Problem.Error("code", "message", new SourceSpan(source, 5, 6), "help", new ProblemLabel(new SourceSpan(source, 0, 1), "first here"));

        Assert.Equal("""
            a.yaml:2:1: error code: message
                2 | b: 2
                  | ^
                  a.yaml:1:1: first here
                1 | a: 1
                  | ^
                  = help

            """, ProblemText.Render([problem]));
    }

    [Fact]
    public void A_file_that_has_no_text_is_shown_by_its_path()
        => Assert.Equal("a.yaml: error code: message\n", Render("", 0, 0));

    [Fact]
    public void Two_problems_stand_apart()
        => Assert.Equal("error a: b\n\nerror c: d\n", ProblemText.Render([Problem.Error("a", "b", null), Problem.Error("c", "d", null)]));

    [Fact]
    public void No_problems_are_no_text() => Assert.Equal("", ProblemText.Render([]));

    [Fact]
    public void A_mark_of_several_lines_ends_with_the_first()
        => Assert.Equal("a.yaml:1:4: error code: message\n    1 | a: one\n      |    ^^^\n", Render("a: one\n  two\n", 3, 12));

    [Fact]
    public void An_empty_place_has_one_mark()
        => Assert.Equal("a.yaml:1:3: error code: message\n    1 | a:\n      |   ^\n", Render("a:\nb: 1", 2, 2));

    [Fact]
    public void Tabs_and_control_characters_take_one_cell_each()
        => Assert.Equal("a.yaml:1:6: error code: message\n    1 | a � �b\n      |      ^\n", Render("a\t\u001b\t\u202eb", 5, 6));

    [Fact]
    public void A_character_of_two_code_units_takes_one_cell()
        => Assert.Equal("a.yaml:1:4: error code: message\n    1 | 𝄞 b\n      |   ^\n", Render("𝄞 b", 3, 4));

    [Theory]
    [InlineData(0, 1)]
    [InlineData(150, 160)]
    [InlineData(5_000, 5_400)]
    [InlineData(9_999, 10_000)]
    [InlineData(10_000, 10_000)]
    public void A_long_line_is_cut_around_the_mark(int start, int end)
    {
        var text = string.Concat(Enumerable.Range(0, 2_000).Select(i => $"{i:0000} "));

        var lines = Render(text, start, end).Split('\n');

        Assert.InRange(lines[1].Length, 20, 110);
        Assert.InRange(lines[2].Length, 1, 112);
        var mark = lines[2].IndexOf('^');
        var marked = lines[1].PadRight(mark + 1)[mark];
        Assert.Equal(text.PadRight(10_001)[start], marked);
    }

    [Fact]
    public void The_column_of_line_numbers_widens_for_long_files()
        => Assert.StartsWith("a.yaml:123456:1: error code: message\n123456 | x\n       | ^\n", Render(new string('\n', 123_455) + "x", 123_455, 123_456));

    [Fact]
    public void A_quoted_text_is_cut_and_made_fit_to_show()
    {
        Assert.Equal("`word`", ProblemText.Quote("word"));
        Assert.Equal("`a�b c`", ProblemText.Quote("a\nb\tc"));
        Assert.Equal("`" + new string('x', 60) + "`", ProblemText.Quote(new string('x', 60)));
        Assert.Equal("`" + new string('x', 59) + "…`", ProblemText.Quote(new string('x', 61)));
        Assert.Equal("`" + new string('x', 59) + "…`", ProblemText.Quote(new string('x', 1_000_000)));
    }
}
