using System.Buffers;
using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace Auditor.Documents;

/// <summary>Resolves what a scalar is from its style and tag, and refuses tags other than those of the YAML core schema.</summary>
internal static class ScalarTags
{
    private const string Core = "tag:yaml.org,2002:";

    private static readonly SearchValues<char> EndOfProperty = SearchValues.Create(" \t\r\n,]}");

    /// <summary>Makes the node of a scalar; null when its tag does not fit it.</summary>
    public static ScalarNode? Resolve(Scalar scalar, SourceSpan span, Problems problems)
    {
        if (scalar.Style == ScalarStyle.DoubleQuoted && ForbiddenCharacters.FirstIn(scalar.Value) is var at and >= 0)
        {
            problems.Add(ReadingProblems.ForbiddenEscape(span, scalar.Value[at]));
        }

        var plain = CoreSchema.Resolve(scalar.Value, out var number);
        if (scalar.Tag.IsEmpty)
        {
            return scalar.Style == ScalarStyle.Plain
                ? new ScalarNode(span, scalar.Value, plain, number)
                : new ScalarNode(span, scalar.Value, ScalarKind.Text);
        }

        var kind = KindOf(scalar.Tag);
        if (kind is null)
        {
            problems.Add(ReadingProblems.ForeignTag(PropertiesOf(span)));
        }

        if (kind is null or ScalarKind.Text)
        {
            return new ScalarNode(span, scalar.Value, ScalarKind.Text);
        }

        if (kind == plain)
        {
            return new ScalarNode(span, scalar.Value, plain, number);
        }

        problems.Add(ReadingProblems.TagDoesNotFit(PropertiesOf(span)));
        return null;
    }

    public static void CheckCollection(NodeEvent start, SourceSpan span, Problems problems)
    {
        if (start.Tag.IsEmpty)
        {
            return;
        }

        if (start.Tag.IsNonSpecific || start.Tag.Value is not (Core + "map" or Core + "seq"))
        {
            problems.Add(ReadingProblems.ForeignTag(PropertiesOf(span)));
        }
        else if (start.Tag.Value == Core + "map" != start is MappingStart)
        {
            problems.Add(ReadingProblems.TagDoesNotFit(PropertiesOf(span)));
        }
    }

    /// <summary>The stretch of the first anchor or tag at the start of a value.</summary>
    public static SourceSpan PropertiesOf(SourceSpan value)
    {
        var rest = value.Source.Text.AsSpan(value.Start);
        var length = rest.StartsWith("!<") ? rest.IndexOf('>') + 1 : rest.IndexOfAny(EndOfProperty);
        return value with { End = value.Start + (length < 0 ? rest.Length : Math.Max(Math.Min(1, rest.Length), length)) };
    }

    /// <summary>How much of a value as written is taken by anchors and tags before its content.</summary>
    public static int PropertiesLength(ReadOnlySpan<char> written)
    {
        var at = 0;
        while (at < written.Length && written[at] is '&' or '!')
        {
            var length = written[at..].IndexOfAny(" \t\r\n");
            at = length < 0 ? written.Length : at + length;
            while (at < written.Length && char.IsWhiteSpace(written[at]))
            {
                at++;
            }
        }

        return at;
    }

    private static ScalarKind? KindOf(TagName tag) => tag.IsNonSpecific ? ScalarKind.Text : tag.Value switch
    {
        Core + "str" => ScalarKind.Text,
        Core + "int" or Core + "float" => ScalarKind.Number,
        Core + "bool" => ScalarKind.Flag,
        Core + "null" => ScalarKind.Null,
        _ => null,
    };
}
