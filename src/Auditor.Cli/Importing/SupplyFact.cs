using Auditor.Documents;

namespace Auditor.Cli.Importing;

/// <summary>A fact of the supply that a circuit list does not say and the caller has to.</summary>
/// <param name="Option">The option that says it.</param>
/// <param name="What">What it is, as part of a sentence.</param>
/// <param name="Entry">The entry of <c>supply</c> that says it; null where the caller does not.</param>
internal sealed record SupplyFact(string Option, string What, MappingEntry? Entry)
{
    /// <summary>Adds a problem where it is not said.</summary>
    public void Check(Problems problems)
    {
        if (Entry is null)
        {
            problems.Add(ImportMessages.NoOption(Option, What));
        }
    }
}
