using System.Text;

namespace Auditor.Hostile.Tests.Cases;

/// <summary>Files that are no text, and paths that are no file.</summary>
internal static class FileCases
{
    private const string Design = "site.design.yaml";

    public static IReadOnlyList<HostileCase> All { get; } =
    [
        Bytes("bytes-not-utf-8", [.. Encoding.UTF8.GetBytes(Site.Good), 0x23, 0xC3, 0x28, 0x0A]),
        Bytes("bytes-latin-1", Encoding.Latin1.GetBytes(Site.Good)),
        Bytes("bytes-utf-16", [0xFF, 0xFE, .. Encoding.Unicode.GetBytes(Site.Good)]),
        Bytes("byte-order-mark", [0xEF, 0xBB, 0xBF, .. Encoding.UTF8.GetBytes(Site.Good)]),
        HostileCase.Audit("lines-crlf", Site.Good.Replace("\n", "\r\n", StringComparison.Ordinal)),
        HostileCase.Audit("lines-cr", Site.Good.Replace('\n', '\r')),
        HostileCase.Audit("nul-in-text", Site.Good.Replace("Lamps", "La\0mps", StringComparison.Ordinal)),
        HostileCase.Audit("nul-by-escape", Site.Good.Replace("Lamps", "\"La\\0mps\"", StringComparison.Ordinal)),
        HostileCase.Audit("escape-sequence-of-a-terminal", Site.Good.Replace("Lamps", "\e[2J", StringComparison.Ordinal)),
        HostileCase.Audit("half-a-character", Site.Good.Replace("Lamps", "\"\\uD800\"", StringComparison.Ordinal)),
        HostileCase.Audit("right-to-left-override", Site.Good.Replace("name: Lamps", "nmae: \u202Espmal", StringComparison.Ordinal)),
        HostileCase.Audit("nothing-in-it", ""),
        HostileCase.Audit("is-pipe", folder => folder.Pipe(Design)),
        HostileCase.Audit("is-link", folder => folder.Write("there.yaml", Site.Good).Link(Design, "there.yaml")),
        HostileCase.Audit("is-link-to-pipe", folder => folder.Pipe("pipe").Link(Design, "pipe")),
        HostileCase.Audit("is-link-to-device", folder => folder.Link(Design, "/dev/zero")),
        HostileCase.Audit("is-link-to-itself", folder => folder.Link(Design, Design)),
        HostileCase.Audit("is-link-to-nothing", folder => folder.Link(Design, "none")),
        HostileCase.Audit("is-folder", folder => folder.Write(Design + "/none.txt", "")),
        new("is-device", _ => { }, "audit", "/dev/zero"),
        new("is-own-memory", _ => { }, "audit", "/proc/self/mem"),
        new("folder-with-links-in-a-circle", folder => folder.Write("a/" + Design, Site.Good).Link("a/b", ".."), "audit", "{folder}", "--fail-on", "nonconforming"),
        new("name-with-a-line-break", folder => folder.Write("a\nb.design.yaml", "x"), "audit", "{folder}/a\nb.design.yaml"),
    ];

    private static HostileCase Bytes(string name, byte[] bytes) => HostileCase.Audit(name, folder => folder.Write(Design, bytes));
}
