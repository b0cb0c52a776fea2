using System.Collections;
using System.Reflection;
using System.Text;
using System.Text.RegularExpressions;
using System.Xml.Linq;
using Auditor.Reports.Model;
using Scriban.Runtime;

namespace Auditor.Reports.Tests;

/// <summary>Lists what templates reach, from the types of the model and their documentation comments.</summary>
internal static partial class ModelReference
{
    private static readonly Dictionary<string, string> Comments = ReadComments("Auditor.Reports.xml", "Auditor.Documents.xml", "Auditor.Engine.xml");

    /// <summary>The reference in Markdown: one table for each type, in the order in which they are met.</summary>
    public static string Write()
    {
        var text = new StringBuilder();
        var open = new Queue<Type>([typeof(ReportModel)]);
        var seen = new HashSet<Type>([typeof(ReportModel)]);
        while (open.TryDequeue(out var type))
        {
            text.Append($"### {Name(type)}\n\n{Summary("T:" + type.FullName)}\n\n| member | type | |\n|:--|:--|:--|\n");
            foreach (var property in Members(type))
            {
                text.Append($"| `{StandardMemberRenamer.Rename(property.Name)}` | {Shown(property.PropertyType, property)} | {About(property)} |\n");
                if (Inner(property.PropertyType) is { } inner && inner.Namespace!.StartsWith("Auditor", StringComparison.Ordinal) && Name(inner) != "markup" && seen.Add(inner))
                {
                    open.Enqueue(inner);
                }
            }

            text.Append('\n');
        }

        return text.ToString();
    }

    private static IEnumerable<PropertyInfo> Members(Type type) =>
        type.GetProperties(BindingFlags.Public | BindingFlags.Instance).Where(property => property.GetIndexParameters().Length == 0).OrderBy(property => property.MetadataToken);

    private static Type? Inner(Type type) => IsList(type) ? Inner(type.GetGenericArguments()[0]) : type;

    private static bool IsList(Type type) => type != typeof(string) && type.IsGenericType && typeof(IEnumerable).IsAssignableFrom(type);

    private static string Shown(Type type, PropertyInfo property)
    {
        if (IsList(type))
        {
            return "list of " + Shown(type.GetGenericArguments()[0], property);
        }

        var mayBeNull = new NullabilityInfoContext().Create(property).ReadState == NullabilityState.Nullable ? ", or null" : "";
        return Name(type) + mayBeNull;
    }

    private static string Name(Type type) => type switch
    {
        _ when type == typeof(string) => "text",
        _ when type == typeof(int) => "whole number",
        _ when type == typeof(bool) => "flag",
        _ => StandardMemberRenamer.Rename(type.Name).Replace("report_", "", StringComparison.Ordinal).Replace('_', ' '),
    };

    private static string About(PropertyInfo property)
    {
        var own = Summary($"P:{property.DeclaringType!.FullName}.{property.Name}");
        return own.Length > 0 ? own : Summary($"T:{property.DeclaringType.FullName}:{property.Name}");
    }

    private static string Summary(string id) => Comments.GetValueOrDefault(id, "");

    private static Dictionary<string, string> ReadComments(params string[] files)
    {
        var comments = new Dictionary<string, string>(StringComparer.Ordinal);
        foreach (var member in files.SelectMany(file => XDocument.Load(Path.Combine(AppContext.BaseDirectory, file)).Descendants("member")))
        {
            var id = member.Attribute("name")!.Value;
            comments.TryAdd(id, Line(member.Element("summary")));
            foreach (var parameter in member.Elements("param"))
            {
                comments.TryAdd($"{id}:{parameter.Attribute("name")!.Value}", Line(parameter));
            }
        }

        return comments;
    }

    private static string Line(XElement? element)
    {
        var words = element?.Nodes().Select(node => node switch
        {
            XElement { Name.LocalName: "c" } code => $"`{code.Value}`",
            XElement other => other.Attribute("cref")?.Value.Split('.')[^1] ?? other.Value,
            _ => node.ToString(),
        });
        return Blanks().Replace(string.Concat(words ?? []), " ").Trim().Replace("|", "\\|", StringComparison.Ordinal);
    }

    [GeneratedRegex(@"\s+", RegexOptions.None, matchTimeoutMilliseconds: 1000)]
    private static partial Regex Blanks();
}
