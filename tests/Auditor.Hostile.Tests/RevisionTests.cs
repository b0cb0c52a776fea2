namespace Auditor.Hostile.Tests;

/// <summary>Names of revisions that git could take for something else.</summary>
public sealed class RevisionTests : IDisposable
{
    private readonly HostileFolder _folder = new HostileFolder().Write("site.json", "{}");

    public RevisionTests() => Assert.Equal(0, ChildProgram.Run(_folder.Path, "git init --quiet . && git add site.json && git -c user.name=R -c user.email=r@yard.example commit --quiet -m first").Code);

    [Theory]
    [InlineData("--upload-pack=touch taken:site.json", "unknown-revision")]
    [InlineData("--output=taken:site.json", "unknown-revision")]
    [InlineData("--help:site.json", "unknown-revision")]
    [InlineData("-:site.json", "unknown-revision")]
    [InlineData("HEAD..HEAD:site.json", "unknown-revision")]
    [InlineData("HEAD...HEAD:site.json", "unknown-revision")]
    [InlineData("^HEAD:site.json", "unknown-revision")]
    [InlineData("HEAD --output=taken:site.json", "unknown-revision")]
    [InlineData("HEAD\n--output=taken:site.json", "unknown-revision")]
    [InlineData("../../../../etc/passwd:site.json", "unknown-revision")]
    [InlineData("$(touch taken):site.json", "unknown-revision")]
    [InlineData("`touch taken`;touch taken:site.json", "unknown-revision")]
    [InlineData("HEAD:../../../../etc/passwd.json", "unknown-path")]
    [InlineData("HEAD:/etc/passwd.json", "unknown-path")]
    [InlineData("HEAD:--help.json", "unknown-path")]
    [InlineData("HEAD:", "unknown-path")]
    public void A_hostile_revision_is_a_problem_and_runs_nothing(string revision, string code)
    {
        _folder.Write("argument", revision);

        var (exit, error) = ChildProgram.Run(_folder.Path, "$AUDITOR compare -- \"$(cat argument)\" site.json");

        Assert.Equal(2, exit);
        Assert.Contains($"error {code}: ", error, StringComparison.Ordinal);
        Assert.False(File.Exists(_folder.File("taken")));
    }

    public void Dispose() => _folder.Dispose();
}
