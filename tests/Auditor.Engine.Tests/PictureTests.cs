using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests;

/// <summary>What the plan of a picture tells of each subject.</summary>
public class PictureTests
{
    [Fact]
    public void A_plan_gives_the_values_of_its_roles_and_names_for_what_it_draws()
    {
        var (plan, design) = Made();
        var (sockets, lighting) = (design.Find("DB1/1")!, design.Find("DB1/2")!);

        Assert.Equal((true, false), (plan.Holds(sockets, "rcd"), plan.Holds(lighting, "rcd")));
        Assert.False(plan.Holds(sockets, "switch"));
        Assert.Equal(("EN 60898", null), (plan.Word(sockets, "device"), plan.Word(design.Find("DB2/2")!, "device")));
        Assert.Equal(["socket-outlets"], plan.Words(sockets, "load"));
        Assert.Equal(10, plan.Number(lighting, "text"));
        Assert.Null(plan.Number(lighting, "none"));
    }

    [Fact]
    public void What_a_plan_draws_goes_by_its_label_or_the_name_of_its_sheet_or_input_or_by_its_formula()
    {
        var (plan, design) = Made();

        Assert.Equal(
            ["device rating", "made", "2 * device.rating", "twice"], plan.All(design.Find("DB1/1")!.Shape, "text").Select(quantity => quantity.Label));
        Assert.Equal([false, false, false, true], plan.All(design.Find("DB1/1")!.Shape, "text").Select(quantity => quantity.IsLabelled));
    }

    private static (PicturePlan Plan, Design Design) Made()
    {
        using var rules = new TemporaryRules()
            .With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheet.yaml], pictures: [picture.yaml] }\n")
            .WithSheet("sheet.yaml", "circuit In A = device.rating")
            .With("picture.yaml", """
                picture: made
                title: Made
                about: Made for a test.
                place: 1
                single-line:
                  installation: { text: [supply.voltage] }
                  board: { text: [id] }
                  leg: { text: [csa], note: [length] }
                  circuit:
                    device: device.standard
                    rcd: given(rcd)
                    load: serves
                    text:
                      - device.rating
                      - In
                      - 2 * device.rating
                      - { formula: 2 * In, label: twice }
                  device-symbols: { EN 60898: circuit-breaker, other: fuse }
                  load-symbols: { socket-outlets: socket-outlet, other: load }

                """);
        var set = rules.LoadSound("set.yaml");
        return (Assert.Single(set.Pictures), Small.Build(Small.DesignText("house"), set));
    }
}
