using Auditor.Formulas.Tables;

namespace Auditor.Rules.Tests;

/// <summary>Figures that physics or their purpose lets go one way only, along every numeric key of every lookup.</summary>
public class CourseTests
{
    private static readonly Dictionary<string, Course> Courses = new()
    {
        ["afdd-break-time arc-current"] = Course.Falls,
        ["afdd-half-cycles arc-current"] = Course.Falls,
        ["ambient-air-factor ambient"] = Course.Falls,
        ["ambient-air-factor-iec ambient"] = Course.Falls,
        ["ambient-air-factor-semi-enclosed ambient"] = Course.Falls,
        ["armour-area cores"] = Course.Rises,
        ["armour-area csa"] = Course.Rises,
        ["armour-resistance cores"] = Course.Falls,
        ["armour-resistance csa"] = Course.Falls,
        ["armour-resistance-single-core csa"] = Course.Falls,
        ["breaker-test-time multiple"] = Course.Falls,
        ["breaker-test-time rating"] = Course.Rises,
        ["bs1362-gate rating"] = Course.Rises,
        ["bs1362-gate current"] = Course.Falls,
        ["capacity-formula-a loaded"] = Course.Free, // fitted coefficients, of which only A·S^m means anything
        ["capacity-formula-a csa"] = Course.Free,
        ["capacity-formula-m loaded"] = Course.Free,
        ["capacity-formula-m csa"] = Course.Free,
        ["conductor-resistance class"] = Course.Free, // at 50 mm² flexible strands have a thousandth less
        ["conductor-resistance csa"] = Course.Falls,
        ["conventional-current rating"] = Course.Falls,
        ["conventional-non-tripping rating"] = Course.Falls,
        ["conventional-time rating"] = Course.Rises,
        ["current-capacity loaded"] = Course.Falls,
        ["current-capacity csa"] = Course.Rises,
        ["current-capacity-iec loaded"] = Course.Falls,
        ["current-capacity-iec csa"] = Course.Rises,
        ["current-capacity-iec-2001 loaded"] = Course.Falls,
        ["current-capacity-iec-2001 csa"] = Course.Rises,
        ["depth-factor depth"] = Course.Falls,
        ["disconnection-time U0"] = Course.Falls,
        ["disconnection-time-dc U0"] = Course.Falls,
        ["electrode-maximum residual-current"] = Course.Falls,
        ["flat-cable-cpc csa"] = Course.Rises,
        ["gg-gate rating"] = Course.Rises,
        ["gg-gate time"] = Course.Falls,
        ["ground-temperature-factor temperature"] = Course.Falls,
        ["grouping-factor circuits"] = Course.Falls,
        ["insulation-minimum voltage"] = Course.Rises,
        ["insulation-test-voltage voltage"] = Course.Rises,
        ["let-through-class-2 rating"] = Course.Rises,
        ["let-through-class-2 icn"] = Course.Rises,
        ["let-through-class-3 rating"] = Course.Rises,
        ["let-through-class-3 icn"] = Course.Rises,
        ["main-bonding-pme neutral-csa"] = Course.Rises,
        ["making-capacity-factor icu"] = Course.Rises,
        ["nh-selectivity-i2t rating"] = Course.Rises,
        ["nh-selectivity-test-current rating"] = Course.Rises,
        ["nominal-voltage-to-earth voltage"] = Course.Free, // nominal pairs; some voltages are to earth themselves
        ["pre-arcing-i2t-max rating"] = Course.Rises,
        ["pre-arcing-i2t-min rating"] = Course.Rises,
        ["preferred-breaking-capacity capacity"] = Course.Rises,
        ["preferred-csa csa"] = Course.Rises,
        ["preferred-rating rating"] = Course.Rises,
        ["preferred-residual-current residual-current"] = Course.Rises,
        ["rcd-break-time multiple"] = Course.Falls,
        ["rcd-break-time-old multiple"] = Course.Falls,
        ["rcd-non-actuating-time multiple"] = Course.Falls,
        ["rcd-tripping-current residual-current"] = Course.Falls,
        ["rdc-dd-break-time residual-current"] = Course.Falls,
        ["resistance-to-20-factor temperature"] = Course.Falls,
        ["service-breaking-capacity icn"] = Course.Rises,
        ["service-breaking-capacity-floor icn"] = Course.Rises,
        ["service-breaking-capacity-ratio icn"] = Course.Falls,
        ["service-breaking-capacity-share share"] = Course.Rises,
        ["soil-factor resistivity"] = Course.Falls,
        ["spd-earth-lead type"] = Course.Falls,
        ["test-power-factor fault-current"] = Course.Falls,
        ["test-temperature-factor temperature"] = Course.Rises,
        ["thermal-insulation-factor length"] = Course.Falls,
        ["third-harmonic-factor h3"] = Course.Free, // 0.86 on the line current, then on the neutral, then 1 on the neutral
        ["voltage-drop csa"] = Course.Falls,
    };

    public static IEnumerable<TheoryDataRow<string, string>> NumericKeys() =>
        from lookup in Shipped.Set(Shipped.UnitedKingdom).World.Lookups.Values
        where lookup.Unit is not null
        from key in lookup.Keys
        where key.Unit is not null
        orderby lookup.Name, key.Name
        select new TheoryDataRow<string, string>(lookup.Name, key.Name) { TestDisplayName = $"course · {lookup.Name} along {key.Name}" };

    [Theory]
    [MemberData(nameof(NumericKeys))]
    public void Figures_go_the_way_that_physics_demands(string name, string key)
    {
        Assert.True(Courses.TryGetValue($"{name} {key}", out var course), $"say how {name} goes along {key}");
        foreach (var line in Lines(Shipped.Lookup(name), key))
        {
            Assert.All(line.Zip(line.Skip(1)), pair =>
            {
                var (before, after) = (pair.First.Cell.Number, pair.Second.Cell);
                Assert.False(
                    IsAgainst(course, before, after.Number),
                    $"{string.Join(", ", pair.First.Keys)}: {before}, then {after.Number} in {after.Table.Path}:{after.Line}");
            });
        }
    }

    private static bool IsAgainst(Course course, double before, double after) => course switch
    {
        Course.Rises => after < before,
        Course.Falls => after > before,
        _ => false,
    };

    /// <summary>The figures along one key, a line for each choice of the others.</summary>
    private static IEnumerable<IReadOnlyList<(IReadOnlyList<object> Keys, TableCell Cell)>> Lines(Lookup lookup, string key)
    {
        var at = lookup.Keys.Select(each => each.Name).ToList().IndexOf(key);
        return lookup.Cells().Where(entry => !entry.Cell.IsEmpty)
            .GroupBy(entry => string.Join('|', entry.Keys.Where((_, i) => i != at)))
            .Select(line => line.OrderBy(entry => (double)entry.Keys[at]).ToArray());
    }
}
