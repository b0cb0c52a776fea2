using System.Diagnostics;
using System.Globalization;
using Auditor.Cli;
using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Registers;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Files;
using Auditor.Reports.Json;
using Auditor.Reports.Model;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;
using Auditor.Testing;

namespace Auditor.Fuzz.Tests;

/// <summary>
/// Bad files of every kind that the program reads get a result or problems, and no exception. `AUDITOR_FUZZ` is how many of each kind,
/// `AUDITOR_FUZZ_SEED` where chance begins; a failure names the file that it kept.
/// </summary>
public sealed class FuzzTests(ITestOutputHelper output) : IDisposable
{
    private const string Data = "tests/Auditor.Reports.Tests/data";
    private const string Garden = "designs/garden.design.yaml";
    private static readonly DateOnly Day = new(2026, 12, 1);
    private static readonly RuleHome Home = new(Repository.PathOf("rules"), "rules");
    private static readonly int Count = Number("AUDITOR_FUZZ", 150);
    private static readonly int Seed = Number("AUDITOR_FUZZ_SEED", 20261201);

    private readonly FuzzFolder _folder = new();

    [Fact]
    public void Designs_against_the_shipped_rules()
    {
        var rules = Load("united-kingdom", Repository.Root);
        _folder.With("examples/boatyard");
        foreach (var example in new[] { "one-circuit", "workshop", "bakery" })
        {
            _folder.With($"examples/{example}", example);
        }

        Run(Files("*.yaml"), bytes => File.WriteAllBytes(_folder.File("fuzzed.design.yaml"), bytes), () => Audited("fuzzed.design.yaml", rules));
    }

    [Fact]
    public void Boards_that_a_design_includes()
    {
        var rules = Load("united-kingdom", Repository.Root);
        _folder.With("examples/boatyard");

        Run(Files("*.board.yaml"), bytes => File.WriteAllBytes(_folder.File("boards/pontoon.board.yaml"), bytes), () => Audited("boatyard.design.yaml", rules));
    }

    [Theory]
    [InlineData("rules/sets", "sets/shed.yaml")]
    [InlineData("rules/sheets", null)]
    [InlineData("rules/provisions", null)]
    [InlineData("rules/tables", null)]
    public void Rule_files_of_a_house(string kind, string? one)
    {
        _folder.With(Data);
        var target = one is null ? Directory.EnumerateFiles(_folder.File(kind), "*.yaml", SearchOption.AllDirectories).Order(StringComparer.Ordinal).First() : _folder.File("rules/" + one);

        Run(
            [.. Files("*.yaml", kind), .. Shipped(kind)],
            bytes => File.WriteAllBytes(target, bytes),
            () =>
            {
                var problems = new Problems();
                var rules = RuleSetLoader.Load(Home, "rules/sets/shed.yaml", _folder.Path, null, problems);
                return rules is null ? Judged(problems) : Audited(Garden, rules);
            });
    }

    [Fact]
    public void Templates()
    {
        _folder.With(Data).With("templates", "templates");
        var rules = Load("rules/sets/shed.yaml", _folder.Path);
        var problems = new Problems();
        var result = AuditOf(Garden, rules, problems)!;
        var model = ReportModel.Build(result, Register.Load(Home, problems), Schedule.For(null, rules, problems)!);
        var template = TemplateFile.At(_folder.File("templates/report.scriban-md"));

        Run(Files("*.scriban-md"), bytes => File.WriteAllBytes(template.FullPath, bytes), () =>
        {
            var own = new Problems();
            var report = TemplateReport.Render(model, ReportFormat.Markdown, template, own);
            return report is null ? Judged(own) : !own.HasErrors;
        });
    }

    [Fact]
    public void Circuit_lists() => RunProgram(
        "tests/Auditor.Cli.Tests/Importing/lists", "*.csv", "fuzzed.csv",
        path => ["import", path, "--earthing", "TN-S", "--phases", "3", "--voltage", "400 V"]);

