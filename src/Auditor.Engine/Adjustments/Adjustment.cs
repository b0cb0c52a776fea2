using Auditor.Documents;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.Adjustments;

/// <summary>Something of a design that can be changed, as rule data declare it.</summary>
public sealed record Adjustment
{
    /// <summary>Its name; also that of its file.</summary>
    public required string Id { get; init; }

    /// <summary>What is changed, as people call it.</summary>
    public required string Label { get; init; }

    /// <summary>Kind of subject.</summary>
    public required SubjectShape Shape { get; init; }

    /// <summary>The input that is changed.</summary>
    public required InputSlot Slot { get; init; }

    /// <summary>The values that it may take.</summary>
    public required Ladder Ladder { get; init; }

    /// <summary>Inputs that follow from the changed one, with their formulas; one whose formula gives nothing stays as it is.</summary>
    public required IReadOnlyList<(InputSlot Slot, Formula Formula)> Also { get; init; }

    /// <summary>Tells whether there is such a thing at all with the value taken; null where there always is.</summary>
    public required Formula? Exists { get; init; }

    /// <summary>Whether all legs of a run change together, where they are alike.</summary>
    public required bool AllLegs { get; init; }

    /// <summary>Whether it is read on the finished work, so that the design need not state it.</summary>
    public required bool IsReading { get; init; }

    /// <summary>Whether its limits belong on a sheet to take to the site.</summary>
    public required bool IsForSite { get; init; }

    /// <summary>What a reading should show if the work is as designed; null where nothing is said.</summary>
    public required Formula? Expect { get; init; }

    /// <summary>Whether it is worth telling how far it may go.</summary>
    public required bool HasLimits { get; init; }

    /// <summary>How it may serve as a remedy; null where it may not.</summary>
    public required RemedyTerms? Remedy { get; init; }

    /// <summary>Its file.</summary>
    public required MappingNode Node { get; init; }

    /// <summary>The input as a circuit writes it: those of a leg stand under <c>cable</c>.</summary>
    public string Path => Shape.Name == "leg" ? "cable." + Slot.Path : Slot.Path;
}
