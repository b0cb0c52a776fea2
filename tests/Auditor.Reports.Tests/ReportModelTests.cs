using Auditor.Reports.Model;

namespace Auditor.Reports.Tests;

public class ReportModelTests
{
    private readonly ReportModel _garden = Sheds.Model("garden");

    [Fact]
    public void Every_verdict_is_counted_by_provision() =>
        Assert.Equal(
            [
                new VerdictCount("nonconforming", 6, 2, 8, 0),
                new VerdictCount("undetermined", 1, 1, 2, 0),
                new VerdictCount("departed", 1, 0, 1, 0),
                new VerdictCount("conforms", 19, 3, 22, 1),
            ],
            _garden.Counts);

    [Fact]
    public void Broken_requirements_need_action_in_the_order_of_the_design() =>
        Assert.Equal(
            ["load-within-capacity:A/2", "air-not-too-cold:A/2/leg 2", "device-known:A/3", "record-departure-permitted:departure/device-known:A/3",
                "record-departure-in-date:departure/load-within-capacity:A/2", "record-departure-matched:departure/no-such-rule:A/9"],
            _garden.Action.Select(finding => finding.Key));

    [Fact]
    public void Groups_go_from_the_gravest_verdict_to_the_best() =>
        Assert.Equal(["nonconforming", "undetermined", "departed", "conforms"], _garden.Groups.Select(group => group.Verdict));

    [Fact]
    public void A_finding_shows_value_limit_and_margin_with_their_units()
    {
        var cold = _garden.Action[1];

        Assert.Equal(("-5 °C", "at least 0 °C", "-5 K"), (cold.Value, cold.Limit, cold.Margin));
        Assert.Equal("A/2/leg 2 Pump", cold.SubjectLabel);
        Assert.Equal("garden/circuits.yaml:13:58", cold.Location);
        Assert.Equal(["a figure from memory, param.cold_air: 0 °C"], cold.RestsOn);
    }

    [Fact]
    public void A_margin_is_shown_as_a_share_and_in_the_unit()
    {
        var load = _garden.Action[0];

        Assert.Equal(("-4.2 %", "-1 A", "-4.2 % (-1 A)"), (load.RelativeMargin, load.AbsoluteMargin, load.Margin));
    }

    [Fact]
    public void A_formula_is_shown_with_its_numbers_put_in()
    {
        var lines = _garden.Action[0].Formulas;

        Assert.Equal(
            new FormulaLine(
                "value", "Ib = load.current * (load.diversity ?? 1) = (25 A) * ((not known) ?? 1) = 25 A", "Ib = load.current * (load.diversity ?? 1)",
                "(25 A) * ((not known) ?? 1)"),
            lines[0]);
        Assert.Equal(new FormulaLine("limit", "Iz = min_of(legs, It) = 24 A", "Iz = min_of(legs, It)", ""), lines[1]);
    }

    [Fact]
    public void A_missing_thing_is_named_once_with_all_that_wait_for_it()
    {
        var thing = _garden.Missing.Single(missing => missing.Name == "length");

        Assert.Equal("`length` is not given", thing.Why);
        Assert.Equal(["A/4/leg 1"], thing.Subjects);
        Assert.Equal(["run-sensible:A/4"], thing.Findings);
    }

    [Fact]
    public void A_table_without_a_fitting_row_is_missing_for_the_subject_that_asks() =>
        Assert.Equal(["A/4"], _garden.Missing.Single(missing => missing.Name == "shed-capacity").Subjects);

    [Fact]
    public void A_circuit_is_governed_by_the_least_margin_of_itself_and_its_legs()
    {
        var pump = _garden.Schedule.Rows.Single(row => row.Key == "A/2");

        Assert.Equal(("nonconforming", "-10.0 %", "run-sensible"), (pump.Verdict, pump.Margin, pump.MarginRule));
        Assert.Equal(["EN 60898 C 20 A", "2.5 mm² / 4 mm²", "25 A", "24 A"], pump.Cells);
    }

    [Fact]
    public void A_quantity_that_cannot_be_computed_is_said_to_be_unknown() =>
        Assert.Equal(["EN 61009 B 16 A", "6 mm²", "10 A", "not known"], _garden.Schedule.Rows.Single(row => row.Key == "A/4").Cells);

    [Fact]
    public void Departures_say_what_became_of_them() =>
        Assert.Equal(
            [
                "in force",
                "not needed: nothing nonconforming to accept",
                "forbidden: the rule allows no departure",
                "expired: its last day is past",
                "matches no finding of this audit",
            ],
            _garden.Departures.Select(departure => departure.State));

    [Fact]
    public void An_accepted_finding_names_its_departure()
    {
        var finding = Assert.Single(_garden.Groups.Single(group => group.Verdict == "departed").Findings);

        Assert.Same(_garden.Departures[0], finding.Departure);
    }

    [Fact]
    public void An_assumption_lists_the_findings_that_hang_on_it()
    {
        var assumption = Assert.Single(_garden.Assumptions);

        Assert.Equal(
            ("A/1/leg 1", "length", "12 m ± 2 m, assumed", "garden/circuits.yaml:5:34"),
            (assumption.Subject, assumption.Input, assumption.Text, assumption.Location));
        Assert.Equal(["run-sensible:A/1"], assumption.Findings);
    }

    [Fact]
    public void A_finding_on_an_assumption_says_so() =>
        Assert.Equal("conforms, on assumption", _garden.Groups[3].Findings.Single(finding => finding.Key == "run-sensible:A/1").Verdict);

    [Fact]
    public void Figures_from_memory_list_the_findings_that_rest_on_them()
    {
        Assert.Equal(["Shed table 1", "param.cold_air"], _garden.MemoryFigures.Select(figure => figure.Name));
        Assert.Equal(["load-within-capacity:A/2", "load-within-capacity:A/3"], _garden.MemoryFigures[0].Findings);
    }

    [Fact]
    public void Rules_that_applied_nowhere_are_listed() =>
        Assert.Equal(["air-not-too-cold", "bonding-enough"], Sheds.Model("hostile").NotApplied.Select(rule => rule.Id));

    [Fact]
    public void Requirements_that_no_rule_decides_are_listed_by_part_with_judgement_apart()
    {
        Assert.Equal(["shed", "tools"], _garden.NotCovered.Select(part => part.Part));
        Assert.Equal(["shed-roof"], _garden.NotCovered[0].Decidable.Select(row => row.Id));
        Assert.Equal(["shed-neat"], _garden.NotCovered[0].Judgement.Select(row => row.Id));
    }

    [Fact]
    public void A_design_without_a_stage_says_so() => Assert.Equal("not stated", Sheds.Model("hostile").Basis.Stage);
}
