using System.Text;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Json;
using Auditor.Reports.Reading;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Sarif;

/// <summary>Writes rules as reporting descriptors.</summary>
internal static class RuleSarif
{
    private static readonly MarkdownInk Ink = new();

    public static void Write(JsonOutput output, Rule rule)
    {
        output.Text("id", rule.Id);
        Name(output, rule.Id);
        if (rule.Formerly.Count > 0)
        {
            output.Texts("deprecatedIds", rule.Formerly);
        }

        output.Message("shortDescription", rule.Title + ".");
        output.Message("fullDescription", rule.Why);
        output.Message("help", Help(rule), MarkdownHelp(rule));
        output.Object("defaultConfiguration", () => output.Text("level", Level(rule.Provision)));
        output.Object("properties", () =>
        {
            output.Texts("tags", [rule.Clause.Type]);
            output.Text("provision", rule.Provision.Word());
            output.Text("clauseType", rule.Clause.Type);
            output.Texts("references", rule.Clause.References);
            output.TextIfAny("note", rule.Clause.Note);
            output.Texts("covers", rule.Covers);
            output.Text("file", rule.Path);
        });
    }

    /// <summary>How grave it is when the provision is not kept.</summary>
    public static string Level(Provision provision) => provision == Provision.Requirement ? "error" : "warning";

    private static string Help(Rule rule)
    {
        var text = new StringBuilder(rule.Why).Append('\n').Append('\n').Append(Authority(rule)).Append('.');
        if (rule.PutRightBy.Count > 0)
        {
            text.Append("\nCan be put right by: ").AppendJoin(", ", rule.PutRightBy).Append('.');
        }

        return text.ToString();
    }

    private static string MarkdownHelp(Rule rule)
    {
        var text = new StringBuilder("**").Append(Ink.Inert(rule.Title, startsBlock: false)).Append("**\n\n")
            .Append(Ink.Prose(rule.Why)).Append("\n\n- ").Append(Ink.Inert(Authority(rule), startsBlock: true));
        if (rule.PutRightBy.Count > 0)
        {
            text.Append("\n- can be put right by: ").AppendJoin(", ", rule.PutRightBy.Select(Ink.Code));
        }

        return text.Append("\n- rule: ").Append(Ink.Code(rule.Id)).ToString();
    }

    private static string Authority(Rule rule)
    {
        var references = rule.Clause.References.Count == 0 ? "" : ": " + string.Join(", ", rule.Clause.References);
        var note = rule.Clause.Note.Length == 0 ? "" : $" ({rule.Clause.Note})";
        return $"{rule.Provision.Word()}, {rule.Clause.Type}{references}{note}";
    }

    /// <summary>The id without hyphens, each word with a capital, as the format writes names; none where that would only repeat the id.</summary>
    private static void Name(JsonOutput output, string id)
    {
        var words = id.Split('-', StringSplitOptions.RemoveEmptyEntries);
        if (words.Length > 1)
        {
            output.Text("name", string.Concat(words.Select(word => char.ToUpperInvariant(word[0]) + word[1..])));
        }
    }
}
