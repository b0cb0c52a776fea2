namespace Auditor.Reports.Templates;

/// <summary>How much a template may ask for, so that no template can hold up the program or fill the memory.</summary>
/// <param name="LoopSteps">Steps of a loop, the loops inside it included.</param>
/// <param name="Evaluations">Terms and statements evaluated for one report.</param>
/// <param name="Characters">Characters of the report.</param>
/// <param name="IncludeDepth">Includes within one another.</param>
/// <param name="Nesting">Statements and brackets within one another.</param>
/// <param name="Bytes">Bytes of a template file.</param>
/// <param name="Time">Time for one report.</param>
public sealed record TemplateLimits(int LoopSteps, long Evaluations, int Characters, int IncludeDepth, int Nesting, long Bytes, TimeSpan Time)
{
    /// <summary>Five million steps, a hundred million evaluations, 64 Mi characters, 8 includes, 64 levels, 256 KiB, five minutes.</summary>
    public static TemplateLimits Default { get; } = new(5_000_000, 100_000_000, 64 * 1024 * 1024, 8, 64, 256 * 1024, TimeSpan.FromMinutes(5));
}
