using System.Globalization;
using System.Text;

namespace Auditor.Reports.Pictures;

/// <summary>The ids by which a page and its pictures name findings.</summary>
public static class Anchor
{
    /// <summary>The part of such an id that names the subject.</summary>
    /// <param name="subject">Key of the subject.</param>
    public static string OfSubject(string subject) => Of(":" + subject)["f-__".Length..];

    /// <summary>
    /// The id of a finding in a page: <c>f-</c> and its key, with nothing but ASCII letters, digits, hyphens and underscores. The colon after the
    /// rule becomes <c>__</c>, a slash <c>_-</c>, and any other character its code in hexadecimal between underscores, so that no two
    /// keys share an id.
    /// </summary>
    /// <param name="key">Key of the finding: rule and subject.</param>
    public static string Of(string key)
    {
        var id = new StringBuilder("f-", key.Length + 8);
        var colon = key.IndexOf(':');
        for (var i = 0; i < key.Length; i++)
        {
            _ = key[i] switch
            {
                '/' => id.Append("_-"),
                ':' when i == colon => id.Append("__"),
                var c when char.IsAsciiLetterOrDigit(c) || c == '-' => id.Append(c),
                var c => id.Append(CultureInfo.InvariantCulture, $"_{(int)c:x}_"),
            };
        }

        return id.ToString();
    }
}
