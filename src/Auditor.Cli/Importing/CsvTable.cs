using System.Text;
using Auditor.Documents;
using CsvHelper;

namespace Auditor.Cli.Importing;

/// <summary>A table in comma-separated values (RFC 4180): a header and records of as many cells, each with its place in the file.</summary>
/// <param name="Source">The file.</param>
/// <param name="Header">The names of the columns.</param>
/// <param name="Rows">The records that say something; those of empty cells alone are left out, since spreadsheets add them.</param>
internal sealed record CsvTable(SourceText Source, IReadOnlyList<CsvCell> Header, IReadOnlyList<IReadOnlyList<CsvCell>> Rows)
{
    private const char Separator = ',';

    /// <summary>Reads a table; null, with problems added, when it has no header. Badly quoted cells and uneven records are problems.</summary>
    public static CsvTable? Read(SourceText source, Problems problems)
    {
        CsvMalformedReason? malformed = null;
        var malformedAt = 0L;
        var options = CsvReaderOptions.Default with
        {
            Separator = Separator,
            HasHeader = false,
            OnMalformedRecord = record => (malformed, malformedAt) = (record.Reason, record.ByteOffset),
        };
        var bytes = Encoding.UTF8.GetBytes(source.Text);
        var offsets = new CharacterOffsets(bytes);
        using var reader = CsvReader.Create(bytes, options);
        var records = new List<CsvCell[]>();
        while (reader.Read())
        {
            var cells = Cells(reader, source, bytes, offsets);
            records.Add(cells);
            if (malformed is { } reason)
            {
                var isOpen = reason == CsvMalformedReason.UnterminatedQuote;
                problems.Add(ImportMessages.Malformed(source, isOpen ? cells[^1].Span.Start : offsets.Before(malformedAt), reason));
                malformed = null;
            }
        }

        if (records.Count == 0)
        {
            problems.Add(ImportMessages.NoHeader(source));
            return null;
        }

        var header = records[0];
        foreach (var record in records.Where(record => record.Length != header.Length))
        {
            problems.Add(ImportMessages.Uneven(record, header.Length));
        }

        return new CsvTable(source, header, [.. records.Skip(1).Where(record => Array.Exists(record, cell => cell.Text.Length > 0))]);
    }

    private static CsvCell[] Cells(CsvReader reader, SourceText source, byte[] bytes, CharacterOffsets offsets)
    {
        var cells = new CsvCell[reader.FieldCount];
        var at = (int)reader.ByteOffset;
        for (var i = 0; i < cells.Length; i++)
        {
            var raw = reader.GetRawSpan(i).Length;
            var isQuoted = raw >= 2 && bytes[at] == (byte)'"' && bytes[at + raw - 1] == (byte)'"';
            var (from, to) = isQuoted ? (at + 1, at + raw - 1) : (at, at + raw);
            var span = new SourceSpan(source, offsets.Next(from), offsets.Next(to));
            cells[i] = new CsvCell(reader.GetString(i).Trim(), Trimmed(span), (int)reader.RowNumber, i);
            at += raw + 1;
        }

        return cells;
    }

    private static SourceSpan Trimmed(SourceSpan span)
    {
        var text = span.Text;
        return span.Slice(text.Length - text.TrimStart().Length, text.Trim().Length);
    }

    /// <summary>Turns offsets in bytes into offsets in characters, going through the file once.</summary>
    private sealed class CharacterOffsets(byte[] bytes)
    {
        private int _byte;
        private int _character;

        /// <summary>The character at a byte that does not lie before the last one asked for.</summary>
        public int Next(int offset)
        {
            _character += Encoding.UTF8.GetCharCount(bytes, _byte, offset - _byte);
            _byte = offset;
            return _character;
        }

        /// <summary>The character at a byte of the record that was just gone through.</summary>
        public int Before(long offset) => (int)offset <= _byte
            ? _character - Encoding.UTF8.GetCharCount(bytes, (int)offset, _byte - (int)offset)
            : _character;
    }
}
