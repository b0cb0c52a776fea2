namespace Auditor.Rules.Tests.Network;

/// <summary>A board of a random design and what feeds it.</summary>
/// <param name="Feeder">Number of the board that feeds it; null for one fed from the origin.</param>
/// <param name="Lines">The line conductors that it has, 0 to 2.</param>
/// <param name="Feed">Cable of the circuit that feeds it; of no account at the origin.</param>
/// <param name="Diversity">Share of its demand that counts at the board that feeds it.</param>
/// <param name="Circuits">Its final circuits.</param>
internal sealed record Board(int? Feeder, IReadOnlyList<int> Lines, Cable Feed, double Diversity, IReadOnlyList<FinalCircuit> Circuits);
