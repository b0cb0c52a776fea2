using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Testing;
using DesignFile = Auditor.Engine.Installation.DesignFile;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Small designs: read with what they include, held against the schema, and made into a tree of subjects.</summary>
internal sealed class DesignFiles : FuzzKind
{
    private const int Longest = 12_000;

    public DesignFiles() => Folder.With("examples/boatyard");

    public override IReadOnlyList<byte[]> Seeds { get; } =
    [
        .. new[] { "one-circuit/one-circuit", "quillmere/pottery", "boatyard/boatyard" }
            .Select(path => File.ReadAllBytes(Repository.PathOf($"examples/{path}.design.yaml"))),
        .. Corpus.Files("src/Auditor.Cli/Starting", "*.yaml"),
    ];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var file = DesignFile.Read(Folder.Write("fuzzed.design.yaml", input), "fuzzed.design.yaml", problems);
        if (file is null)
        {
            return Judged(hasResult: false, problems);
        }

        Corpus.Rules.Schema.Validation.Validate(file.Root, problems);
        var design = DesignBuilder.Build(file, new Evaluator(Corpus.Rules), problems);
        return Judged(design is not null && !problems.HasErrors, problems);
    }
}
