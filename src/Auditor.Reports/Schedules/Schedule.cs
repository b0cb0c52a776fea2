using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Schedules;

/// <summary>The columns of the schedule of circuits, as a file in the template's folder lists them.</summary>
/// <param name="Columns">The columns that the rule set can fill.</param>
public sealed record Schedule(IReadOnlyList<ScheduleColumn> Columns)
{
    /// <summary>File name of the schedule, in the folder of a template.</summary>
    public const string FileName = "schedule.yaml";

    private const string SchemaName = "schedule.schema.json";

    private static readonly Lazy<Schema> Validation = new(ReadSchema);

    /// <summary>Reads the schedule that belongs to a template: the one in its folder, else the shipped one.</summary>
    /// <param name="template">The template; null for a report that has none, and so the shipped schedule.</param>
    /// <param name="rules">The rule set that has to fill the columns.</param>
    /// <param name="problems">Receives what is wrong; a name that the rule set does not know is a warning, and its column is left out.</param>
    /// <returns>The schedule; null when the file cannot be used.</returns>
    public static Schedule? For(TemplateFile? template, RuleSet rules, Problems problems)
    {
        var file = template?.Beside(FileName);
        return Read(file is not null && File.Exists(file.FullPath) ? file : TemplateFile.ShippedAs(FileName), rules, problems);
    }

    private static Schedule? Read(TemplateFile file, RuleSet rules, Problems problems)
    {
        if (new FileInfo(file.FullPath).LinkTarget is not null)
        {
            problems.Add(ScheduleMessages.Linked(file.DisplayPath));
            return null;
        }

        var own = new Problems();
        var root = SourceReader.Read(file.FullPath, file.DisplayPath, own) is { } source ? YamlReader.Read(source, own) : null;
        if (root is not null)
        {
            Validation.Value.Validate(root, own);
        }

        var columns = own.HasErrors || root is not MappingNode mapping ? null : ReadColumns(mapping, rules, own);
        foreach (var problem in own.All)
        {
            problems.Add(problem);
        }

        return columns is null ? null : new Schedule(columns);
    }

    private static List<ScheduleColumn> ReadColumns(MappingNode root, RuleSet rules, Problems problems) =>
        [.. root.Mappings("columns").Select(node => ReadColumn(node, rules, problems)).OfType<ScheduleColumn>()];

    private static ScheduleColumn? ReadColumn(MappingNode node, RuleSet rules, Problems problems)
    {
        var ofLegs = node.Text("of") == rules.Schema.Shapes.Leg.Name;
        var shape = ofLegs ? rules.Schema.Shapes.Leg : rules.Schema.Shapes.Circuit;
        var names = node.Items("shows").OfType<ScalarNode>().ToArray();
        var unknown = names.Where(name => !Knows(shape, name.Text)).ToArray();
        foreach (var name in unknown)
        {
            var known = shape.Quantities.Select(slot => slot.Symbol).Concat(shape.Inputs.Select(slot => slot.Name));
            problems.Add(ScheduleMessages.UnknownName(name.Span, name.Text, shape.Name, NearestWord.Find(name.Text, known)));
        }

        return unknown.Length > 0 ? null : new ScheduleColumn(node.Text("heading")!, ofLegs, [.. names.Select(name => name.Text)]);
    }

    private static bool Knows(SubjectShape shape, string name) => shape.Quantity(name) is not null || shape.Input(name) is not null;

    private static Schema ReadSchema()
    {
        using var stream = typeof(Schedule).Assembly.GetManifestResourceStream(SchemaName)!;
        using var reader = new StreamReader(stream);
        return Schema.Parse(new SourceText("templates/" + SchemaName, reader.ReadToEnd()));
    }
}
