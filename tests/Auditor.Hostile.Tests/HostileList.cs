using Auditor.Testing;

namespace Auditor.Hostile.Tests;

/// <summary>The list of hostile cases, as people read it.</summary>
internal static class HostileList
{
    private const string Path = "tests/Auditor.Hostile.Tests/README.md";

    /// <summary>The cases that are run from the list: name, and what each gets.</summary>
    public static IReadOnlyDictionary<string, string> Run { get; } = Rows("| case | what is done | what it gets |").ToDictionary(row => row[0], row => row[2]);

    /// <summary>The tests that hold the other cases, as <c>Class.Method</c>.</summary>
    public static IReadOnlyList<string> Tests { get; } = [.. Rows("| what is done | what it gets | test |").Select(row => row[2].Trim('`')).Distinct(StringComparer.Ordinal)];

    private static IEnumerable<string[]> Rows(string head) =>
        File.ReadLines(Repository.PathOf(Path)).SkipWhile(line => line != head).Skip(2).TakeWhile(line => line.StartsWith('|'))
            .Select(line => line.Trim('|').Split(" | ").Select(cell => cell.Trim()).ToArray());
}
