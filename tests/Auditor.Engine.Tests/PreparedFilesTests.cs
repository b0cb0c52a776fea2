using System.Security.Cryptography;
using System.Text;
using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Engine.Tests;

/// <summary>Rule files that were read once and kept as bytes, in a home of a few files.</summary>
public sealed class PreparedFilesTests : IDisposable
{
    private const string Set = "set: tiny\ntitle: Tiny ± 1\nparameters:\n  drop: { value: 4 %, about: Drop., tighter: lower }\n";
    private const string Lookup = "lookup: figure\nabout: For the test.\nkeys: [{ name: n, unit: 1 }, { name: word }]\nvalue: { name: v, unit: A }\nwhen-missing: ask\n";
    private const string Table = "table: figures\nlookup: figure\ntitle: Figures\nsource: made up\ntrust: derived\ndown: [n, word]\nrows:\n  - [1, a, 10.5]\n  - [2, b, null]\n";

    private readonly TemporaryRules _rules = new TemporaryRules().With("sets/tiny.yaml", Set).With("tables/lookup.yaml", Lookup).With("tables/table.yaml", Table);
    private readonly RuleHome _home;

    public PreparedFilesTests()
    {
        foreach (var schema in Directory.EnumerateFiles(Repository.PathOf("rules/schema")))
        {
            _rules.With("schema/" + Path.GetFileName(schema), File.ReadAllText(schema));
        }

        _home = new RuleHome(_rules.Folder, "rules");
    }

    [Fact]
    public void A_prepared_tree_is_the_tree_of_its_text_with_all_its_places()
    {
        Assert.Equal(3, PreparedRules.Write(_home));
        var prepared = PreparedRules.Open(_home);

        foreach (var text in new[] { Set, Lookup, Table })
        {
            var source = FileOf(text);

            Assert.Equal(Told(YamlReader.Read(source.Text, new Problems())), Told(prepared.Find(source)));
        }
    }

    [Fact]
    public void A_text_that_was_not_prepared_is_not_found()
    {
        PreparedRules.Write(_home);

        Assert.Null(PreparedRules.Open(_home).Find(FileOf(Set + "edition: second\n")));
    }

    [Fact]
    public void A_file_with_a_problem_is_not_prepared_and_two_of_one_text_are_prepared_once()
    {
        _rules.With("tables/again.yaml", Table).With("tables/bad.yaml", "lookup: bad\n").With("tables/worse.yaml", "lookup: [\n");

        Assert.Equal(3, PreparedRules.Write(_home));
    }

    [Fact]
    public void A_home_without_rule_files_prepares_nothing()
    {
        Array.ForEach(["sets/tiny.yaml", "tables/lookup.yaml", "tables/table.yaml"], path => File.Delete(Path.Combine(_home.Folder, path)));

        Assert.Equal(0, PreparedRules.Write(_home));
        Assert.Null(Find());
    }

    [Fact]
    public void What_is_not_whole_or_was_made_with_other_schemas_is_passed_over()
    {
        PreparedRules.Write(_home);
        var bytes = File.ReadAllBytes(PreparedRules.PathOf(_home));
        Assert.NotNull(Find());

        File.WriteAllBytes(PreparedRules.PathOf(_home), bytes[..^1]);
        Assert.Null(Find());
        File.WriteAllBytes(PreparedRules.PathOf(_home), bytes[..64]);
        Assert.Null(Find());
        File.Delete(PreparedRules.PathOf(_home));
        Assert.Null(Find());

        File.WriteAllBytes(PreparedRules.PathOf(_home), bytes);
        Assert.NotNull(Find());
        File.AppendAllText(_home.SchemaPath("set"), "\n");
        Assert.Null(Find());
    }

    [Fact]
    public void Nothing_is_left_beside_what_was_written()
    {
        PreparedRules.Write(_home);
        PreparedRules.Write(_home);

        Assert.Equal(["prepared.bin"], Directory.EnumerateFiles(_home.Folder).Select(Path.GetFileName));
    }

    public void Dispose() => _rules.Dispose();

    private Node? Find() => PreparedRules.Open(_home).Find(FileOf(Table));

    private static SourceFile FileOf(string text)
    {
        var bytes = Encoding.UTF8.GetBytes(text);
        return new SourceFile(new SourceText("any.yaml", text), bytes.Length, Convert.ToHexStringLower(SHA256.HashData(bytes)));
    }

    private static string Told(Node? node) => $"{node?.Span.Start}-{node?.Span.End} " + node switch
    {
        ScalarNode scalar => $"{scalar.Kind} {scalar.Text}",
        SequenceNode list => $"[{string.Join(", ", list.Items.Select(Told))}]",
        MappingNode mapping => $"{{{string.Join(", ", mapping.Entries.Select(entry => $"{entry.Key.Value} {entry.Key.Span.Start}: {Told(entry.Value)}"))}}}",
        _ => "nothing",
    };
}
