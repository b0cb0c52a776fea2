using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Rules.Tests;

/// <summary>Reads one figure of a lookup, which must hold it.</summary>
internal static class LookupFigure
{
    /// <summary>The figure for the given keys, words or numbers, in coherent units.</summary>
    public static double Of(Lookup lookup, params object[] keys)
    {
        var value = lookup.Find([.. keys.Select(key => key is string word ? Value.Of(word) : Value.Of((double)key))], null);
        Assert.False(value.IsMissing, $"{lookup.Name} does not hold {string.Join(", ", keys)}");
        return value.Number;
    }
}
