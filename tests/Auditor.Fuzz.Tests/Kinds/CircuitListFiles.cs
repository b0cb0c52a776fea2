using System.Text;
using Auditor.Cli.Commands;
using Auditor.Documents;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Circuit lists in CSV, made into design files, which are then read as YAML.</summary>
internal sealed class CircuitListFiles : FuzzKind
{
    private const string Good = """
        board,id,name,phase,device.standard,device.curve,device.rating,cable.construction,cable.csa,cable.length,serves,load.current,feeds
        MSB,1,"Lamps, ""north"" side",L1,EN 60898,B,6 A,single-core,1.5 mm²,25 m ± 2 m,lighting,4 A,
        MSB,2,"Sockets
        below the bench",L2,EN 61009,B,20 A,single-core,2.5 mm²,18 m,socket-outlets,"12 A, assumed",
        MSB,3,Sub-board,,EN 60898,C,32 A,,6 mm²,40 m,,,DB
        DB,1,Heater,L3,EN 60898,B,16 A,,2.5 mm²,"6,5 m",space-heating; water-heater,13 A,
        """;

    private static readonly (string Key, string Text, ScalarKind Kind)[] Supply =
        [("earthing", "TN-S", ScalarKind.Text), ("phases", "3", ScalarKind.Number), ("voltage", "400 V", ScalarKind.Text)];

    private readonly MappingEntry[] _supply = [.. Supply.Select(fact => Entry(fact.Key, fact.Text, fact.Kind))];

    public override IReadOnlyList<byte[]> Seeds { get; } =
    [
        Encoding.UTF8.GetBytes(Good.Replace("\"6,5 m\"", "6.5 m", StringComparison.Ordinal)), Encoding.UTF8.GetBytes(Good),
        .. Corpus.Files("tests/Auditor.Cli.Tests/Importing/lists", "*.csv"),
    ];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var source = SourceReader.Read(Folder.Write("fuzzed.csv", input), "fuzzed.csv", problems);
        var text = source is null ? null : ImportCommand.Text(source, Corpus.Rules, _supply, problems);
        if (text is not null && YamlReader.Read(new SourceText("made.design.yaml", text), problems) is null)
        {
            return Judgement.Neither;
        }

        return Judged(text is not null, problems);
    }

    private static MappingEntry Entry(string key, string text, ScalarKind kind)
    {
        var span = new SourceText("--" + key, text).WholeSpan();
        return new MappingEntry(new Located<string>(key, span), new ScalarNode(span, text, kind, kind == ScalarKind.Number ? 3 : 0));
    }
}
