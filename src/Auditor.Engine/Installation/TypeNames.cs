using Auditor.Documents;

namespace Auditor.Engine.Installation;

/// <summary>Checks that every type that a design names is among its <c>types</c>.</summary>
internal static class TypeNames
{
    public static void Check(MappingNode root, IReadOnlyList<DesignSubject> subjects, Problems problems)
    {
        var types = root.Mapping("types");
        foreach (var subject in subjects)
        {
            foreach (var (holder, list) in subject.NamedHolders())
            {
                var entries = types?.Mapping(list);
                if (holder.Scalar("type") is { } name && entries?.Find(name.Text) is not MappingNode)
                {
                    var known = entries?.Entries.Select(entry => entry.Key.Value) ?? [];
                    problems.Add(DesignMessages.UnknownType(name.Span, name.Text, list, NearestWord.Find(name.Text, known)));
                }
            }
        }
    }
}
