using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Model;

/// <summary>The definitions of the quantities that a report shows.</summary>
internal sealed class DefinitionList(RuleSet rules, Places places)
{
    private readonly Dictionary<(string Kind, string Symbol), ReportDefinition> _definitions = [];

    /// <summary>All that were asked for, by kind of subject and symbol.</summary>
    public IReadOnlyList<ReportDefinition> All =>
        [.. _definitions.Values.OrderBy(one => one.Kind, StringComparer.Ordinal).ThenBy(one => one.Symbol, StringComparer.Ordinal)];

    /// <summary>Id of the definition of a quantity.</summary>
    public string AnchorOf(DesignSubject subject, string symbol)
    {
        if (!_definitions.TryGetValue((subject.Shape.Name, symbol), out var definition))
        {
            var defined = rules.Quantity(subject.Shape, subject.Shape.Quantity(symbol)!.Index);
            definition = new ReportDefinition(
                $"d{_definitions.Count}", subject.Shape.Name, symbol, defined.Name, defined.Clause.References, defined.Note,
                places.Text(defined.Formula.Source.Span));
            _definitions.Add((subject.Shape.Name, symbol), definition);
        }

        return definition.Anchor;
    }
}
