using System.Text;
using System.Xml;

namespace Auditor.Reports.JUnit;

/// <summary>
/// Writes texts with � for what XML 1.0 has no way to write: a design holds no such characters, but the name of a file may.
/// </summary>
internal static class XmlText
{
    private const string Stand = "\uFFFD";

    /// <summary>Writes an attribute.</summary>
    public static void Attribute(this XmlWriter xml, string name, string value) => xml.WriteAttributeString(name, Writable(value));

    /// <summary>Writes the text of an element.</summary>
    public static void Text(this XmlWriter xml, string text) => xml.WriteString(Writable(text));

    private static string Writable(string text)
    {
        var writable = new StringBuilder(text.Length);
        // A half of a surrogate pair that stands alone comes as � from the enumeration itself.
        foreach (var rune in text.EnumerateRunes())
        {
            writable.Append(rune.IsBmp && !XmlConvert.IsXmlChar((char)rune.Value) ? Stand : rune.ToString());
        }

        return writable.ToString();
    }
}
