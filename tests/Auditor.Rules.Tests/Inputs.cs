namespace Auditor.Rules.Tests;

/// <summary>What the design file can say, by the paths that it writes.</summary>
internal static class Inputs
{
    private const string Cable = "cable.";
    private const string Boards = "boards.";

    private static readonly string[] Lists = ["boards", "circuits", "earthing.bonding"];

    /// <summary>
    /// Whether there is such an input of any subject, of the cable of a circuit or of the boards, or such a list of subjects.
    /// </summary>
    public static bool Has(string path) =>
        Lists.Contains(path) || HasInput(path)
        || (path.StartsWith(Cable, StringComparison.Ordinal) && HasInput(path[Cable.Length..]))
        || (path.StartsWith(Boards, StringComparison.Ordinal) && HasInput(path[Boards.Length..]));

    private static bool HasInput(string path) =>
        ShippedRule.Set.Schema.Shapes.All.Any(shape => shape.Inputs.Any(input => input.Path == path));
}
