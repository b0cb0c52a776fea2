namespace Auditor.Rules.Tests.Network;

/// <summary>What a maker states of a cable, in mΩ/m, resistances at 20 °C.</summary>
internal sealed record PerMetre(double LineResistance, double ProtectiveResistance, double Reactance);
