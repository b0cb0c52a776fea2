using Auditor.Testing;

namespace Auditor.Documents.Tests;

public sealed class GoldenTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    private string Case => Path.Combine(_folder.Path, "case");

    [Fact]
    public void The_same_text_passes_and_leaves_nothing_behind()
    {
        _folder.Write("case.approved.txt", "one\ntwo\n");

        Golden.Match("one\ntwo\n", Case);

        Assert.Single(Directory.GetFiles(_folder.Path));
    }

    [Theory]
    [InlineData("one\nthree\n")]
    [InlineData("one\ntwo")]
    [InlineData("")]
    public void Another_text_fails_and_is_left_to_compare(string text)
    {
        _folder.Write("case.approved.txt", "one\ntwo\n");

        Assert.ThrowsAny<Exception>(() => Golden.Match(text, Case));

        Assert.Equal(text, File.ReadAllText(Case + ".received.txt"));
        Assert.Equal("one\ntwo\n", File.ReadAllText(Case + ".approved.txt"));
    }

    [Fact]
    public void A_missing_golden_file_fails_and_is_not_written()
    {
        Assert.ThrowsAny<Exception>(() => Golden.Match("text", Case));

        Assert.False(File.Exists(Case + ".approved.txt"));
    }

    [Fact]
    public void A_golden_file_that_belongs_to_nothing_is_an_orphan()
    {
        _folder.Write("one.yaml", "");
        _folder.Write("one.approved.txt", "");
        _folder.Write("two/plan.yaml", "");
        _folder.Write("two.approved.txt", "");
        _folder.Write("deep/three.approved.txt", "");
        _folder.Write("deep/three.received.txt", "");
        _folder.Write("deep/threefold.yaml", "");

        Assert.Equal([Path.Combine("deep", "three.approved.txt")], Golden.OrphansBelow(_folder.Path));
    }
}
