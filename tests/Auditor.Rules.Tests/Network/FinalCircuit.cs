namespace Auditor.Rules.Tests.Network;

/// <summary>A final circuit of a random design.</summary>
/// <param name="Lines">The line conductors that it takes, 0 to 2.</param>
/// <param name="Cable">Its cable.</param>
/// <param name="IsRing">Whether the cable returns to the board.</param>
/// <param name="Current">Design current, A.</param>
/// <param name="PowerFactor">Cosine of the angle by which the current lags.</param>
/// <param name="Diversity">Share of the current that counts towards demand.</param>
internal sealed record FinalCircuit(IReadOnlyList<int> Lines, Cable Cable, bool IsRing, double Current, double PowerFactor, double Diversity);
