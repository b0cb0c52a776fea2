namespace Auditor.Documents;

/// <summary>Writes problems for people: place, line of text, mark under it, help. Plain text without colour.</summary>
public static class ProblemText
{
    /// <summary>Writes problems in the order given, each followed by an empty line; lines end with LF.</summary>
    public static string Render(IEnumerable<Problem> problems) => string.Join('\n', problems.Select(Render));

    private static string Render(Problem problem) => problem.Message;
}
