using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.RuleSets;

/// <summary>A picture of the reports as its file plans it: which quantities it shows, not how it is drawn.</summary>
/// <param name="Id">Its name, unlike that of any other picture.</param>
/// <param name="Kind">What kind of picture it is.</param>
/// <param name="Title">What reports call it.</param>
/// <param name="About">What it shows and how to read it.</param>
/// <param name="Place">Its place among the pictures; lower comes first.</param>
/// <param name="Quantities">What it draws, in the order of the file.</param>
/// <param name="Settings">The mapping under the name of the kind.</param>
/// <param name="Node">Its file.</param>
public sealed record PicturePlan(
    string Id, string Kind, string Title, string About, int Place, IReadOnlyList<PlannedQuantity> Quantities, MappingNode Settings, MappingNode Node)
{
    private readonly ILookup<(SubjectShape, string), PlannedQuantity> _byRole = Quantities.ToLookup(quantity => (quantity.Shape, quantity.Role));

    /// <summary>What the plan gives a role of a kind of subject; empty where it gives none.</summary>
    public IEnumerable<PlannedQuantity> All(SubjectShape shape, string role) => _byRole[(shape, role)];

    /// <summary>The first of what the plan gives a role; null where it gives none.</summary>
    public PlannedQuantity? One(SubjectShape shape, string role) => _byRole[(shape, role)].FirstOrDefault();

    /// <summary>Number of a role for a subject, in coherent units; null where the plan gives none or the value is missing.</summary>
    public double? Number(DesignSubject subject, string role) =>
        One(subject.Shape, role)?.Of(subject) is { Kind: ValueKind.Quantity } value ? value.Number : null;

    /// <summary>Word of a role for a subject; null where the plan gives none or the value is missing.</summary>
    public string? Word(DesignSubject subject, string role) =>
        One(subject.Shape, role)?.Of(subject) is { Kind: ValueKind.Text } value ? value.Text : null;

    /// <summary>Words of a role for a subject; empty where the plan gives none or the value is missing.</summary>
    public IReadOnlyList<string> Words(DesignSubject subject, string role) =>
        One(subject.Shape, role)?.Of(subject) is { Kind: ValueKind.Words } value ? value.Words : [];

    /// <summary>Whether a flag of a role holds for a subject; false where it is not known.</summary>
    public bool Holds(DesignSubject subject, string role) => One(subject.Shape, role)?.Of(subject).IsTrue ?? false;
}
