using System.Text;
using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Installation;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;

namespace Auditor.Limits.Tests;

/// <summary>
/// A design as a flat list of what each subject states, so that a test can state one thing otherwise and build the design again.
/// </summary>
/// <param name="Stated">Text of every input, by key of the subject and path of the input.</param>
/// <param name="Boards">Ids of the boards, each with the ids of its circuits and how many legs each has.</param>
internal sealed record Plan(
    IReadOnlyDictionary<(string Subject, string Path), string> Stated, IReadOnlyList<(string Board, IReadOnlyList<(string Circuit, int Legs)> Circuits)> Boards)
{
    /// <summary>The same plan with one input stated otherwise.</summary>
    public Plan With(string subject, string path, string text) =>
        this with { Stated = new Dictionary<(string, string), string>(Stated) { [(subject, path)] = text } };

    private const string Name = "plan.design.yaml";

    /// <summary>Reads the design of a plan again, with its text changed.</summary>
    public static Reread Rereading(RuleSet rules) => texts => Build(rules, texts[Name]);

    /// <summary>Builds the design; the test fails when it is not valid.</summary>
    public Design Build(RuleSet rules) => Build(rules, Text());

    /// <summary>Builds a design from text; the test fails when it is not valid.</summary>
    public static Design Build(RuleSet rules, string text)
    {
        var problems = new Problems();
        var root = (MappingNode)YamlReader.Read(new SourceText(Name, text), problems)!;
        rules.Schema.Validation.Validate(root, problems);
        var design = DesignBuilder.Build(new DesignFile(Name, root, []), new Evaluator(rules), problems);
        Assert.True(problems.All.Count == 0, ProblemText.Render(problems.All));
        return design!;
    }

    /// <summary>The plan as a design file.</summary>
    public string Text()
    {
        var text = new StringBuilder("design-format: 1\n");
        foreach (var group in Entries("-").GroupBy(entry => entry.Path.Split('.')[0]))
        {
            text.Append($"{group.Key}: {Nested([.. group.Select(entry => (Rest(entry.Path), entry.Text))])}\n");
        }

        text.Append("boards:\n");
        foreach (var (board, circuits) in Boards)
        {
            text.Append($"  - id: {board}\n");
            Members(text, board, "    ");
            text.Append("    circuits:\n");
            foreach (var (circuit, legs) in circuits)
            {
                var key = $"{board}/{circuit}";
                text.Append($"      - id: \"{circuit}\"\n");
                Members(text, key, "        ");
                text.Append("        legs:\n");
                for (var leg = 1; leg <= legs; leg++)
                {
                    text.Append($"          - {Nested(Entries($"{key}/leg {leg}"))}\n");
                }
            }
        }

        return text.ToString();
    }

    private void Members(StringBuilder text, string subject, string indent)
    {
        foreach (var group in Entries(subject).GroupBy(entry => entry.Path.Split('.')[0]))
        {
            text.Append($"{indent}{group.Key}: {Nested([.. group.Select(entry => (Rest(entry.Path), entry.Text))])}\n");
        }
    }

    private List<(string Path, string Text)> Entries(string subject) =>
        [.. Stated.Where(pair => pair.Key.Subject == subject).Select(pair => (pair.Key.Path, pair.Value)).OrderBy(pair => pair.Path, StringComparer.Ordinal)];

    private static string Rest(string path) => path.Contains('.') ? path[(path.IndexOf('.') + 1)..] : "";

    private static string Nested(List<(string Path, string Text)> entries)
    {
        if (entries is [("", var only)])
        {
            return only;
        }

        var groups = entries.GroupBy(entry => entry.Path.Split('.')[0]);
        return "{ " + string.Join(", ", groups.Select(group => $"{group.Key}: {Nested([.. group.Select(entry => (Rest(entry.Path), entry.Text))])}")) + " }";
    }
}
