using Auditor.Documents;
using Auditor.Testing;

namespace Auditor.Formulas.Tests;

/// <summary>Whole folders of lookups, tables and curves that their schemas accept and that are wrong all the same.</summary>
public class BadTableTests
{
    public static TheoryData<string> Folders =>
        [.. Directory.EnumerateDirectories(Repository.PathOf(RuleData.Folder), "bad-*").Select(folder => Path.GetFileName(folder)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Folders))]
    public void A_folder_has_just_the_problems_that_its_golden_file_lists(string name)
    {
        var problems = new Problems();
        RuleData.Load(name, problems);

        Golden.Match(ProblemText.Render(problems.All), $"{RuleData.Folder}/{name}");
    }

    [Fact]
    public void Each_wording_of_the_stage_is_in_a_golden_file()
    {
        var codes = File.ReadAllText(Repository.PathOf("src/Auditor.Formulas/Tables/TableMessages.cs")).Split("Problem.Error(").Skip(1)
            .Select(part => part.Split('"')[1]);
        var shown = string.Concat(Directory.EnumerateFiles(Repository.PathOf(RuleData.Folder), "*.approved.txt").Select(File.ReadAllText));

        Assert.DoesNotContain(codes, code => !shown.Contains($"error {code}: "));
    }
}
