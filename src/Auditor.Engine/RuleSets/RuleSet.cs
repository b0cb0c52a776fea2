using Auditor.Documents;
using Auditor.Engine.Adjustments;
using Auditor.Engine.HouseSets;
using Auditor.Engine.Installation;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>A rule set in force: everything that the chain of set files brings together, bound and ready.</summary>
public sealed class RuleSet
{
    private readonly QuantityDefinition[][] _quantities;
    private readonly Rule[][] _rulesByShape;
    private readonly Dictionary<(SubjectShape Shape, int Reading), QuantityDefinition> _uncertainties;

    internal RuleSet(RuleSetTitle title, DesignSchema schema, FormulaWorld world, IReadOnlyList<Parameter> parameters,
        QuantityDefinition[][] quantities, IReadOnlyList<Rule> rules, IReadOnlyList<Rule> recordRules, IReadOnlyList<InputFile> files)
    {
        Title = title;
        Schema = schema;
        World = world;
        Parameters = parameters;
        Rules = rules;
        RecordRules = recordRules;
        Files = files;
        _quantities = quantities;
        _rulesByShape = [.. schema.Shapes.All.Select(shape => AllRules.Where(rule => rule.Shape == shape).ToArray())];
        _uncertainties = Quantities.Where(quantity => quantity.Uncertainty is not null)
            .ToDictionary(quantity => (quantity.Shape, quantity.Uncertainty!.Reading.Index));
    }

    /// <summary>Name, edition and notice.</summary>
    public RuleSetTitle Title { get; }

    /// <summary>What a design may say.</summary>
    public DesignSchema Schema { get; }

    /// <summary>Tables, curves and parameters.</summary>
    public FormulaWorld World { get; }

    /// <summary>Parameters, by slot number.</summary>
    public IReadOnlyList<Parameter> Parameters { get; }

    /// <summary>The rules that the set holds, by id.</summary>
    public IReadOnlyList<Rule> Rules { get; }

    /// <summary>What can be changed in a design, by id.</summary>
    public IReadOnlyList<Adjustment> Adjustments { get; internal init; } = [];

    /// <summary>The rules of the program about the record of an audit, by id: they come with every set, and none changes them.</summary>
    public IReadOnlyList<Rule> RecordRules { get; }

    /// <summary>The rules of the set, then those about the record.</summary>
    public IEnumerable<Rule> AllRules => Rules.Concat(RecordRules);

    /// <summary>The pictures that its reports show, in their order.</summary>
    public IReadOnlyList<PicturePlan> Pictures { get; internal init; } = [];

    /// <summary>The files that it was read from.</summary>
    public IReadOnlyList<InputFile> Files { get; }

    /// <summary>What house sets change in those that they are built on: by kind, then by name.</summary>
    public required IReadOnlyList<HouseChange> Changes { get; init; }

    /// <summary>The report templates that it brings, by the ending of the reports that they write.</summary>
    public required IReadOnlyDictionary<string, SetTemplate> Templates { get; init; }

    /// <summary>Display paths of the files that house sets bring.</summary>
    public required IReadOnlySet<string> HouseFiles { get; init; }

    /// <summary>All quantities, by kind of subject, then by slot number.</summary>
    public IEnumerable<QuantityDefinition> Quantities => _quantities.SelectMany(list => list);

    /// <summary>The rules of one kind of subject, by id.</summary>
    public IReadOnlyList<Rule> RulesOf(SubjectShape shape) => _rulesByShape[shape.Index];

    /// <summary>The definition of a quantity.</summary>
    public QuantityDefinition Quantity(SubjectShape shape, int slot) => _quantities[shape.Index][slot];

    /// <summary>The quantity that is the uncertainty of an input as read; null where none is known.</summary>
    public QuantityDefinition? UncertaintyOf(SubjectShape shape, InputSlot reading) => _uncertainties.GetValueOrDefault((shape, reading.Index));

    /// <summary>The rule of that id, present or former; null when there is none.</summary>
    public Rule? Rule(string id) => AllRules.FirstOrDefault(rule => rule.Id == id) ?? AllRules.FirstOrDefault(rule => rule.Formerly.Contains(id));
}
