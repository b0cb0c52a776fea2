using Auditor.Quantities;

namespace Auditor.Formulas.Tables;

/// <summary>One key of a lookup.</summary>
/// <param name="Name">Name in the table files.</param>
/// <param name="Unit">Unit in which tables state it; null for a word.</param>
/// <param name="Between">What holds between two tabulated values.</param>
public sealed record LookupKey(string Name, Unit? Unit, Between Between);
