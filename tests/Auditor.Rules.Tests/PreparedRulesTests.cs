using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Rules.Tests;

/// <summary>The prepared form of the shipped rule files, in a copy of them.</summary>
public sealed class PreparedRulesTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("auditor-").FullName;

    private readonly RuleHome _home;

    public PreparedRulesTests()
    {
        foreach (var file in Directory.EnumerateFiles(Repository.PathOf("rules"), "*", SearchOption.AllDirectories))
        {
            var copy = Path.Combine(_folder, "rules", Path.GetRelativePath(Repository.PathOf("rules"), file));
            Directory.CreateDirectory(Path.GetDirectoryName(copy)!);
            File.Copy(file, copy);
        }

        _home = new RuleHome(Path.Combine(_folder, "rules"), "rules");
    }

    [Fact]
    public void A_prepared_set_is_the_set_and_an_edit_after_preparing_counts()
    {
        var read = Load();
        Assert.InRange(PreparedRules.Write(_home), 600, int.MaxValue);
        var prepared = Load();

        Assert.Equal(read.Title.Sha256, prepared.Title.Sha256);
        Assert.Equal(read.Files, prepared.Files);
        Assert.Equal(read.Rules.Select(rule => (rule.Id, rule.Path, rule.Why)), prepared.Rules.Select(rule => (rule.Id, rule.Path, rule.Why)));
        Assert.Equal(read.Quantities.Count(), prepared.Quantities.Count());

        var file = _home.SetPath("united-kingdom");
        var text = File.ReadAllText(file);
        File.WriteAllText(file, text.Replace("title: United Kingdom", "title: United Kingdom, edited", StringComparison.Ordinal));
        Assert.StartsWith("United Kingdom, edited", Load().Title.Text, StringComparison.Ordinal);
        Assert.NotEqual(read.Title.Sha256, Load().Title.Sha256);
    }

    [Fact]
    public void A_damaged_prepared_form_and_one_for_other_schemas_are_passed_over()
    {
        var source = SourceReader.ReadWithHash(_home.SetPath("iec-base"), "a.yaml", new Problems())!;
        PreparedRules.Write(_home);
        Assert.NotNull(PreparedRules.Open(_home).Find(source));

        var bytes = File.ReadAllBytes(PreparedRules.PathOf(_home));
        bytes[bytes.Length / 2] ^= 1;
        File.WriteAllBytes(PreparedRules.PathOf(_home), bytes);
        Assert.Null(PreparedRules.Open(_home).Find(source));

        PreparedRules.Write(_home);
        File.AppendAllText(_home.SchemaPath("set"), "\n");
        Assert.Null(PreparedRules.Open(_home).Find(source));

        File.WriteAllBytes(PreparedRules.PathOf(_home), []);
        Assert.Null(PreparedRules.Open(_home).Find(source));
    }

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    private RuleSet Load()
    {
        var problems = new Problems();
        var set = RuleSetLoader.Load(_home, "united-kingdom", _folder, null, problems);
        Assert.Empty(ProblemText.Render(problems.All));
        return set!;
    }
}
