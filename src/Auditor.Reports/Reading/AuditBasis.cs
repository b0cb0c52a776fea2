using Auditor.Engine.Installation;
using Auditor.Formulas.Values;

namespace Auditor.Reports.Reading;

/// <summary>How audits are made.</summary>
internal static class AuditBasis
{
    /// <summary>The stage that a design without one is taken to be at.</summary>
    public const string UsualStage = "design";

    /// <summary>The decision rule: values are judged as stated.</summary>
    public const string Decision = "simple";

    /// <summary>Stage of the job; null where the design states none.</summary>
    public static string? StageOf(Design design) =>
        design.Installation.Shape.Input("basis.stage") is { } slot && design.Installation.Input(slot.Index) is { Kind: ValueKind.Text } value
            ? value.Text
            : null;
}
