using Auditor.Testing;

namespace Auditor.Reports.Tests;

/// <summary>What the README of the templates says of the model is what the code says.</summary>
public class ModelReferenceTests
{
    private const string Start = "<!-- The reference below is written from the code; a test keeps it so. -->\n\n";

    [Fact]
    public void The_reference_of_the_model_is_up_to_date()
    {
        var path = Repository.PathOf("templates/README.md");
        var readme = File.ReadAllText(path);
        var at = readme.IndexOf(Start, StringComparison.Ordinal) + Start.Length;
        var fresh = readme[..at] + ModelReference.Write().TrimEnd('\n') + "\n";
        if (fresh != readme)
        {
            File.WriteAllText(Repository.PathOf("templates/README.received.md"), fresh);
        }

        Assert.True(fresh == readme, "templates/README.md is stale: read templates/README.received.md, and put it in its place");
    }

    [Fact]
    public void Every_member_that_a_template_reaches_is_documented()
    {
        var rows = ModelReference.Write().Split('\n').Where(line => line.StartsWith("| `", StringComparison.Ordinal)).ToArray();

        Assert.True(rows.Length > 100);
        Assert.DoesNotContain(rows, row => row.EndsWith("|  |", StringComparison.Ordinal));
    }
}
