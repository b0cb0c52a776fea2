using System.Collections.Concurrent;
using Auditor.Documents;
using Auditor.Engine.Registers;
using Auditor.Engine.RuleSets;
using Auditor.Engine.RuleTests;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Testing;

namespace Auditor.Rules.Tests;

/// <summary>The shipped rule data, read once.</summary>
internal static class Shipped
{
    public const string UnitedKingdom = "united-kingdom";
    public const string Base = "iec-base";

    private static readonly ConcurrentDictionary<string, Lazy<RuleSet>> Sets = [];

    public static RuleHome Home { get; } = new(Repository.PathOf("rules"), "rules");

    public static Register Register { get; } = Register.Load(Home, new Problems());

    /// <summary>The figures of a lookup.</summary>
    public static Lookup Lookup(string name) => Set(UnitedKingdom).World.Lookups[name];

    public static RuleSet Set(string name) => Sets.GetOrAdd(name, key => new Lazy<RuleSet>(() => Load(key))).Value;

    /// <summary>The definition of a quantity.</summary>
    public static QuantityDefinition Quantity(string set, string shape, string symbol)
    {
        var kind = Set(set).Schema.Shapes.Find(shape)!;
        return Set(set).Quantity(kind, kind.Quantity(symbol)!.Index);
    }

    /// <summary>A quantity of a subject made up for a test, in coherent units.</summary>
    /// <param name="set">Name of the set.</param>
    /// <param name="shape">Kind of subject.</param>
    /// <param name="symbol">Symbol of the quantity.</param>
    /// <param name="given">What the subject is given, as a case gives it: a mapping in YAML.</param>
    public static double Compute(string set, string shape, string symbol, string given)
    {
        var problems = new Problems();
        var node = YamlReader.Read(new SourceText("given", given), problems);
        var quantity = Quantity(set, shape, symbol);
        var value = new CaseRunner(Set(set), problems).Evaluate(quantity.Formula, quantity.Shape, (MappingNode)node!);
        Assert.Equal("", ProblemText.Render(problems.All));
        Assert.False(value.IsMissing, value.IsMissing ? string.Join("; ", value.Absences.Items) : "");
        Assert.Equal(ValueKind.Quantity, value.Kind);
        return value.Number;
    }

    private static RuleSet Load(string name)
    {
        var problems = new Problems();
        var set = RuleSetLoader.Load(Home, name, Repository.Root, null, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return set!;
    }
}
