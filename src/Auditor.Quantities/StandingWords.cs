namespace Auditor.Quantities;

/// <summary>The words of the standings. A designed value has none.</summary>
internal static class StandingWords
{
    internal static string? Of(Standing standing) => standing switch
    {
        Standing.Assumed => "assumed",
        Standing.Declared => "declared",
        Standing.Measured => "measured",
        _ => null,
    };

    internal static bool TryRead(ReadOnlySpan<char> word, out Standing standing)
    {
        standing = word switch
        {
            "assumed" => Standing.Assumed,
            "declared" => Standing.Declared,
            "measured" => Standing.Measured,
            _ => Standing.Designed,
        };
        return standing != Standing.Designed;
    }
}
