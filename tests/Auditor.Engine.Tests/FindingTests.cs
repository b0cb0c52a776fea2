using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

public class FindingTests
{
    private static readonly AuditResult House = Small.Audit(Small.DesignText("house"));

    [Fact]
    public void Findings_come_by_subject_in_the_order_of_the_design_and_then_by_rule() => Assert.Equal(
        [
            "supply-voltage:- conforms", "bonding-size:bonding/water conforms", "bonding-size:bonding/gas nonconforming", "board-loop:DB1 conforms, on assumption",
            "socket-rcd:DB1/1 conforms", "zs-cold:DB1/1 conforms, on assumption", "zs-limit:DB1/1 conforms, on assumption", "leg-length:DB1/1/leg 1 conforms",
            "leg-length:DB1/1/leg 2 conforms", "zs-cold:DB1/2 conforms, on assumption", "zs-limit:DB1/2 conforms, on assumption",
            "leg-length:DB1/2/leg 1 conforms, on assumption", "zs-cold:DB1/shed conforms, on assumption",
            "zs-limit:DB1/shed conforms, on assumption", "leg-length:DB1/shed/leg 1 conforms",
            "board-loop:DB2 conforms, on assumption", "socket-rcd:DB2/1 nonconforming", "zs-cold:DB2/1 undetermined", "zs-limit:DB2/1 undetermined",
            "leg-length:DB2/1/leg 1 nonconforming", "zs-cold:DB2/2 undetermined",
        ],
        House.Findings.Select(finding => $"{finding.Key} {finding.VerdictText}"));

    [Fact]
    public void A_rule_that_applied_to_nothing_is_told()
    {
        var result = Small.Audit(
            """
            design-format: 1
            supply: { earthing: TN-S, phases: 1, voltage: 230 V }
            boards: [{ id: A, circuits: [{ id: 1, cable: { length: 5 m } }] }]
            """);

        Assert.Equal(["bonding-size", "socket-rcd"], result.NotApplied.Select(rule => rule.Id));
    }

    [Theory]
    [InlineData("zs-limit:DB1/1", "Zs 0.6192 Ω against 1.366 Ω: EN 60898 32 A needs 160 A to open within 0.4 s.")]
    [InlineData("zs-cold:DB1/2", "Zs 1.256 Ω, at most 3.496 Ω cold.")]
    [InlineData("socket-rcd:DB1/1", "Residual current device: yes, 30 mA.")]
    [InlineData("socket-rcd:DB2/1", "Residual current device: no, not known.")]
    [InlineData("supply-voltage:-", "U0 230 V, from 216.2 V to 253 V.")]
    [InlineData("bonding-size:bonding/gas", "4 mm² to gas.")]
    [InlineData("leg-length:DB2/1/leg 1", "210 m long.")]
    [InlineData("zs-limit:DB2/1", "Zs not known against 2.731 Ω: EN 60898 16 A needs 80 A to open within 0.4 s.")]
    public void A_finding_speaks_in_the_sentence_of_its_rule(string key, string message) => Assert.Equal(message, House.Find(key)!.Message);

    [Theory]
    [InlineData("zs-limit:DB1/1", "1.5 mm²", 15)]
    [InlineData("zs-limit:DB1/2", "1.0 mm²", 23)]
    [InlineData("zs-cold:DB1/2", "10 A", 36)]
    [InlineData("socket-rcd:DB2/1", "1", 45)]
    [InlineData("supply-voltage:-", "d", 1)]
    [InlineData("board-loop:DB2", "DB2", 43)]
    [InlineData("bonding-size:bonding/gas", "gas", 11)]
    [InlineData("leg-length:DB1/1/leg 2", "{", 33)]
    public void A_finding_points_at_the_first_input_that_can_put_it_right_else_at_its_subject(string key, string text, int line)
    {
        var span = House.Find(key)!.Location;

        Assert.Equal((text, line), (span.Text, span.StartLocation.Line));
    }

    [Theory]
    [InlineData("zs-in-time:DB1/1", "zs-limit:DB1/1")]
    [InlineData("zs-limit:DB1/1", "zs-limit:DB1/1")]
    [InlineData("zs-limit:DB1/9", null)]
    [InlineData("no-such-rule:DB1/1", null)]
    [InlineData("DB1/1", null)]
    [InlineData("", null)]
    [InlineData(":", null)]
    public void A_finding_is_found_by_its_key_with_a_present_or_former_rule(string key, string? found) => Assert.Equal(found, House.Find(key)?.Key);

    [Fact]
    public void Layout_comments_and_the_order_of_keys_change_no_finding()
    {
        var other = Small.Audit("""
            # The same house in another hand.
            boards:
              - circuits:

                  - { serves: [socket-outlets], rcd: { residual-current: 0.03 A, type: A }, id: "1", name: sockets, arrangement: ring, device: { type: b32 },
                      legs: [ { length: 40 m, type: two-and-a-half },
                              { cpc: 2.5 mm², length: 20 m, type: two-and-a-half } ] }
                  - id: 2
                    cable: { length: "30 m, assumed", csa: 1.5 mm² }   # lighting
                    device: { rating: 10 A, type: b6 }
                    name: lighting
                    serves:
                      - lighting
                  - { id: shed, device: { type: b32 }, cable: { length: 25 m, cpc: 4 mm², csa: 10 mm² }, feeds: DB2 }
                id: DB1
                defaults: { cpc: 1 mm², method: "100" }
                fed-from: origin
              - circuits:
                  - { id: 1, name: shed sockets, serves: [socket-outlets, lighting], device: { rating: 16 A, type: b32 },
                      cable: { length: 210 m, cpc: 6 mm², type: two-and-a-half } }
                  - { shock-protection: SELV, id: 2 }
                id: DB2
            types:
              devices: { b6: { rating: 6 A, standard: EN 60898, curve: B }, b32: { curve: B, rating: 32 A, standard: EN 60898 } }
              cables:
                two-and-a-half: { cpc: 1.5 mm², method: C, csa: 2.5 mm² }
            earthing: { bonding: [ { csa: 10 mm², to: water }, { csa: 4 mm², to: gas } ] }
            supply: { voltage: 230 V, loop-impedance: "350 mohm, assumed", phases: 1, earthing: TN-C-S }
            design-format: 1
            """);

        Assert.Equal(House.Findings.Select(Told), other.Findings.Select(Told));
    }

    [Fact]
    public void Verdicts_are_counted()
    {
        Assert.Equal(15, House.Count(Verdict.Conforms));
        Assert.Equal(3, House.Count(Verdict.Nonconforming));
        Assert.Equal(3, House.Count(Verdict.Undetermined));
        Assert.Equal(0, House.Count(Verdict.Departed));
    }

    [Fact]
    public void A_day_is_named_only_where_it_makes_a_difference() => Assert.Null(House.AsOf);

    private static string Told(Finding finding) =>
        string.Join(" | ", finding.Key, finding.VerdictText, finding.ValueShown, finding.LimitShown, finding.MarginShown, finding.Message);
}
