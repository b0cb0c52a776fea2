using Auditor.Hostile.Tests.Cases;

namespace Auditor.Hostile.Tests;

/// <summary>Standard streams and disks that take nothing more.</summary>
public sealed class OutputTests : IDisposable
{
    private const string Old = "the report of yesterday";

    private readonly HostileFolder _folder = new HostileFolder().With("set: firm\ntitle: Firm\n");

    [Theory]
    [InlineData("> /dev/full", "error output-lost: standard output cannot be written: no space left on device")]
    [InlineData(">&-", "error output-lost: standard output cannot be written: bad file descriptor")]
    public void A_lost_standard_output_is_told_and_the_exit_code_is_2(string redirection, string told)
    {
        var (code, error) = ChildProgram.Run(_folder.Path, $"$AUDITOR audit site.design.yaml {redirection}");

        Assert.Equal(2, code);
        Assert.StartsWith(told, error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("2> /dev/full")]
    [InlineData("2>&-")]
    public void A_lost_standard_error_leaves_the_exit_code(string redirection) =>
        Assert.Equal((2, ""), Trimmed(ChildProgram.Run(_folder.Path, $"$AUDITOR audit none.design.yaml {redirection}")));

    [Fact]
    public void A_reader_that_stops_reading_changes_nothing() =>
        Assert.Equal((0, ""), Trimmed(ChildProgram.Run(_folder.Path, "$AUDITOR rules list --rules united-kingdom | head -n 1 > /dev/null; exit ${PIPESTATUS[0]}")));

    [Fact]
    public void A_file_that_may_grow_no_further_leaves_the_earlier_one_as_it_was()
    {
        _folder.Write("site.design.yaml", Site.Head + "boards:\n  - id: A\n    circuits:\n" + Site.Lines(300, number => $"      - {{ id: {number} }}"));
        _folder.Write("site.html", Old);

        // Enough for what counts the lines executed, where that is measured, and too little for the page.
        var (code, error) = ChildProgram.Run(_folder.Path, "trap '' XFSZ; ulimit -f 100; DOTNET_EnableDiagnostics=0 DOTNET_EnableWriteXorExecute=0 $AUDITOR audit site.design.yaml --quiet --write site.html");

        Assert.Equal(2, code);
        Assert.Contains("it would be larger than files may be there; what was there is unchanged", error, StringComparison.Ordinal);
        AssertOldAlone();
    }

    [Fact]
    public void A_full_disk_leaves_the_earlier_file_as_it_was()
    {
        Directory.CreateDirectory(_folder.File("small"));
        var (mounted, _) = ChildProgram.Run(_folder.Path, "mount -t tmpfs -o size=64k tmpfs small");
        Assert.SkipUnless(mounted == 0, "a small disk can only be had by who may mount one");
        try
        {
            _folder.Write("small/site.html", Old);

            var (code, error) = ChildProgram.Run(_folder.Path, "$AUDITOR audit site.design.yaml --quiet --write small/site.html");

            Assert.Equal(2, code);
            Assert.Contains("no space left on device; what was there is unchanged", error, StringComparison.Ordinal);
            Assert.Equal(Old, File.ReadAllText(Assert.Single(Directory.GetFileSystemEntries(_folder.File("small")))));
        }
        finally
        {
            Assert.Equal(0, ChildProgram.Run(_folder.Path, "umount small").Code);
        }
    }

    [Fact]
    public void Of_several_runs_that_write_the_same_file_one_is_left_whole()
    {
        string[] names = ["a", "b", "c"];
        foreach (var name in names)
        {
            _folder.Write($"{name}/site.design.yaml", Site.Good.Replace("Lamps", name, StringComparison.Ordinal)).Write($"{name}/firm.yaml", "set: firm\ntitle: Firm\n");
        }

        var runs = names.Select(name => ChildProgram.Start(_folder.File(name), Audit("../site.json"))).ToArray();
        foreach (var run in runs)
        {
            run.Process.WaitForExit();
            Assert.Equal(0, run.Process.ExitCode);
            run.Dispose();
        }

        var alone = names.Select(name =>
        {
            Assert.Equal(0, ChildProgram.Run(_folder.File(name), Audit("own.json")).Code);
            return File.ReadAllText(_folder.File($"{name}/own.json"));
        });
        Assert.Contains(File.ReadAllText(_folder.File("site.json")), alone);
        Assert.Equal([.. names, "firm", "site.design.yaml", "site.json"], Directory.GetFileSystemEntries(_folder.Path).Select(Path.GetFileName).Order(StringComparer.Ordinal));
    }

    public void Dispose() => _folder.Dispose();

    private static string Audit(string report) => $"$AUDITOR audit site.design.yaml --rules ./firm.yaml --quiet --write {report}";

    private static (int Code, string Error) Trimmed((int Code, string Error) result) => (result.Code, result.Error.Trim());

    private void AssertOldAlone()
    {
        Assert.Equal(Old, File.ReadAllText(_folder.File("site.html")));
        Assert.Equal(["firm", "site.design.yaml", "site.html"], Directory.GetFileSystemEntries(_folder.Path).Select(Path.GetFileName).Order(StringComparer.Ordinal));
    }
}
