using Auditor.Documents;

namespace Auditor.Engine.HouseSets;

/// <summary>Something that a house set changes in the sets that it is built on; what it only adds is no change.</summary>
/// <param name="What">What is changed.</param>
/// <param name="Name">Parameter, rule, table or curve id, or kind of subject and symbol.</param>
/// <param name="Before">What it was: a value, or the file that it came from.</param>
/// <param name="After">What it is now.</param>
/// <param name="Loosens">Whether less may be asked than before. True also where nobody can tell: a whole thing replaced, or no stricter direction declared.</param>
/// <param name="How">What the change is, in a few words.</param>
/// <param name="Set">Name of the house set.</param>
/// <param name="Span">Where the set says so.</param>
public sealed record HouseChange(
    HouseChangeKind What, string Name, string Before, string After, bool Loosens, string How, string Set, SourceSpan Span);
