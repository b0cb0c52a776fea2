using System.Runtime.Versioning;
using Auditor.Hostile.Tests.Cases;

namespace Auditor.Hostile.Tests;

/// <summary>Files and folders that the user may not read or write. Nothing stops a privileged user, who therefore runs the program as nobody.</summary>
[SupportedOSPlatform("linux")]
public sealed class PermissionTests : IDisposable
{
    private const string AsNobody = "setpriv --reuid 65534 --regid 65534 --clear-groups ";
    private const UnixFileMode Open = UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute
        | UnixFileMode.GroupRead | UnixFileMode.GroupExecute | UnixFileMode.OtherRead | UnixFileMode.OtherExecute;

    private readonly HostileFolder _folder = new HostileFolder().With().Write("firm/provisions/none.txt", "").Write("firm/sheets/closed/a.yaml", "")
        .Write("designs/closed/b.design.yaml", Site.Good).Write("designs/a.design.yaml", Site.Good).Write("secret.design.yaml", Site.Good).Write("out/site.md", "old");

    public PermissionTests() => File.SetUnixFileMode(_folder.Path, Open);

    [Theory]
    [InlineData("designs/closed", "audit designs", "folder-unreadable")]
    [InlineData("firm/sheets/closed", "audit site.design.yaml", "folder-unreadable")]
    [InlineData("secret.design.yaml", "audit secret.design.yaml", "file-unreadable")]
    public void What_may_not_be_read_is_told_and_never_passed_over(string closed, string command, string code) => AssertTold(closed, UnixFileMode.None, command, code);

    [Fact]
    public void Where_nothing_may_be_written_nothing_is()
    {
        File.Delete(_folder.File("firm/sheets/closed/a.yaml"));
        AssertTold("out", UnixFileMode.UserRead | UnixFileMode.UserExecute | UnixFileMode.OtherRead | UnixFileMode.OtherExecute, "audit site.design.yaml --quiet --write out/site.md", "report-not-written");

        Assert.Equal("old", File.ReadAllText(_folder.File("out/site.md")));
    }

    public void Dispose()
    {
        foreach (var path in Directory.EnumerateDirectories(_folder.Path, "closed", SearchOption.AllDirectories).Append(_folder.File("out")))
        {
            File.SetUnixFileMode(path, Open);
        }

        _folder.Dispose();
    }

    private void AssertTold(string path, UnixFileMode mode, string command, string code)
    {
        File.SetUnixFileMode(_folder.File(path), mode);

        var (exit, error) = ChildProgram.Run(_folder.Path, $"HOME=/ {(Environment.IsPrivilegedProcess ? AsNobody : "")}$AUDITOR {command}");

        Assert.Equal(2, exit);
        Assert.Contains($"error {code}: ", error, StringComparison.Ordinal);
    }
}
