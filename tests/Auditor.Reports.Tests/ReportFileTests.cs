using Auditor.Documents;
using Auditor.Reports.Files;

namespace Auditor.Reports.Tests;

public class ReportFileTests
{
    [Fact]
    public void A_report_takes_the_place_of_an_earlier_one()
    {
        using var folder = new TemporaryFolder();
        var path = folder.Write("report.md", "a much longer report of yesterday");
        var problems = new Problems();

        Assert.True(ReportFile.Write(path, "new"u8.ToArray(), problems));

        Assert.Equal("new", File.ReadAllText(path));
        Assert.Equal([path], Directory.GetFileSystemEntries(folder.Path));
        Assert.Empty(problems.All);
    }

    [Fact]
    public void A_name_as_long_as_names_may_be_can_be_written()
    {
        using var folder = new TemporaryFolder();
        var path = Path.Combine(folder.Path, new string('n', 252) + ".md");

        Assert.True(ReportFile.Write(path, "new"u8.ToArray(), new Problems()));

        Assert.Equal("new", File.ReadAllText(path));
    }

    [Fact]
    public void A_name_that_is_too_long_leaves_nothing_behind()
    {
        using var folder = new TemporaryFolder();
        folder.Write("report.md", "old");
        var problems = new Problems();

        Assert.False(ReportFile.Write(Path.Combine(folder.Path, new string('n', 300) + ".md"), "new"u8.ToArray(), problems));

        Assert.Equal("report-not-written", Assert.Single(problems.All).Code);
        Assert.Equal(["report.md"], Directory.GetFileSystemEntries(folder.Path).Select(Path.GetFileName));
    }

    [Fact]
    public void A_folder_is_no_file_to_write()
    {
        using var folder = new TemporaryFolder();
        folder.Write("report.md/inside", "old");
        var problems = new Problems();

        Assert.False(ReportFile.Write(Path.Combine(folder.Path, "report.md"), "new"u8.ToArray(), problems));

        Assert.Contains("it is a folder", Assert.Single(problems.All).Message, StringComparison.Ordinal);
        Assert.Equal("old", File.ReadAllText(Path.Combine(folder.Path, "report.md", "inside")));
        Assert.Single(Directory.GetFileSystemEntries(folder.Path));
    }

    [Fact]
    public void A_folder_that_is_not_there_is_not_made()
    {
        using var folder = new TemporaryFolder();
        var problems = new Problems();

        Assert.False(ReportFile.Write(Path.Combine(folder.Path, "none", "report.md"), "new"u8.ToArray(), problems));

        Assert.Contains("its folder does not exist", Assert.Single(problems.All).Message, StringComparison.Ordinal);
        Assert.Empty(Directory.GetFileSystemEntries(folder.Path));
    }

    [Fact]
    public void Where_nothing_may_be_written_the_earlier_file_stays_intact()
    {
        using var folder = new TemporaryFolder();
        var (path, before) = FileInUnwritableFolder(folder);
        var problems = new Problems();

        Assert.False(ReportFile.Write(path, "new"u8.ToArray(), problems));

        var problem = Assert.Single(problems.All);
        Assert.Equal("report-not-written", problem.Code);
        Assert.EndsWith("what was there is unchanged", problem.Message, StringComparison.Ordinal);
        Assert.Equal(before, File.ReadAllText(path));
    }

    /// <summary>
    /// A file that is there, in a folder that takes no new one. Permissions do not stop a privileged user; the folder of processes stops everybody.
    /// </summary>
    private static (string Path, string Content) FileInUnwritableFolder(TemporaryFolder folder)
    {
        var path = folder.Write("closed/report.md", "old");
        if (Environment.IsPrivilegedProcess || OperatingSystem.IsWindows())
        {
            const string KernelVersion = "/proc/version";
            return (KernelVersion, File.ReadAllText(KernelVersion));
        }

        File.SetUnixFileMode(Path.GetDirectoryName(path)!, UnixFileMode.UserRead | UnixFileMode.UserExecute);
        return (path, "old");
    }

    [Theory]
    [InlineData("out/report.txt", ".txt")]
    [InlineData("report.MD", ".md")]
    [InlineData("a.b.json", ".json")]
    public void The_ending_names_the_format(string path, string ending) => Assert.Equal(ending, ReportFormat.Of(path, new Problems())!.Ending);

    [Theory]
    [InlineData("report")]
    [InlineData("report.docx")]
    [InlineData("md")]
    public void An_ending_that_names_no_format_is_told_with_those_that_do(string path)
    {
        var problems = new Problems();

        Assert.Null(ReportFormat.Of(path, problems));

        Assert.Equal("known endings: .txt, .md, .html, .json, .sarif, .xml, .csv", Assert.Single(problems.All).Help);
    }
}
