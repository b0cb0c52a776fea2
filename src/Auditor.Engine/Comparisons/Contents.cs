namespace Auditor.Engine.Comparisons;

/// <summary>
/// What the subjects of a revision are made of, as one text each: everything stated of them and of their parts, but for the words that
/// say where they stand (ids, the board fed) and what only the defaults of their board say.
/// </summary>
internal sealed class Contents(Revision revision)
{
    private static readonly string[] PlaceWords = ["id", "to", "feeds", "formerly"];

    private readonly ILookup<string?, RevisionSubject> _parts = revision.Subjects.ToLookup(subject => subject.Parent);

    /// <summary>The content of a subject; null where nothing is stated of it, or nobody knows what is.</summary>
    public string? Of(RevisionSubject subject)
    {
        var own = Own(subject);
        if (own is null)
        {
            return null;
        }

        var parts = _parts[subject.Key].Where(part => part.Kind == PartOf(subject.Kind)).Select(part => $"{Label(part)}({Of(part) ?? ""})");
        var ordered = subject.Kind == "board" ? parts.Order(StringComparer.Ordinal) : parts;
        var whole = string.Join('\n', ordered.Prepend(own));
        return whole.Length == 0 ? null : whole;
    }

    private static string? Own(RevisionSubject subject) => subject.Stated is null
        ? null
        : string.Join('\n', subject.Stated
            .Where(input => input.From != "defaults" && !PlaceWords.Contains(input.Path))
            .Select(input => $"{input.Path}: {input.Normal()}")
            .Order(StringComparer.Ordinal));

    private static string? PartOf(string kind) => kind switch
    {
        "board" => "circuit",
        "circuit" => "leg",
        _ => null,
    };

    /// <summary>Circuits are told apart by their ids, legs by their order alone.</summary>
    private static string Label(RevisionSubject part) => part.Kind == "circuit" ? part.Id : "";
}
