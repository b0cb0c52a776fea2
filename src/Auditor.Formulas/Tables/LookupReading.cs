using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Tables;

/// <summary>One walk down a lookup's key tree.</summary>
internal readonly struct LookupReading(Lookup lookup, ICollection<TableCell>? cells)
{
    public Value Read(LookupLevel level, ReadOnlySpan<Value> arguments, int depth)
    {
        if (depth == arguments.Length)
        {
            return AtCell(level, arguments);
        }

        var key = lookup.Keys[depth];
        var argument = arguments[depth];
        if (argument.Kind == ValueKind.Text)
        {
            var found = level.At(KeyValue.Of(argument.Text));
            return found is null ? NoRow(level, arguments, depth) : Read(found, arguments, depth + 1);
        }

        var exact = level.At(argument.Number);
        if (exact is not null)
        {
            return Read(exact, arguments, depth + 1);
        }

        var above = level.NextUp(argument.Number);
        if (key.Between == Between.NextRow && above is not null)
        {
            return Read(level.At(above.Value)!, arguments, depth + 1);
        }

        var below = level.NextDown(argument.Number);
        if (key.Between is Between.Linear or Between.LogLog && above is not null && below is not null)
        {
            return Interpolate(level, arguments, depth, below.Value, above.Value);
        }

        return NoRow(level, arguments, depth);
    }

    private Value Interpolate(LookupLevel level, ReadOnlySpan<Value> arguments, int depth, KeyValue below, KeyValue above)
    {
        var low = Read(level.At(below)!, arguments, depth + 1);
        var high = Read(level.At(above)!, arguments, depth + 1);
        if (low.IsMissing || high.IsMissing)
        {
            return Value.MissingFrom(low, high);
        }

        var x = arguments[depth].Number;
        var marks = low.Marks | high.Marks;
        if (lookup.Keys[depth].Between == Between.Linear)
        {
            var share = (x - below.Number) / (above.Number - below.Number);
            return Value.Of(low.Number + (share * (high.Number - low.Number)), marks);
        }

        var logShare = Math.Log(x / below.Number) / Math.Log(above.Number / below.Number);
        return Value.Of(low.Number * Math.Pow(high.Number / low.Number, logShare), marks);
    }

    private Value AtCell(LookupLevel level, ReadOnlySpan<Value> arguments)
    {
        if (level.Cell is not { } cell)
        {
            return Missing($"{lookup.Name} holds nothing for {Describe(arguments, arguments.Length)}");
        }

        cells?.Add(cell);
        var marks = cell.Trust.Mark();
        if (cell.IsEmpty)
        {
            return Missing($"{cell.Table.Title} gives no figure for {Describe(arguments, arguments.Length)}");
        }

        return cell.Word is null ? Value.Of(cell.Number, marks) : Value.Of(cell.Word, marks);
    }

    private Value NoRow(LookupLevel level, ReadOnlySpan<Value> arguments, int depth)
    {
        var key = lookup.Keys[depth];
        var asked = Show(key, arguments[depth]);
        var before = depth == 0 ? "" : " for " + Describe(arguments, depth);
        return Missing($"{lookup.Name} holds no {key.Name} {asked}{before}{Nearest(level, key, arguments[depth])}");
    }

    private static string Nearest(LookupLevel level, LookupKey key, in Value asked)
    {
        if (asked.Kind == ValueKind.Text)
        {
            var words = string.Join(", ", level.Words());
            return words.Length == 0 ? "" : $" (it holds {words})";
        }

        var near = new[] { level.NextDown(asked.Number), level.NextUp(asked.Number) }
            .Where(value => value is not null)
            .Select(value => QuantityText.Show(value!.Value.Number, key.Unit!));
        var text = string.Join(" and ", near);
        return text.Length == 0 ? "" : $" (nearest: {text})";
    }

    private string Describe(ReadOnlySpan<Value> arguments, int count)
    {
        var parts = new string[count];
        for (var i = 0; i < count; i++)
        {
            parts[i] = $"{lookup.Keys[i].Name} {Show(lookup.Keys[i], arguments[i])}";
        }

        return string.Join(", ", parts);
    }

    private static string Show(LookupKey key, in Value value) =>
        value.Kind == ValueKind.Text ? value.Text : QuantityText.Show(value.Number, key.Unit!);

    private Value Missing(string why) =>
        Value.Missing(new Absence(AbsenceKind.Table, "", lookup.Name, why, lookup.WhenMissing));
}
