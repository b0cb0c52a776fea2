using System.Text;
using System.Text.Json.Nodes;
using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Reports.Comparisons;
using Auditor.Reports.Json;
using Auditor.Testing;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Findings files, read and compared with a good one.</summary>
internal sealed class FindingsFiles : FuzzKind
{
    private const string Garden = "tests/Auditor.Reports.Tests/data/designs/garden.approved.json";

    private readonly Revision _good;

    public FindingsFiles() => _good = Read(Short(), new Problems())!;

    public override IReadOnlyList<byte[]> Seeds { get; } = [Short(), Short(), Short(), File.ReadAllBytes(Repository.PathOf(Garden))];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var revision = Read(input, problems);
        if (revision is not null)
        {
            _ = ComparisonJson.Write(RevisionComparison.Of(_good, revision));
        }

        return Judged(revision is not null, problems);
    }

    private Revision? Read(byte[] input, Problems problems) => FindingsFile.Read(Folder.Write("fuzzed.json", input), "fuzzed.json", Corpus.Home, problems);

    /// <summary>A findings file with few findings, so that most changes hit something of consequence.</summary>
    private static byte[] Short()
    {
        var root = JsonNode.Parse(File.ReadAllText(Repository.PathOf(Garden)))!.AsObject();
        var findings = root["findings"]!.AsArray();
        while (findings.Count > 2)
        {
            findings.RemoveAt(findings.Count - 1);
        }

        return Encoding.UTF8.GetBytes(root.ToJsonString());
    }
}
