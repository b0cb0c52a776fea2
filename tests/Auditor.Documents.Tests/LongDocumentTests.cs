namespace Auditor.Documents.Tests;

/// <summary>What is left out of a long document before it is explained changes nothing of what is told.</summary>
public class LongDocumentTests
{
    private static readonly Schema Example = Schema.Parse(new SourceText("example", """
        {
          "type": "object", "additionalProperties": false, "required": ["last"],
          "properties": {
            "list": { "type": "array", "minItems": 2, "items": { "type": "integer" } },
            "lists": { "type": "array", "items": { "type": "array", "items": { "type": "integer" } } },
            "words": { "type": "array", "uniqueItems": true, "items": { "type": "string" } },
            "few": { "type": "array", "maxItems": 300, "items": { "type": "integer" } },
            "map": { "type": "object", "additionalProperties": { "type": "integer" } },
            "choice": { "oneOf": [{ "type": "array", "items": { "type": "integer" } }, { "type": "string" }] },
            "last": { "type": "integer" }
          }
        }
        """));

    public static TheoryData<string, string> Documents => new()
    {
        { "a good one", $"list: [{Items(1000, _ => "1")}]\nlast: 1\n" },
        { "a list of wrong items", $"list: [{Items(1000, _ => "x")}]\nlast: 1\n" },
        { "one wrong item after good ones", $"list: [{Items(1000, _ => "1")}, x]\nlast: 1\n" },
        { "wrong items among good ones", $"list: [{Items(1000, number => number % 3 == 0 ? "x" : "1")}]\nlast: 1\n" },
        { "items that say nothing", $"list: [{Items(1000, _ => "~")}]\nlast: 1\n" },
        { "lists in a list", $"lists: [{Items(300, _ => $"[{Items(300, number => number > 250 ? "x" : "1")}]")}]\nlast: 1\n" },
        { "the same word twice", $"words: [{Items(1000, number => $"w{number % 999}")}]\nlast: 1\n" },
        { "too many items", $"few: [{Items(301, _ => "1")}]\nlast: 1\n" },
        { "a mapping of wrong values", $"map: {{ {Items(1000, number => $"k{number}: x")} }}\nlast: 1\n" },
        { "one wrong value after good ones", $"map: {{ {Items(1000, number => $"k{number}: 1")}, k: x }}\nlast: 1\n" },
        { "unknown keys before a known one", Lines(1000, number => $"k{number}: 1") + "last: x\n" },
        { "unknown keys and none that is due", Lines(1000, number => $"k{number}: 1") },
        { "a choice that is wrong", $"choice: [{Items(1000, _ => "x")}]\nlast: 1\n" },
        { "a part that was refused", $"list: [{Items(1000, number => number == 900 ? "*a" : "1")}]\n" },
    };

    [Theory]
    [MemberData(nameof(Documents))]
    public void All_of_it_is_told_as_if_nothing_had_been_left_out(string what, string text)
    {
        var root = Yaml.Read(text, out _)!;
        var (whole, cut) = (new Problems(), new Problems());

        Example.Explain(root, whole);
        Example.Validate(root, cut);

        Assert.Equal(what == "a good one", whole.All.Count == 0);
        Assert.Equal(ProblemText.Render(whole.All), ProblemText.Render(cut.All));
    }

    private static string Items(int count, Func<int, string> item) => string.Join(", ", Enumerable.Range(0, count).Select(item));

    private static string Lines(int count, Func<int, string> line) => string.Concat(Enumerable.Range(0, count).Select(number => line(number) + "\n"));
}
