using Auditor.Documents;
using Auditor.Quantities;

namespace Auditor.Formulas.Tables;

/// <summary>Makes lookups from files that their schema has accepted.</summary>
public static class LookupReader
{
    private static readonly Dictionary<string, Between> BetweenWords = new()
    {
        ["none"] = Between.None,
        ["linear"] = Between.Linear,
        ["log-log"] = Between.LogLog,
        ["next-row"] = Between.NextRow,
    };

    /// <summary>Reads one lookup.</summary>
    /// <param name="file">Root of the file.</param>
    /// <param name="lookups">Lookups so far; receives the new one.</param>
    /// <param name="problems">Receives what is wrong.</param>
    public static void Read(MappingNode file, IDictionary<string, Lookup> lookups, Problems problems)
    {
        var name = file.Text("lookup")!;
        var between = file.Mapping("between");
        var keys = new List<LookupKey>();
        foreach (var key in file.Mappings("keys"))
        {
            var keyName = key.Text("name")!;
            var rule = between?.Text(keyName) is { } word ? BetweenWords[word] : Between.None;
            keys.Add(new LookupKey(keyName, UnitOf(key.Scalar("unit"), problems), rule));
        }

        foreach (var entry in between?.Entries ?? [])
        {
            if (!keys.Exists(key => key.Name == entry.Key.Value))
            {
                problems.Add(TableMessages.UnknownKey(entry.Key.Span, name, entry.Key.Value, keys.Select(key => key.Name)));
            }
        }

        if (keys.Count(key => key.Between != Between.None) > 1)
        {
            problems.Add(TableMessages.SecondBetween(between!.Span));
        }

        var value = file.Mapping("value")!.Scalar("unit");
        foreach (var key in keys.Where(key => key.Between != Between.None && (key.Unit is null || (value is null && key.Between != Between.NextRow))))
        {
            problems.Add(TableMessages.BetweenWords(between!.Find(key.Name)!.Span, key.Unit is null ? $"two words of `{key.Name}`" : "two words of the table"));
        }

        var lookup = new Lookup(name, file.Text("about")!, keys, UnitOf(value, problems), file.Text("when-missing") ?? "");
        if (!lookups.TryAdd(name, lookup))
        {
            problems.Add(TableMessages.SecondLookup(file.Find("lookup")!.Span, name));
        }
    }

    private static Unit? UnitOf(ScalarNode? scalar, Problems problems)
    {
        if (scalar is null)
        {
            return null;
        }

        var unit = UnitCatalog.Find(scalar.Text);
        if (unit is null)
        {
            problems.Add(TableMessages.UnknownUnit(scalar.Span, scalar.Text));
        }

        return unit;
    }
}
