using Auditor.Fuzz.Tests.Kinds;

namespace Auditor.Fuzz.Tests;

/// <summary>All kinds of input with their shares of a run, in thousandths: most of it goes where an input costs least.</summary>
internal static class FuzzKinds
{
    public static IReadOnlyList<(string Name, int Share, Func<FuzzKind> Open)> All { get; } =
    [
        ("quantities", 170, () => new QuantityTexts()),
        ("formulas", 287, () => new FormulaTexts()),
        ("yaml files", 200, () => new YamlFiles()),
        ("rule files", 60, () => new RuleFiles()),
        ("tables and curves", 70, () => new TableFiles()),
        ("circuit lists", 60, () => new CircuitListFiles()),
        ("findings files", 20, () => new FindingsFiles()),
        ("designs", 60, () => new DesignFiles()),
        ("boards", 6, () => new BoardFiles()),
        ("audits", 15, () => new Audits()),
        ("reports", 1, () => new AuditReports()),
        ("sets of a house", 1, () => new HouseFiles("rules/sets", "rules/sets/shed.yaml")),
        ("sheets of a house", 5, () => new HouseFiles("rules/sheets", "rules/sheets/shed.yaml")),
        ("provisions of a house", 5, () => new HouseFiles("rules/provisions", "rules/provisions/load-within-capacity.yaml")),
        ("adjustments of a house", 3, () => new HouseFiles("rules/adjustments", "rules/adjustments/cable-length.yaml")),
        ("pictures of a house", 2, () => new HouseFiles("rules/pictures", "rules/pictures/margins.yaml")),
        ("text templates", 20, () => new Templates(".scriban-md")),
        ("page templates", 10, () => new Templates(".scriban-html")),
        ("schedules", 5, () => new Schedules()),
    ];
}
