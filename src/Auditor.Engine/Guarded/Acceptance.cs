namespace Auditor.Engine.Guarded;

/// <summary>What an audit is asked to do with tolerances.</summary>
/// <param name="Decision">How values are held against limits; null to go by the design.</param>
/// <param name="Samples">How many designs to draw at random from within the tolerances; 0 for none.</param>
/// <param name="Seed">Where the random numbers begin.</param>
public sealed record Acceptance(Decision? Decision = null, int Samples = 0, int Seed = 1);
