using Auditor.Engine.Installation;
using Auditor.Formulas.Values;

namespace Auditor.Reports.Reading;

/// <summary>How an audit was made, as far as the design settles it.</summary>
/// <param name="Stage">Stage of the job; null where the design states none.</param>
/// <param name="AsksGuarded">Whether the design asks for guarded acceptance.</param>
internal sealed record AuditBasis(string? Stage, bool AsksGuarded)
{
    /// <summary>The stage that a design without one is taken to be at.</summary>
    public const string UsualStage = "design";

    /// <summary>The decision rule that is applied: values are judged as stated.</summary>
    public const string Decision = "simple";

    public static AuditBasis Of(Design design) => new(Word(design, "basis.stage"), Word(design, "basis.decision") == "guarded");

    private static string? Word(Design design, string name) =>
        design.Installation.Shape.Input(name) is { } slot && design.Installation.Input(slot.Index) is { Kind: ValueKind.Text } value ? value.Text : null;
}
