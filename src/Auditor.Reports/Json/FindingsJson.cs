using Auditor.Engine.Findings;
using Auditor.Engine.Registers;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Json;

/// <summary>Writes findings for programs, as <c>findings.schema.json</c> describes them.</summary>
public static class FindingsJson
{
    /// <summary>Writes a findings file.</summary>
    /// <param name="result">The audit.</param>
    /// <param name="register">The register of requirements.</param>
    /// <param name="options">What to add.</param>
    /// <returns>Indented JSON in UTF-8 without a byte order mark; lines end with LF.</returns>
    public static byte[] Write(AuditResult result, Register register, FindingsOptions options) =>
        Invariantly.Make(() => Whole(result, register, options));

    private static byte[] Whole(AuditResult result, Register register, FindingsOptions options)
    {
        using var stream = new MemoryStream();
        using (var output = new JsonOutput(stream, new Places(result.Design.File)))
        {
            var supports = new Supports(result);
            output.Object(null, () =>
            {
                HeadJson.Write(output, result);
                FindingJson.Write(output, result, supports);
                TailJson.Write(output, result, register, supports);
                if (options.AllEvidence)
                {
                    EvidenceJson.Write(output, result);
                }
            });
        }

        stream.WriteByte((byte)'\n');
        return stream.ToArray();
    }
}
