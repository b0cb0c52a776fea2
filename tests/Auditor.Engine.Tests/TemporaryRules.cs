using System.Text;
using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests;

/// <summary>A folder of rule data that a test writes, gone when the test ends.</summary>
internal sealed class TemporaryRules : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("auditor-rules-");

    public string Folder => _folder.FullName;

    /// <summary>Writes a file below the folder.</summary>
    public TemporaryRules With(string path, string text)
    {
        var full = Path.Combine(Folder, path);
        Directory.CreateDirectory(Path.GetDirectoryName(full)!);
        File.WriteAllText(full, text);
        return this;
    }

    /// <summary>Writes a sheet of quantities, each as <c>circuit Zs Ω = Z + R</c>.</summary>
    public TemporaryRules WithSheet(string path, params IEnumerable<string> quantities)
    {
        var text = new StringBuilder("sheet: made\nabout: Made for a test.\nquantities:\n");
        foreach (var quantity in quantities)
        {
            var words = quantity.Split(' ', 5);
            var gives = words[2] is "flag" or "text" ? $"gives: {words[2]}" : $"unit: \"{words[2]}\"";
            text.Append($"  - symbol: {words[1]}\n    name: made\n    of: {words[0]}\n    {gives}\n    formula: '{words[4].Replace("'", "''")}'\n")
                .Append("    clause: { type: plausibility }\n    cases: [{ name: none, expect: missing }]\n");
        }

        return With(path, text.ToString());
    }

    public RuleSet? Load(string path, out Problems problems)
    {
        problems = new Problems();
        return RuleSetLoader.Load(Small.Home, path, Folder, null, problems);
    }

    public RuleSet LoadSound(string path)
    {
        var set = Load(path, out var problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return set!;
    }

    public void Dispose() => _folder.Delete(recursive: true);
}
