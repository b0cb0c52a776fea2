namespace Auditor.Hostile.Tests.Cases;

/// <summary>Report templates that came from somebody else.</summary>
internal static class TemplateCases
{
    public static IReadOnlyList<HostileCase> All { get; } =
    [
        Template("template-endless-loop", "{{ while true }}{{ end }}"),
        Template("template-loops-in-loops", "{{ for a in 1..100000 }}{{ for b in 1..100000 }}{{ end }}{{ end }}"),
        Template("template-text-that-doubles", "{{ x = 'abcdefgh'; for i in 1..1000; x = x + x; end }}"),
        Template("template-long-padding", "{{ 'x' | string.pad_left 2000000000 }}"),
        Template("template-long-range", "{{ (1..2000000000) | array.size }}"),
        Template("template-catastrophic-pattern", "{{ 'aaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaa!' | regex.match '(a+)+$' }}"),
        Template("template-brackets-deep", "{{ " + new string('(', 100_000) + "1" + new string(')', 100_000) + " }}"),
        Template("template-blocks-deep", Site.Times(2_000, "{{ if true }}") + Site.Times(2_000, "{{ end }}")),
        Template("template-includes-itself", "{{ include 'own.scriban-md' }}"),
        Template("template-includes-above", "{{ include '../site.design.yaml' }}"),
        Template("template-includes-absolute", "{{ include '/etc/passwd' }}"),
        Template("template-includes-link", "{{ include 'passwd' }}", folder => folder.Link("own/passwd", "/etc/passwd")),
        Template("template-includes-pipe", "{{ include 'pipe' }}", folder => folder.Pipe("own/pipe")),
        Template("template-function-calls-itself", "{{ func f; f; end; f }}"),
        Template("template-reads-files", "{{ object.eval_template 'x' }}"),
        Template("template-reads-clock", "{{ date.now }}"),
        Template("template-without-caution", "nothing"),
        Template("template-too-large", new string('x', 1_000_000)),
        Page("page-attribute-name-long", $"<p {new string('a', 200_000)} style=\"color: {{{{ report.project.title }}}}\">{{{{ report.caution }}}}</p>"),
        Page("page-style-after-bare-name", "<p hidden style=\"color: {{ report.project.title }}\">{{ report.caution }}</p>"),
        Page("page-handler-after-bare-name", "<button disabled onclick=\"say('{{ report.project.title }}')\">{{ report.caution }}</button>"),
        Page("page-address-after-bare-name", "<a download\n href = '{{ report.project.title }}'>{{ report.caution }}</a>"),
        Page("page-text-after-bare-name", "<p hidden title=\"{{ report.project.title }}\">{{ report.caution }}</p>"),
        Page("page-element-name-long", $"<{new string('a', 200_000)}>{{{{ report.caution }}}}"),
        Page("page-declaration-long", $"<!{new string('a', 200_000)}>{{{{ report.caution }}}}"),
        Page("page-comment-never-closed", $"<!--{new string('a', 200_000)}{{{{ report.caution }}}}"),
        Page("page-script-from-design", "<script>{{ report.project.title }}</script>"),
        HostileCase.Audit("template-of-set-is-pipe", folder => folder.With("set: firm\ntitle: Firm\ntemplates: { md: a.scriban-md }\n").Pipe("firm/a.scriban-md")) with
        {
            Arguments = ["audit", "{folder}/site.design.yaml", "--quiet", "--write", "{folder}/site.md"],
        },
    ];

    private static HostileCase Template(string name, string text, Func<HostileFolder, object>? put = null) => With(name, text, ".md", put);

    private static HostileCase Page(string name, string text) => With(name, text, ".html", null);

    private static HostileCase With(string name, string text, string ending, Func<HostileFolder, object>? put) => new(
        name,
        folder =>
        {
            folder.With("set: firm\ntitle: Firm\n").Write("own/own.scriban-md", text);
            put?.Invoke(folder);
        },
        "audit", "{folder}/site.design.yaml", "--quiet", "--template", "{folder}/own/own.scriban-md", "--write", "{folder}/site" + ending);
}
