using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using System.Text.RegularExpressions;
using Auditor.Documents;

namespace Auditor.Cli.Importing;

/// <summary>Writes the tree of a design file as YAML, in the way of the examples: small mappings in braces, large ones on lines.</summary>
internal static partial class DesignText
{
    private const int Widest = 120;

    /// <summary>Writes a mapping on lines of its own, which end with LF.</summary>
    public static string Write(MappingNode root)
    {
        var text = new StringBuilder();
        Block(text, root, 0);
        return text.ToString();
    }

    /// <summary>A scalar as YAML: plain where that cannot be taken for anything else, else in double quotes.</summary>
    public static string Scalar(ScalarNode scalar) => scalar.Kind != ScalarKind.Text || IsPlain(scalar.Text)
        ? scalar.Text
        : $"\"{JsonEncodedText.Encode(scalar.Text, JavaScriptEncoder.UnsafeRelaxedJsonEscaping)}\"";

    private static void Block(StringBuilder text, MappingNode mapping, int indent)
    {
        foreach (var entry in mapping.Entries)
        {
            // The first line of an item of a list already has its dash, and so its indentation.
            text.Append(text.Length > 0 && text[^1] != '\n' ? "" : new string(' ', indent)).Append(entry.Key.Value).Append(':');
            Value(text, entry.Value, indent);
        }
    }

    private static void Value(StringBuilder text, Node value, int indent)
    {
        if (value is SequenceNode { Items: [MappingNode, ..] } items)
        {
            text.Append('\n');
            foreach (var item in items.Items.OfType<MappingNode>())
            {
                text.Append(' ', indent + 2).Append("- ");
                Block(text, item, indent + 4);
            }

            return;
        }

        var line = Inline(value);
        if (value is not MappingNode mapping || Column(text) + line.Length < Widest)
        {
            text.Append(' ').Append(line).Append('\n');
            return;
        }

        text.Append('\n');
        Block(text, mapping, indent + 2);
    }

    private static int Column(StringBuilder text)
    {
        var column = 0;
        while (column < text.Length && text[text.Length - 1 - column] != '\n')
        {
            column++;
        }

        return column;
    }

    private static string Inline(Node node) => node switch
    {
        MappingNode mapping => $"{{ {string.Join(", ", mapping.Entries.Select(entry => $"{entry.Key.Value}: {Inline(entry.Value)}"))} }}",
        SequenceNode sequence => $"[{string.Join(", ", sequence.Items.Select(Inline))}]",
        _ => Scalar((ScalarNode)node),
    };

    private static bool IsPlain(string text) => Plain().IsMatch(text) && !LooksOtherwise().IsMatch(text);

    /// <summary>Starts with a letter or digit, ends with no blank, and has nothing in it that means something to YAML anywhere.</summary>
    [GeneratedRegex(@"^[\p{L}\p{N}]([\p{L}\p{N} ._/()+²³·°µ±%'-]*[\p{L}\p{N}._/()²³°%'])?\z", RegexOptions.ExplicitCapture | RegexOptions.NonBacktracking)]
    private static partial Regex Plain();

    /// <summary>What YAML takes, or once took, for a number, a flag, a date or nothing.</summary>
    [GeneratedRegex(@"^([0-9][0-9a-fox._+-]*|true|false|null|yes|no|on|off)\z", RegexOptions.ExplicitCapture | RegexOptions.NonBacktracking | RegexOptions.IgnoreCase)]
    private static partial Regex LooksOtherwise();
}
