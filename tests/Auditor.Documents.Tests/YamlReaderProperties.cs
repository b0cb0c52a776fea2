using System.Text;
using Auditor.Testing;
using CsCheck;

namespace Auditor.Documents.Tests;

public class YamlReaderProperties
{
    private static readonly Gen<string> Fragments = Gen.OneOf(
        "a", "key", ": ", ":", "- ", "-", "\n", "\n  ", "\n    ", "[", "]", "{", "}", ", ", "\"", "'", "''", "\\", "\\n", "\\u00", "# c", " #", "|", ">", "|-", ">+",
        "|2", "&a ", "*a ", "!", "!!str ", "!<x> ", "<<", "? ", "%YAML 1.2\n", "---\n", "...\n", "~", "true", "12", "1e5", "0x1", ".nan", "\t", "\r\n", "\r", "é", "𝄞",
        "@", "`", "null", " ");

    private static readonly Gen<string> Texts = Fragments.Array[0, 30].Select(string.Concat);

    private static readonly Gen<string> Scalars = Gen.OneOf(
        Gen.OneOf("12", "true", "~", "null", "0x1F", "-1.5e3", ".nan", "yes", "", " ", "a b", "it's", "\"q\"", "a: b", "- x", "#c", "x #c", "é𝄞", "a\\b", "1\n2\n", "\n"),
        Gen.Char[' ', '~'].Array[0, 12].Select(chars => new string(chars)));

    /// <summary>Mappings of scalars, each written in one of the styles.</summary>
    private static readonly Gen<string> Documents = Gen.Select(Scalars, Gen.Int[0, 4], Write).Array[1, 6]
        .Select(values => string.Concat(values.Select((value, i) => $"k{i}:{value}\n")));

    [Fact]
    public void No_text_makes_the_reader_throw() => Texts.Sample(
        text =>
        {
            var node = Yaml.Read(text, out var problems);
            Assert.True(node is not null || problems.HasErrors);
            Assert.NotNull(ProblemText.Render(problems.All));
        },
        iter: 20_000);

    /// <summary>The tokens of a long text are found by another thread: that changes neither the tree nor what is told, faults among them.</summary>
    [Fact]
    public void A_long_text_is_read_as_a_short_one() => Gen.OneOf(Texts, Documents).Sample(
        text =>
        {
            var comment = "#" + new string('x', YamlEvents.LongText) + "\n";
            Assert.Equal(Told("#\n" + text, 2), Told(comment + text, comment.Length));
        },
        iter: 500);

    private static string Told(string text, int from)
    {
        var node = Yaml.Read(text, out var problems);
        return string.Join('\n', [
            .. (node?.AndAllBelow() ?? []).Select(each => $"{each.GetType().Name} {Past(each.Span.Start)} {Past(each.Span.End)} {(each as ScalarNode)?.Text}"),
            .. problems.All.Select(problem => $"{problem.Code} {problem.Message} {Past(problem.Span?.Start)} {Past(problem.Span?.End)} {problem.Help}"),
        ]);

        int Past(int? place) => Math.Max((place ?? 0) - from, 0);
    }

    [Fact]
    public void No_bytes_make_the_reader_throw()
    {
        using var folder = new TemporaryFolder();
        Gen.OneOf(Gen.Byte.Array[0, 60], Texts.Select(Encoding.UTF8.GetBytes), Texts.Select(Encoding.Latin1.GetBytes)).Sample(
            bytes =>
            {
                var problems = new Problems();
                var document = DocumentLoader.Load(folder.Write("any.yaml", bytes), "any.yaml", problems);
                Assert.True(document is not null || problems.HasErrors);
                Assert.NotNull(ProblemText.Render(problems.All));
            },
            iter: 5_000,
            threads: 1);
    }

