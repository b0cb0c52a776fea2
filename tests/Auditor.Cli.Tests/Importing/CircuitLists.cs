namespace Auditor.Cli.Tests.Importing;

/// <summary>Circuit lists for the tests of <c>import</c>.</summary>
internal static class CircuitLists
{
    public const string Header = "board,id,name,phase,device.standard,device.curve,device.rating,device.breaking-capacity,cable.construction,"
        + "cable.insulation,cable.csa,cable.cpc,cable.length,cable.method,serves,load.current,load.power-factor,points";

    /// <summary>The options that say what a list does not.</summary>
    public static readonly string[] Supply = ["--earthing", "TN-S", "--phases", "3", "--voltage", "400 V"];

    /// <summary>A list of many boards with ten circuits each.</summary>
    public static string Large(int circuits) => Header + "\r\n" + string.Concat(Enumerable.Range(0, circuits).Select(i =>
        $"DB{(i / 10) + 1},{(i % 10) + 1},Lighting {i + 1},L{(i % 3) + 1},EN 60898,B,6 A,10 kA,multicore,thermosetting 90,1.5 mm²,1.5 mm²,{20 + (i % 7)} m,C,lighting,3 A,0.95,8\r\n"));

    /// <summary>The same list with the cell in a row and column, both counted as a spreadsheet does, replaced.</summary>
    public static string With(this string list, int row, string column, string cell)
    {
        var lines = list.Split("\r\n");
        var cells = lines[row - 1].Split(',');
        cells[Array.IndexOf(Header.Split(','), column)] = cell;
        lines[row - 1] = string.Join(',', cells);
        return string.Join("\r\n", lines);
    }
}
