using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using DesignFile = Auditor.Engine.Installation.DesignFile;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>A board that a good design includes.</summary>
internal sealed class BoardFiles : FuzzKind
{
    public BoardFiles() => Folder.With("examples/boatyard");

    public override IReadOnlyList<byte[]> Seeds { get; } = [.. Corpus.Files("examples/boatyard", "pontoon.board.yaml"), .. Corpus.Files("examples/boatyard", "*.board.yaml")];

    public override Judgement Judge(byte[] input)
    {
        Folder.Write("boards/pontoon.board.yaml", input);
        var problems = new Problems();
        var file = DesignFile.Read(Folder.File("boatyard.design.yaml"), "boatyard.design.yaml", problems)!;
        Corpus.Rules.Schema.Validation.Validate(file.Root, problems);
        var design = DesignBuilder.Build(file, new Evaluator(Corpus.Rules), problems);
        return Judged(design is not null && !problems.HasErrors, problems);
    }
}