    [Fact]
    public void No_text_makes_the_validator_throw() => Texts.Sample(
        text =>
        {
            if (Yaml.Read("plan-format: 1\nruns: " + text, out var problems) is { } node)
            {
                Plan.Schema.Validate(node, problems);
                Assert.NotNull(ProblemText.Render(problems.All));
            }
        },
        iter: 5_000);

    [Fact]
    public void No_slip_in_a_good_file_makes_anything_throw()
    {
        var good = File.ReadAllText(Repository.PathOf($"{Plan.Files}/Good/everything.yaml"));
        var slips = Gen.Select(Gen.Int[0, good.Length], Gen.Int[0, 8], Fragments).Array[1, 4];
        slips.Sample(
            cuts =>
            {
                var text = cuts.Aggregate(good, (text, cut) =>
                {
                    var at = Math.Min(cut.Item1, text.Length);
                    return text.Remove(at, Math.Min(cut.Item2, text.Length - at)).Insert(at, cut.Item3);
                });
                var node = Yaml.Read(text, out var problems);
                Assert.True(node is not null || problems.HasErrors);
                if (node is not null)
                {
                    Plan.Schema.Validate(node, problems);
                }

                Assert.NotNull(ProblemText.Render(problems.All));
            },
            iter: 2_000);
    }

    [Fact]
    public void Every_scalar_is_stated_by_its_span() => Documents.Sample(text =>
    {
        foreach (var scalar in Yaml.Read(text).AndAllBelow().OfType<ScalarNode>().Where(scalar => scalar.Span.Length > 0))
        {
            var again = Yaml.Scalar(scalar.Span.Text);
            Assert.Equal((scalar.Text, scalar.Kind), (again.Text, again.Kind));
        }
    });

    [Fact]
    public void Every_visible_character_of_a_scalar_is_found_in_the_source() => Documents.Sample(text =>
    {
        foreach (var scalar in Yaml.Read(text).AndAllBelow().OfType<ScalarNode>())
        {
            Assert.InRange(scalar.OffsetOf(scalar.Text.Length), scalar.Span.Start, scalar.Span.End);
            for (var i = 0; i < scalar.Text.Length; i++)
            {
                var at = scalar.OffsetOf(i);
                var isEscaped = at < text.Length && text[at] == '\\';
                Assert.True(char.IsWhiteSpace(scalar.Text[i]) || isEscaped || text[at] == scalar.Text[i], $"{i} of «{scalar.Text}» in «{text}»");
            }
        }
    });

    [Fact]
    public void Spans_lie_in_one_another_as_the_values_do() => Texts.Sample(text =>
    {
        foreach (var node in Yaml.Read(text, out _)?.AndAllBelow() ?? [])
        {
            var parts = node switch
            {
                MappingNode mapping => mapping.Entries.SelectMany(entry => new[] { entry.Key.Span, entry.Value.Span }),
                SequenceNode sequence => sequence.Items.Select(item => item.Span),
                _ => [],
            };
            Assert.All(parts, part => Assert.True(node.Span.Start <= part.Start && part.End <= node.Span.End, $"{part} in {node.Span} of «{text}»"));
        }
    });

    private static string Write(string scalar, int style) => style switch
    {
        0 when Assumed(scalar) => " " + scalar,
        1 => " '" + scalar.Replace("'", "''").Replace("\n", "\n\n  ") + "'",
        2 when scalar.Any(char.IsLetterOrDigit) => " |2+\n  " + scalar.Replace("\n", "\n  "),
        3 when Assumed(scalar) => " >-\n  " + scalar,
        _ => " \"" + scalar.Replace("\\", "\\\\").Replace("\"", "\\\"").Replace("\n", "\\n") + "\"",
    };

    /// <summary>Whether a text may stand without quotes, by a rule narrower than that of YAML.</summary>
    private static bool Assumed(string scalar)
        => scalar.Length > 0 && char.IsLetterOrDigit(scalar[0]) && char.IsLetterOrDigit(scalar[^1]) && scalar.All(c => char.IsLetterOrDigit(c) || c is ' ' or '.' or '-');
}
