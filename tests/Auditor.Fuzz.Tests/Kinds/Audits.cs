using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using DesignFile = Auditor.Engine.Installation.DesignFile;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Designs of the examples, audited.</summary>
internal sealed class Audits : FuzzKind
{
    private const int Longest = 25_000;

    private static readonly DateOnly Day = new(2026, 12, 1);

    public Audits() => Folder.With("examples/boatyard").With("examples/workshop", "workshop");

    /// <summary>Half of them short, so that a change mostly hits something that the rules look at.</summary>
    public override IReadOnlyList<byte[]> Seeds { get; } =
        [.. Corpus.Files("examples", "*.design.yaml").Where(file => file.Length < Longest).SelectMany(file => new[] { Corpus.Files("examples/one-circuit", "*.design.yaml").Single(), file })];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var result = Audited(Folder.Write("fuzzed.design.yaml", input), problems);
        return result is { Findings.Count: 0 } ? Judgement.Neither : Judged(result is not null, problems);
    }

    /// <summary>Audits a design by the shipped rules; null, with problems added, when that cannot be done.</summary>
    public static AuditResult? Audited(string path, Problems problems)
    {
        if (DesignFile.Read(path, "fuzzed.design.yaml", problems) is not { } file)
        {
            return null;
        }

        Corpus.Rules.Schema.Validation.Validate(file.Root, problems);
        var result = DesignBuilder.Build(file, new Evaluator(Corpus.Rules), problems) is { } design && !problems.HasErrors ? Audit.Run(design, Day, problems) : null;
        return problems.HasErrors ? null : result;
    }
}
