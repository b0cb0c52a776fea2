using Auditor.Engine.Installation;

namespace Auditor.Engine.Remedies;

/// <summary>Reads a design again with some of its files changed, in memory only.</summary>
/// <param name="texts">The changed texts, by display path.</param>
/// <returns>The design; null when it cannot be read.</returns>
public delegate Design? Reread(IReadOnlyDictionary<string, string> texts);
