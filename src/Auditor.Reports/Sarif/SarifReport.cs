using Auditor.Engine.Findings;
using Auditor.Reports.Json;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Sarif;

/// <summary>
/// Writes an audit in the Static Analysis Results Interchange Format (SARIF) 2.1.0 of OASIS, for code review and for programs that
/// gather results. Results are the findings that want attention: nonconforming (kind <c>fail</c>), undetermined (<c>open</c>) and
/// departed (<c>fail</c>, suppressed by the departure). Conforming findings are left out, since readers of the format list each
/// result as one thing to look at; that they were looked at is told by the rules, which are all that applied, and by the counts.
/// </summary>
public static class SarifReport
{
    private const string SchemaAddress = "https://docs.oasis-open.org/sarif/sarif/v2.1.0/errata01/os/schemas/sarif-schema-2.1.0.json";

    /// <summary>Writes a SARIF file.</summary>
    /// <param name="result">The audit.</param>
    /// <param name="baseline">
    /// Where the audit was compared with an earlier one: how each finding stands against it, by key; a key that is not there is new.
    /// Null where nothing was compared.
    /// </param>
    /// <returns>Indented JSON in UTF-8 without a byte order mark; lines end with LF.</returns>
    public static byte[] Write(AuditResult result, IReadOnlyDictionary<string, SarifBaseline>? baseline = null)
    {
        using var stream = new MemoryStream();
        using (var output = new JsonOutput(stream, new Places(result.Design.File)))
        {
            output.Object(null, () =>
            {
                output.Text("$schema", SchemaAddress);
                output.Text("version", "2.1.0");
                output.Array("runs", [new RunSarif(output, result, baseline)], run => output.Object(null, run.Write));
            });
        }

        stream.WriteByte((byte)'\n');
        return stream.ToArray();
    }
}