    [Fact]
    public void Findings_files()
    {
        _folder.With("examples/one-circuit");
        Run(Files("*.json"), bytes => File.WriteAllBytes(_folder.File("fuzzed.json"), bytes), () =>
        {
            var problems = new Problems();
            var revision = FindingsFile.Read(_folder.File("fuzzed.json"), "fuzzed.json", Home, problems);
            return revision is null ? Judged(problems) : !problems.HasErrors && revision.Findings.Count > 0;
        });
    }

    public void Dispose() => _folder.Dispose();

    private static int Number(string variable, int otherwise) =>
        int.TryParse(Environment.GetEnvironmentVariable(variable), NumberStyles.None, CultureInfo.InvariantCulture, out var number) ? number : otherwise;

    /// <summary>Whether what could not be done says why, in words that can be shown.</summary>
    private static bool Judged(Problems problems) => problems.HasErrors && ProblemText.Render(problems.All).Length > 0;

    private static RuleSet Load(string name, string folder)
    {
        var problems = new Problems();
        return RuleSetLoader.Load(Home, name, folder, null, problems) ?? throw new InvalidOperationException(ProblemText.Render(problems.All));
    }

    private static IEnumerable<byte[]> Shipped(string kind) =>
        Directory.EnumerateFiles(Repository.PathOf(kind), "*.yaml", SearchOption.AllDirectories).Order(StringComparer.Ordinal).Where((_, index) => index % 12 == 0).Select(File.ReadAllBytes);

    private List<byte[]> Files(string pattern, string below = ".") =>
        [.. Directory.EnumerateFiles(_folder.File(below), pattern, SearchOption.AllDirectories).Order(StringComparer.Ordinal).Select(File.ReadAllBytes)];

    private bool Audited(string design, RuleSet rules)
    {
        var problems = new Problems();
        var result = AuditOf(design, rules, problems);
        return result is null || problems.HasErrors ? Judged(problems) : result.Findings.Count > 0;
    }

    private AuditResult? AuditOf(string design, RuleSet rules, Problems problems)
    {
        if (DesignFile.Read(_folder.File(design), design, problems) is not { } file)
        {
            return null;
        }

        rules.Schema.Validation.Validate(file.Root, problems);
        return DesignBuilder.Build(file, new Evaluator(rules), problems) is { } built ? Audit.Run(built, Day, problems) : null;
    }

    private void RunProgram(string seeds, string pattern, string name, Func<string, string[]> arguments)
    {
        _folder.With(seeds);
        var path = _folder.File(name);
        Run(Files(pattern), bytes => File.WriteAllBytes(path, bytes), () =>
        {
            using var said = new StringWriter();
            using var error = new StringWriter();
            var code = AuditorProgram.Run(arguments(path), said, error);
            return code == ExitCode.Problems ? error.ToString().Length > 0 : code == ExitCode.Clean && said.ToString().Length > 0;
        });
    }

    private void Run(IReadOnlyList<byte[]> seeds, Action<byte[]> put, Func<bool> isJudged)
    {
        Assert.NotEmpty(seeds);
        var mutator = new Mutator(seeds, new Random(Seed));
        var slowest = TimeSpan.Zero;
        for (var i = 0; i < Count; i++)
        {
            var bytes = mutator.Next();
            put(bytes);
            var watch = Stopwatch.StartNew();
            try
            {
                Assert.True(isJudged(), "neither a result nor a problem");
            }
            catch (Exception fault)
            {
                var kept = Path.Combine(Path.GetTempPath(), $"auditor-fuzz-{Seed}-{i}.bin");
                File.WriteAllBytes(kept, bytes);
                throw new InvalidOperationException($"input {i} of seed {Seed}, kept as {kept}", fault);
            }

            slowest = watch.Elapsed > slowest ? watch.Elapsed : slowest;
        }

        output.WriteLine($"{Count} inputs from seed {Seed}, the slowest took {slowest.TotalMilliseconds:0} ms");
    }
}
