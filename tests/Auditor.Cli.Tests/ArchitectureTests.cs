using System.Reflection;
using Auditor.Testing;
using NetArchTest.Rules;

namespace Auditor.Cli.Tests;

public class ArchitectureTests
{
    private static readonly string[] FromBottomToTop =
        ["Auditor.Quantities", "Auditor.Documents", "Auditor.Formulas", "Auditor.Engine", "Auditor.Reports", "auditor"];

    [Fact]
    public void Each_project_depends_only_on_those_below_it()
    {
        for (var i = 0; i < FromBottomToTop.Length; i++)
        {
            var above = FromBottomToTop.Skip(i + 1).Select(name => name == "auditor" ? "Auditor.Cli" : name).ToArray();
            var types = Types.InAssembly(Assembly.Load(FromBottomToTop[i]));
            var result = above.Length == 0 ? null : types.ShouldNot().HaveDependencyOnAny(above).GetResult();

            Assert.True(result?.IsSuccessful ?? true, $"{FromBottomToTop[i]}: {string.Join(", ", result?.FailingTypeNames ?? [])}");
        }
    }

    [Fact]
    public void The_projects_of_the_source_folder_are_those_of_the_chain()
    {
        var folders = Directory.EnumerateDirectories(Repository.PathOf("src")).Select(Path.GetFileName).Order(StringComparer.Ordinal);

        Assert.Equal(["Auditor.Cli", "Auditor.Documents", "Auditor.Engine", "Auditor.Formulas", "Auditor.Quantities", "Auditor.Reports"], folders);
    }

    [Fact]
    public void Source_files_stay_small()
    {
        var lengths = Directory.EnumerateFiles(Repository.PathOf("src"), "*.cs", SearchOption.AllDirectories)
            .Where(file => !file.Contains("/obj/", StringComparison.Ordinal))
            .Select(file => (file, Lines: File.ReadLines(file).Count()))
            .OrderBy(pair => pair.Lines)
            .ToArray();

        Assert.True(lengths[^1].Lines <= 400, $"{lengths[^1].file} has {lengths[^1].Lines} lines");
        Assert.True(lengths[lengths.Length / 2].Lines < 90, $"the median is {lengths[lengths.Length / 2].Lines} lines");
    }
}
