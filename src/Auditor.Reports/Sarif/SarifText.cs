using Auditor.Reports.Json;

namespace Auditor.Reports.Sarif;

/// <summary>Writes messages.</summary>
internal static class SarifText
{
    /// <summary>A message, or a message string, of plain text.</summary>
    public static void Message(this JsonOutput output, string? name, string text) => output.Message(name, text, null);

    /// <summary>A message, or a message string, of plain text and, for readers that show it, Markdown.</summary>
    public static void Message(this JsonOutput output, string? name, string text, string? markdown) => output.Object(name, () =>
    {
        output.Text("text", Literal(text));
        if (markdown is not null)
        {
            output.Text("markdown", Literal(markdown));
        }
    });

    /// <summary>A text that is left out where it is empty: the format knows no null.</summary>
    public static void TextIfAny(this JsonOutput output, string name, string? text)
    {
        if (!string.IsNullOrEmpty(text))
        {
            output.Text(name, text);
        }
    }

    /// <summary>Braces set off placeholders in every message string, and so stand doubled (SARIF 2.1.0, 3.11.5).</summary>
    private static string Literal(string text) =>
        text.Replace("{", "{{", StringComparison.Ordinal).Replace("}", "}}", StringComparison.Ordinal);
}
