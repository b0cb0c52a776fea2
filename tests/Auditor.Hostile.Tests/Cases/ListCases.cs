using System.Text;

namespace Auditor.Hostile.Tests.Cases;

/// <summary>Circuit lists in CSV that came from somebody else.</summary>
internal static class ListCases
{
    private const string Head = "board,id,name\n";

    public static IReadOnlyList<HostileCase> All { get; } =
    [
        List("list-sound", Head + "A,1,Lamps\n"),
        List("list-spreadsheet-formula", Head + "A,1,\"=HYPERLINK(\"\"http://example.org\"\")\"\n"),
        List("list-yaml-in-a-cell", Head + "A,1,\"x\nsupply: { earthing: TT }\n\"\n"),
        List("list-quote-never-closed", Head + "A,1,\"" + new string('x', 1_000_000)),
        List("list-columns-many", string.Join(',', Enumerable.Range(0, 100_000).Select(number => $"c{number}")) + "\nx\n"),
        List("list-rows-many", Head + Site.Lines(100_000, number => $"A,{number},x")),
        List("list-rows-uneven", Head + Site.Times(100_000, "A\n")),
        List("list-nul", Head + "A,1,a\0b\n"),
        List("list-semicolons", "board;id;name\nA;1;x\n"),
        List("list-empty", ""),
        new("list-not-utf-8", folder => folder.Write("list.csv", Encoding.Latin1.GetBytes(Head + "A,1,Küche\n")), "import", "{folder}/list.csv", "--earthing", "TT", "--phases", "1", "--voltage", "230 V"),
        new("list-is-pipe", folder => folder.Pipe("list.csv"), "import", "{folder}/list.csv", "--earthing", "TT", "--phases", "1", "--voltage", "230 V"),
        new("list-hostile-options", folder => folder.Write("list.csv", Head + "A,1,x\n"), "import", "{folder}/list.csv", "--earthing", "x: [", "--phases", "1e999", "--voltage", "\u0007"),
    ];

    private static HostileCase List(string name, string text) =>
        new(name, folder => folder.Write("list.csv", text), "import", "{folder}/list.csv", "--earthing", "TT", "--phases", "1", "--voltage", "230 V");
}
