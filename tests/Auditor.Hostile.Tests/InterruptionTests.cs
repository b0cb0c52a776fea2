using System.Diagnostics;
using Auditor.Hostile.Tests.Cases;

namespace Auditor.Hostile.Tests;

/// <summary>The program is stopped in the middle of writing.</summary>
public sealed class InterruptionTests : IDisposable
{
    private const string Old = "the findings of yesterday";
    private const string Findings = "site.json";
    private const int Kill = 137;

    /// <summary>Long enough that a file is being written for a while.</summary>
    private const int Circuits = 300;

    private readonly HostileFolder _folder = new HostileFolder().Write("site.design.yaml", Site.Head + "boards:\n  - id: A\n    circuits:\n" + Site.Lines(Circuits, number =>
        $"      - {{ id: {number}, name: Lamps, device: {{ standard: EN 60898, curve: B, rating: 6 A }}, cable: {{ construction: single-core, csa: 1.5 mm², length: 10 m }}, load: {{ current: 4 A }} }}"));

    [Theory]
    [InlineData("INT", 130)]
    [InlineData("TERM", 143)]
    public void Who_stops_the_program_finds_the_earlier_file_and_nothing_beside_it(string signal, int code)
    {
        Assert.Equal(code, StopWhileWriting(signal));

        Assert.Equal(Old, File.ReadAllText(_folder.File(Findings)));
        Assert.Equal(["site.design.yaml", Findings], Directory.GetFileSystemEntries(_folder.Path).Select(Path.GetFileName).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void Who_kills_the_program_finds_the_earlier_file()
    {
        Assert.Equal(Kill, StopWhileWriting("KILL"));

        Assert.Equal(Old, File.ReadAllText(_folder.File(Findings)));
        Assert.Single(Directory.GetFiles(_folder.Path, ".*"));
    }

    public void Dispose() => _folder.Dispose();

    /// <summary>Starts an audit, and stops it as soon as it has begun to write.</summary>
    /// <returns>The exit code.</returns>
    private int StopWhileWriting(string signal)
    {
        _folder.Write(Findings, Old);
        // Who starts the tests in the background of a shell has them ignore interrupts, and the program would as well.
        using var child = ChildProgram.Start(_folder.Path, $"exec env --default-signal=INT,TERM $AUDITOR audit site.design.yaml --quiet --evidence --write {Findings}");
        var begun = SpinWait.SpinUntil(() => child.Process.HasExited || Directory.GetFiles(_folder.Path, ".*").Any(file => new FileInfo(file).Length > 0), TimeSpan.FromMinutes(10));
        Assert.True(begun && !child.Process.HasExited, "the program wrote nothing that could be interrupted");
        using var kill = Process.Start("kill", [$"-{signal}", $"{child.Process.Id}"]);
        kill.WaitForExit();
        child.Process.WaitForExit();
        return child.Process.ExitCode;
    }
}
