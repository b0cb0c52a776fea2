using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Formulas.Values;

namespace Auditor.Reports.Reading;

/// <summary>How audits are made.</summary>
internal static class AuditBasis
{
    /// <summary>The stage that a design without one is taken to be at.</summary>
    public const string UsualStage = "design";

    /// <summary>The word for a decision rule in files.</summary>
    public static string Word(Decision decision) => decision == Decision.Guarded ? "guarded" : "simple";

    /// <summary>A decision rule in words.</summary>
    public static string Sentence(Decision decision) => decision == Decision.Guarded
        ? "guarded acceptance: values must keep their limits wherever within the tolerances the true inputs lie"
        : "simple acceptance: values as stated";

    /// <summary>Stage of the job; null where the design states none.</summary>
    public static string? StageOf(Design design) =>
        design.Installation.Shape.Input("basis.stage") is { } slot && design.Installation.Input(slot.Index) is { Kind: ValueKind.Text } value
            ? value.Text
            : null;
}
