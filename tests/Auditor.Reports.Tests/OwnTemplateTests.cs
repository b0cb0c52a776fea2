using Auditor.Documents;
using Auditor.Reports.Files;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Tests;

/// <summary>A firm's own templates and schedules.</summary>
public class OwnTemplateTests
{
    [Fact]
    public void A_template_of_a_firm_is_rendered_with_the_parts_beside_it()
    {
        var report = Sheds.Render("garden", ReportFormat.Markdown, Sheds.Template("templates/house/house.scriban-md"));

        Assert.StartsWith("# Three sheds in one garden\n", report, StringComparison.Ordinal);
        Assert.Contains(
            "- nonconforming: 8 `load-within-capacity` `run-sensible` `air-not-too-cold` `device-known` `record-departure-needed` `record-departure-permitted` `record-departure-in-date` `record-departure-matched`\n",
            report, StringComparison.Ordinal);
        Assert.Contains("- departed: 1 `bonding-enough`\n", report, StringComparison.Ordinal);
    }

    [Fact]
    public void A_folder_of_templates_may_have_its_own_schedule() =>
        Assert.Equal(["Name of the house"], Sheds.Schedule("templates/house/house.scriban-md").Columns.Select(column => column.Heading));

    [Fact]
    public void A_folder_without_a_schedule_has_the_shipped_one()
    {
        var problems = new Problems();

        var schedule = Schedule.For(Sheds.Template("faults/clock.scriban-md"), Sheds.Rules, problems);

        Assert.Contains("Device", schedule!.Columns.Select(column => column.Heading));
        Assert.All(problems.All, problem => Assert.Equal("templates/schedule.yaml", problem.Span!.Value.Source.Path));
    }

    [Fact]
    public void The_shipped_rules_know_every_column_of_the_shipped_schedule()
    {
        var problems = new Problems();

        var schedule = Schedule.For(TemplateFile.Shipped(ReportFormat.Markdown), ExampleAudit.Rules, problems);

        Assert.Empty(problems.All);
        Assert.Equal(
            ["Device", "Conductors", "Length", "Ib", "In", "Iz", "Zs", "Zs at most", "Voltage drop"], schedule!.Columns.Select(column => column.Heading));
    }

    [Theory]
    [InlineData("unknown-symbol")]
    [InlineData("wrong-keys")]
    [InlineData("not-yaml")]
    public void What_is_wrong_with_a_schedule_is_told_with_its_place(string name)
    {
        var problems = new Problems();

        var schedule = Schedule.For(Sheds.Template($"schedules/{name}/any.scriban-md"), Sheds.Rules, problems);

        Assert.Equal(problems.HasErrors, schedule is null);
        Testing.Golden.Match(ProblemText.Render(problems.All), $"tests/Auditor.Reports.Tests/data/schedules/{name}");
    }

    [Fact]
    public void A_column_that_the_rule_set_cannot_fill_is_left_out()
    {
        var schedule = Schedule.For(Sheds.Template("schedules/unknown-symbol/any.scriban-md"), Sheds.Rules, new Problems());

        Assert.Equal(["Ib"], schedule!.Columns.Select(column => column.Heading));
    }
}
