using System.Text;
using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Testing;

namespace Auditor.Engine.Tests;

/// <summary>How findings came about, down to the lines of the design and the cells of the tables.</summary>
public class EvidenceTests
{
    private const string Folder = $"{Small.Files}/Evidence";
    private const string Suffix = ".finding.txt";

    private static readonly AuditResult House = Small.Audit(Small.DesignText("house"));

    public static TheoryData<string> Findings =>
        [.. Directory.EnumerateFiles(Repository.PathOf(Folder), $"*{Suffix}").Select(file => Path.GetFileName(file).Replace(Suffix, "")).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Findings))]
    public void Evidence_is_told_as_its_golden_file_has_it(string name)
    {
        var key = File.ReadAllText(Repository.PathOf($"{Folder}/{name}{Suffix}")).Trim();
        var text = new StringBuilder();
        foreach (var derivation in new EvidenceBuilder(House.Rules).Of(House.Find(key)!))
        {
            Write(text, derivation, "");
        }

        Golden.Match(text.ToString(), $"{Folder}/{name}");
    }

    [Fact]
    public void Evidence_tells_what_the_audit_computed()
    {
        foreach (var finding in House.Findings.Where(finding => finding.ValueShown.Length > 0 && !finding.Judgement.Value.IsMissing))
        {
            var derivations = new EvidenceBuilder(House.Rules).Of(finding);

            Assert.Equal(finding.ValueShown, derivations.Single(derivation => derivation.Symbol == "value").Value);
        }
    }

    [Fact]
    public void A_quantity_is_unfolded_once_and_named_thereafter()
    {
        using var rules = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheet.yaml], provisions: [twice.yaml] }\n")
            .WithSheet("sheet.yaml", "board a A = 1 A", "board b A = a + 1 A", "board c A = a + b")
            .With("twice.yaml", "rule: twice\ntitle: A rule\nclause: { type: plausibility }\nprovision: requirement\nstatus: { since: 1.0 }\nof: board\n"
                + "compare: { value: c, at-most: 5 * b }\nsays: Made.\nwhy: Made.\ndepartures: allowed\ncases: [{ name: one, given: { c: 3 A, b: 2 A }, verdict: conforms }]\n");
        var result = Small.Audit(Small.DesignText("house"), rules: rules.LoadSound("set.yaml"));

        var sources = new EvidenceBuilder(result.Rules).Of(result.Find("twice:DB1")!).SelectMany(AllSources);

        Assert.Equal(
            ["DB1 c: a + b", "DB1 a: 1 A", "DB1 b: a + 1 A", "DB1 a: told elsewhere", "DB1 b: told elsewhere"],
            sources.Select(source => $"{source.Label}: {source.Derivation?.Formula ?? source.Remark}"));
    }

    private static IEnumerable<EvidenceSource> AllSources(Derivation derivation) =>
        derivation.From.SelectMany(source => source.Derivation is null ? [source] : AllSources(source.Derivation).Prepend(source));

    private static void Write(StringBuilder text, Derivation derivation, string indent)
    {
        text.AppendLine($"{indent}{derivation.Subject} {derivation.Symbol} ({derivation.Name}) = {derivation.Value}");
        text.AppendLine($"{indent}  {derivation.Formula}");
        text.AppendLine($"{indent}  {derivation.WithNumbers}");
        var note = derivation.Note.Length == 0 ? "" : " — " + derivation.Note;
        text.AppendLine($"{indent}  {string.Join(", ", derivation.References.Prepend(derivation.Place))}{note}");
        foreach (var source in derivation.From)
        {
            text.AppendLine($"{indent}  - {source.Kind}: {source.Label} = {source.Text} [{source.Place}]{(source.Remark.Length == 0 ? "" : " " + source.Remark)}");
            if (source.Derivation is { } inner)
            {
                Write(text, inner, indent + "    ");
            }
        }
    }
}
