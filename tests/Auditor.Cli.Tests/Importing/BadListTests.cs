using Auditor.Testing;

namespace Auditor.Cli.Tests.Importing;

/// <summary>Each list in <c>lists/</c> is bad in a way of its own; all that is wrong with it is told at once.</summary>
public class BadListTests
{
    private const string Folder = "tests/Auditor.Cli.Tests/Importing/lists";

    public static TheoryData<string> Lists =>
        [.. Directory.EnumerateFiles(Repository.PathOf(Folder), "*.csv").Select(file => Path.GetFileName(file)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Lists))]
    public void A_bad_list_is_told_in_full_with_row_and_column_and_what_to_do(string list)
    {
        using var folder = new TemporaryFolder();
        folder.CopyFrom(Repository.PathOf(Folder));

        var result = Tool.RunIn(folder.Path, ["import", list, .. CircuitLists.Supply, "--write", "a.design.yaml"]);

        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.False(File.Exists(folder.File("a.design.yaml")));
        Golden.Match(result.Error, $"{Folder}/{Path.GetFileNameWithoutExtension(list)}");
    }

    [Fact]
    public void What_the_caller_leaves_out_or_gets_wrong_is_told_at_once_too()
    {
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.File("a.csv"), "board,id\nA,1\n");

        var none = Tool.RunIn(folder.Path, ["import"]);
        var some = Tool.RunIn(folder.Path, ["import", "a.csv", "--earthing", "TNS", "--phases", "2", "--voltage", "400"]);

        Assert.Equal(2, none.Code);
        Assert.EndsWith("\n4 problems\n", none.Error, StringComparison.Ordinal);
        Assert.Equal(2, some.Code);
        Assert.Contains("--earthing:1:1: error unknown-word: `TNS` is not an earthing system", some.Error, StringComparison.Ordinal);
        Assert.Contains("--phases:1:1: error unknown-word", some.Error, StringComparison.Ordinal);
        Assert.Contains("--voltage:1:1: error unit-missing", some.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(new byte[] { 0x62, 0x2C, 0xFF, 0x0A })]
    [InlineData(new byte[] { 0xFF, 0xFE, 0x62, 0x00 })]
    [InlineData(new byte[] { 0x62, 0x00, 0x2C, 0x0A })]
    [InlineData(new byte[] { })]
    public void What_is_no_text_is_told_and_not_read(byte[] bytes)
    {
        using var folder = new TemporaryFolder();
        File.WriteAllBytes(folder.File("a.csv"), bytes);

        var result = Tool.RunIn(folder.Path, ["import", "a.csv", .. CircuitLists.Supply]);

        Assert.Equal((2, ""), (result.Code, result.Output));
        Assert.StartsWith("a.csv", result.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_quote_that_is_never_closed_in_a_large_list_is_told_where_it_opens()
    {
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.File("a.csv"), "board,id,name\nA,1,\"never" + string.Concat(Enumerable.Repeat("\nA,2,x", 200_000)));

        var result = Tool.RunIn(folder.Path, ["import", "a.csv", .. CircuitLists.Supply]);

        Assert.Equal(2, result.Code);
        Assert.StartsWith("a.csv:2:5: error bad-quotes: a quote is opened and never closed", result.Error, StringComparison.Ordinal);
    }
}
