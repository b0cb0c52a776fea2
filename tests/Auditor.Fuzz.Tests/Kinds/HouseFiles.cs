using System.Text;
using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>A file of a small rule set, which is then put together from it and its other files. Every other input is made of its good file.</summary>
internal sealed class HouseFiles : FuzzKind
{
    private const string Set = "rules/sets/shed.yaml";

    private readonly string _file;

    /// <summary>Makes the kind.</summary>
    /// <param name="folder">Where shipped files of the kind are.</param>
    /// <param name="file">The file of the small rule set that each input takes the place of; where that has none, it is good as shipped.</param>
    public HouseFiles(string folder, string file)
    {
        _file = file;
        Folder.With("tests/Auditor.Reports.Tests/data/rules", "rules");
        Directory.CreateDirectory(Folder.File("rules/adjustments"));
        Directory.CreateDirectory(Folder.File("rules/pictures"));
        var set = File.ReadAllText(Folder.File(Set)).Replace("uses:\n", "uses:\n  adjustments: [adjustments]\n  pictures: [pictures]\n", StringComparison.Ordinal);
        Folder.Write(Set, Encoding.UTF8.GetBytes(set));
        var good = File.Exists(Folder.File(file)) ? Folder.File(file) : Repository.PathOf(file);
        Seeds = [.. Corpus.Files(folder, "*.yaml", every: folder == "rules/provisions" ? 12 : 1).SelectMany(shipped => new[] { File.ReadAllBytes(good), shipped })];
    }

    public override IReadOnlyList<byte[]> Seeds { get; }

    public override Judgement Judge(byte[] input)
    {
        Folder.Write(_file, input);
        var problems = new Problems();
        var rules = RuleSetLoader.Load(Corpus.Home, Set, Folder.Path, null, problems);
        return Judged(rules is not null, problems);
    }
}
