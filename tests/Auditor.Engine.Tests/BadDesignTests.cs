using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Testing;

namespace Auditor.Engine.Tests;

/// <summary>Whole design files whose tree does not hold together, each with the list of all its problems.</summary>
public class BadDesignTests
{
    private const string Folder = $"{Small.Files}/BadDesigns";

    public static TheoryData<string> Files =>
        [.. Directory.EnumerateFiles(Repository.PathOf(Folder), "*.yaml").Select(file => Path.GetFileNameWithoutExtension(file)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Files))]
    public void A_bad_design_has_just_the_problems_that_its_golden_file_lists(string name)
    {
        var problems = new Problems();
        if (DesignFile.Read(Repository.PathOf($"{Folder}/{name}.yaml"), $"{name}.yaml", problems) is { } file)
        {
            Small.Rules.Schema.Validation.Validate(file.Root, problems);
            Assert.Null(DesignBuilder.Build(file, new Evaluator(Small.Rules), problems));
        }

        Golden.Match(ProblemText.Render(problems.All), $"{Folder}/{name}");
    }

    [Fact]
    public void No_golden_file_is_left_over() => Assert.Empty(Golden.OrphansBelow(Small.Files));
}
