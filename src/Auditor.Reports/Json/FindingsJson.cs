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
    /// <param name="stream">Receives indented JSON in UTF-8 without a byte order mark, piece by piece; lines end with LF.</param>
    public static void Write(AuditResult result, Register register, FindingsOptions options, Stream stream) =>
        Invariantly.Do(() => Whole(result, register, options, stream));

    private static void Whole(AuditResult result, Register register, FindingsOptions options, Stream stream)
    {
        using (var output = new JsonOutput(stream, new Places(result.Design.File)))
        {
            output.Object(null, () =>
            {
                HeadJson.Write(output, result);
                FindingJson.Rules(output, result);
                FindingJson.Write(output, result);
                TailJson.Write(output, result, register);
                if (options.AllEvidence)
                {
                    EvidenceJson.Write(output, result);
                }
            });
        }

        stream.WriteByte((byte)'\n');
    }
}
