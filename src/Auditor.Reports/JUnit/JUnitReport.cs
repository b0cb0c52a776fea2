using System.Text;
using System.Xml;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Reports.Model;
using Auditor.Reports.Reading;

namespace Auditor.Reports.JUnit;

/// <summary>
/// Writes an audit as test results in the XML of JUnit, as the XML Schema of the Jenkins project describes it. Each subject is a test
/// suite, in the order of the design, so that a viewer opens on circuits; each rule that applies to it is a test case, called by the
/// id of the rule, which stays when its title is reworded. No times: nothing here is worth measuring.
/// </summary>
public static class JUnitReport
{
    private static readonly XmlWriterSettings Settings = new()
    {
        Encoding = new UTF8Encoding(encoderShouldEmitUTF8Identifier: false),
        Indent = true,
        NewLineChars = "\n",
        NewLineHandling = NewLineHandling.Replace,
    };

    /// <summary>Writes a file of test results.</summary>
    /// <param name="result">The audit.</param>
    /// <returns>Indented XML in UTF-8 without a byte order mark; lines end with LF.</returns>
    public static byte[] Write(AuditResult result)
    {
        using var stream = new MemoryStream();
        using (var xml = XmlWriter.Create(stream, Settings))
        {
            Suites(xml, result);
        }

        stream.WriteByte((byte)'\n');
        return stream.ToArray();
    }

    private static void Suites(XmlWriter xml, AuditResult result)
    {
        var places = new Places(result.Design.File);
        var cases = new JUnitCases(xml, places);
        var findings = result.Findings.ToLookup(finding => finding.Subject);
        xml.WriteStartElement("testsuites");
        xml.Attribute("name", ProjectWords.Of(result.Design)("title") ?? places.Design);
        Counts(xml, result.Findings, withSkipped: false);
        foreach (var subject in result.Subjects)
        {
            var own = findings[subject].ToArray();
            if (own.Length > 0 || subject.Parent is null)
            {
                Suite(xml, subject, own, () => Properties(xml, result, places), cases);
            }
        }

        xml.WriteEndElement();
    }

    private static void Suite(XmlWriter xml, DesignSubject subject, Finding[] findings, Action properties, JUnitCases cases)
    {
        xml.WriteStartElement("testsuite");
        xml.Attribute("name", SubjectText.Label(subject));
        Counts(xml, findings, withSkipped: true);
        if (subject.Parent is null)
        {
            properties();
        }

        Array.ForEach(findings, cases.Write);
        xml.WriteEndElement();
    }

    private static void Counts(XmlWriter xml, IReadOnlyCollection<Finding> findings, bool withSkipped)
    {
        xml.Attribute("tests", $"{findings.Count}");
        xml.Attribute("failures", $"{findings.Count(finding => finding.Outcome() == JUnitOutcome.Failure)}");
        xml.Attribute("errors", $"{findings.Count(finding => finding.Outcome() == JUnitOutcome.Error)}");
        if (withSkipped)
        {
            xml.Attribute("skipped", $"{findings.Count(finding => finding.Outcome() == JUnitOutcome.Skipped)}");
        }
    }

    /// <summary>What was audited, by which rules: said once, with the installation.</summary>
    private static void Properties(XmlWriter xml, AuditResult result, Places places)
    {
        var title = result.Rules.Title;
        xml.WriteStartElement("properties");
        Property(xml, ThisTool.Name, ThisTool.Version);
        Property(xml, "rule-set", title.Id);
        Property(xml, "edition", title.Edition);
        Property(xml, "notice", title.Notice);
        if (Loosened.Text(result.Rules) is { Length: > 0 } loosened)
        {
            Property(xml, "loosened", loosened);
        }

        foreach (var file in places.Inputs)
        {
            Property(xml, $"sha-256 of {file.Path}", file.Sha256);
        }

        xml.WriteEndElement();
    }

    private static void Property(XmlWriter xml, string name, string value)
    {
        xml.WriteStartElement("property");
        xml.Attribute("name", name);
        xml.Attribute("value", value);
        xml.WriteEndElement();
    }
}
