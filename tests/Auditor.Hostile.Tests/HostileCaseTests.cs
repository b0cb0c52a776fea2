using System.Text.RegularExpressions;
using Auditor.Hostile.Tests.Cases;
using Auditor.Testing;

namespace Auditor.Hostile.Tests;

/// <summary>Every case of the list gets what the list says, and nothing else is hostile that the list does not know.</summary>
public partial class HostileCaseTests
{
    private static readonly HostileCase[] All =
        [.. DesignCases.All, .. SizeCases.All, .. FileCases.All, .. IncludeCases.All, .. RuleCases.All, .. FormulaCases.All, .. TemplateCases.All, .. ListCases.All, .. FindingsCases.All, .. OutputCases.All];

    public static TheoryData<string> Names => [.. HostileList.Run.Keys];

    [Theory]
    [MemberData(nameof(Names))]
    public void A_case_gets_what_the_list_says(string name)
    {
        var hostile = Assert.Single(All, hostile => hostile.Name == name);

        Assert.Equal(HostileList.Run[name], HostileRun.Outcome(hostile));
    }

    [Fact]
    public void No_case_is_missing_from_the_list() => Assert.Equal(All.Select(hostile => hostile.Name).Order(), HostileList.Run.Keys.Order());

    [Fact]
    public void The_tests_that_the_list_names_are_there_and_those_of_this_folder_are_named()
    {
        var methods = Directory.EnumerateFiles(Repository.PathOf("tests"), "*.cs", SearchOption.AllDirectories)
            .SelectMany(file => Method().Matches(File.ReadAllText(file)).Select(match => (File: file, Name: $"{Path.GetFileNameWithoutExtension(file)}.{match.Groups["name"].Value}")))
            .ToArray();
        var ofThisFolder = methods.Where(method => method.File.Contains("/Auditor.Hostile.Tests/", StringComparison.Ordinal) && !method.Name.StartsWith(nameof(HostileCaseTests), StringComparison.Ordinal));

        Assert.Empty(HostileList.Tests.Except(methods.Select(method => method.Name)));
        Assert.Empty(ofThisFolder.Select(method => method.Name).Except(HostileList.Tests));
        Assert.NotEmpty(HostileList.Tests);
    }

    [GeneratedRegex(@"\[(Fact|Theory)[^\]]*\](\s*\[[^\n]*\])*\s*public (async )?(void|Task) (?<name>\w+)\(", RegexOptions.ExplicitCapture, matchTimeoutMilliseconds: 10_000)]
    private static partial Regex Method();
}
