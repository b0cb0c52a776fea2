using Auditor.Documents;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Quantities;
using Auditor.Testing;

namespace Auditor.Formulas.Tests;

/// <summary>Whole files of bad formulas, each with the list of all its problems.</summary>
public class BadFormulaTests
{
    private const string Folder = "tests/Auditor.Formulas.Tests/Files/Formulas";

    public static TheoryData<string> Files =>
        [.. Directory.EnumerateFiles(Repository.PathOf(Folder), "*.yaml").Select(file => Path.GetFileNameWithoutExtension(file)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Files))]
    public void A_file_of_bad_formulas_has_just_the_problems_that_its_golden_file_lists(string name)
    {
        var problems = new Problems();
        foreach (var (formula, shape, type) in FormulasOf(name))
        {
            Check(formula, shape, type, problems);
        }

        Golden.Match(ProblemText.Render(problems.All), $"{Folder}/{name}");
    }

    [Theory]
    [MemberData(nameof(Files))]
    public void No_bad_formula_passes_without_a_problem(string name)
    {
        var silent = new List<string>();
        foreach (var (formula, shape, type) in FormulasOf(name))
        {
            var problems = new Problems();
            Check(formula, shape, type, problems);
            if (!problems.HasErrors)
            {
                silent.Add(formula.Text);
            }
        }

        Assert.Empty(silent);
    }

    [Fact]
    public void No_golden_file_is_left_over() => Assert.Empty(Golden.OrphansBelow("tests/Auditor.Formulas.Tests/Files"));

    [Fact]
    public void Each_wording_of_the_stage_is_in_a_golden_file()
    {
        var codes = File.ReadAllText(Repository.PathOf("src/Auditor.Formulas/Binding/FormulaMessages.cs")).Split('"')
            .Where(part => part.Contains('-') && part.All(letter => char.IsAsciiLetterLower(letter) || letter == '-')).Distinct();
        var shown = string.Concat(Directory.EnumerateFiles(Repository.PathOf(Folder), "*.approved.txt").Select(File.ReadAllText));

        Assert.Empty(codes.Where(code => !shown.Contains($"error {code}: ")).Except(["formula-too-long", "formula-too-deep"]));
    }

    private static void Check(ScalarNode formula, SubjectShape shape, FormulaType? type, Problems problems) =>
        FormulaBinder.Bind(formula, shape, RuleData.Example, type, problems);

    private static IEnumerable<(ScalarNode Formula, SubjectShape Shape, FormulaType? Type)> FormulasOf(string name)
    {
        SubjectShape[] shapes = [Plant.Installation, Plant.Board, Plant.Circuit, Plant.Leg];
        var reading = new Problems();
        var path = Repository.PathOf($"{Folder}/{name}.yaml");
        var root = Assert.IsType<MappingNode>(YamlReader.Read(SourceReader.Read(path, $"{name}.yaml", reading)!, reading));
        Assert.Equal("", ProblemText.Render(reading.All));
        foreach (var shape in shapes)
        {
            foreach (var formula in root.Items(shape.Name))
            {
                yield return (Assert.IsType<ScalarNode>(formula), shape, null);
            }
        }

        foreach (var declared in root.Mappings("declared"))
        {
            yield return (declared.Scalar("formula")!, Plant.Circuit, FormulaType.Of(UnitCatalog.Find(declared.Text("unit")!)!.Dimension));
        }
    }
}
