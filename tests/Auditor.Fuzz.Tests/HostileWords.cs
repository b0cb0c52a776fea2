using System.Text;

namespace Auditor.Fuzz.Tests;

/// <summary>What some reader or other takes for more than text.</summary>
internal static class HostileWords
{
    private static readonly string[] OfFiles =
    [
        "&a ", "*a", "!!set ", "<<: ", "---\n", "...\n", "%YAML 1.1\n", "? ", ": ", "- ", "[", "]", "{", "}", "\"", "'", "|\n", ">\n", "\t", "\r\n", "\0", "\uFEFF", "\u2028",
        "include: ../../etc/passwd\n", "include: a.yaml\n", "null", "~", "true", "id: 1\n", "feeds: A\n", ",", ";", "\",\"", "\"\"", "\\u0000", "\\uD800",
    ];

    private static readonly string[] OfNumbers =
    [
        "0", "-1", "1e308", "1e309", "0x7fffffffffffffff", ".nan", "NaN", "99999999999999999999", "1e-15", "4.9e-324",
        " mm²", " kA", " °C", " %", " ± 200 %", " ± 1e300 m", " +3 m -1 m", ", assumed", "^-1", "·", "/m", "√s",
    ];

    private static readonly string[] OfFormulas =
    [
        "(", ")", "((((((((((((((((", " ^ ", " ** ", " / 0 ", " ?? ", "choose(", "missing", "given(", "matches(", "'(a+)+$'", "sum_of(circuits, ", "all_of(legs, ", "up.", "this.",
        "param.", " && ", " || ", "!", " == ", " < ", " ^ 0.5", "1e300 * 1e300", "sqrt(-1)", "min(", "max(", " + ", " - ",
    ];

    private static readonly string[] OfTemplates =
    [
        "{{", "}}", "{{ include 'x' }}", "{{ while true }}", "{{ end }}", "{{ for i in 1..1000000000 }}", "{{ 'a' * 100000000 }}", "{{ report.findings }}", "{{~", "-}}",
        " | string.replace 'a' 'aaaaaaaa'", " | string.pad_left 1000000000", " | array.sort", "{{ func f }}", "{{ capture x }}", "<script>", "<style>", "<a href=\"", "<!--", "-->",
    ];

    /// <summary>All of them.</summary>
    public static IReadOnlyList<byte[]> All { get; } = [.. OfFiles.Concat(OfNumbers).Concat(OfFormulas).Concat(OfTemplates).Select(Encoding.UTF8.GetBytes)];
}
