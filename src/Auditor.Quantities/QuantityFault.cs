namespace Auditor.Quantities;

/// <summary>Why a text is not a quantity.</summary>
/// <param name="Start">Where the faulty part begins: an index into the text, at most its length.</param>
/// <param name="Length">How long it is; zero where something is missing.</param>
/// <param name="Message">What is wrong, without a full stop.</param>
/// <param name="Help">What to write instead.</param>
public sealed record QuantityFault(int Start, int Length, string Message, string Help);
