using System.Text;
using System.Xml;
using System.Xml.Linq;
using System.Xml.Schema;
using Auditor.Reports.JUnit;
using Auditor.Testing;

namespace Auditor.Reports.Tests.JUnit;

/// <summary>Test results, read by the platform's own reader of XML under the XML Schema of the Jenkins project.</summary>
public class JUnitTests
{
    private static readonly XmlSchemaSet Schema = ReadSchema();

    public static TheoryData<string> Examples => [.. ExampleAudit.All];

    [Theory]
    [MemberData(nameof(Examples))]
    public void Every_example_is_read_under_the_schema(string example)
    {
        var file = Read(JUnitReport.Write(ExampleAudit.Of(example)));

        Assert.All([file.Root!, .. file.Root!.Elements()], Counted);
    }

    [Fact]
    public void Hostile_texts_are_read_as_they_are()
    {
        var file = Read(JUnitReport.Write(Sheds.Audit("hostile")));

        Assert.StartsWith("# Yard | <img src=x> [link]", file.Root!.Attribute("name")!.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void The_schema_would_find_a_slip()
    {
        var text = Encoding.UTF8.GetString(JUnitReport.Write(Sheds.Audit("garden")))
            .Replace("<failure ", "<fault ", StringComparison.Ordinal).Replace("</failure>", "</fault>", StringComparison.Ordinal);

        Assert.Throws<XmlSchemaValidationException>(() => Read(Encoding.UTF8.GetBytes(text)));
    }

    [Fact]
    public void Each_subject_is_a_suite_and_each_rule_that_applies_a_case()
    {
        var file = Read(JUnitReport.Write(Sheds.Audit("garden")));

        Assert.Equal(
            ["The installation", "bonding/water", "A/1 Lamps", "A/1/leg 1 Lamps", "A/2 Pump", "A/2/leg 1 Pump", "A/2/leg 2 Pump", "A/3 Kiln", "A/3/leg 1 Kiln", "A/4 Bench", "A/4/leg 1 Bench",
                "departure/bonding-enough:bonding/water", "departure/run-sensible:A/1", "departure/device-known:A/3", "departure/load-within-capacity:A/2", "departure/no-such-rule:A/9"],
            file.Root!.Elements("testsuite").Select(suite => suite.Attribute("name")!.Value));
        Assert.Equal(33, file.Descendants("testcase").Count());
    }

    [Theory]
    [InlineData("device-known", "A/1", "")]
    [InlineData("device-known", "A/3", "failure")]
    [InlineData("load-within-capacity", "A/4", "error")]
    [InlineData("run-sensible", "A/2", "skipped")]
    [InlineData("run-sensible", "A/4", "skipped")]
    [InlineData("bonding-enough", "bonding/water", "skipped")]
    public void Only_what_conforms_looks_passed(string rule, string subject, string element)
    {
        var file = Read(JUnitReport.Write(Sheds.Audit("garden")));
        var found = file.Descendants("testcase").Single(test => test.Attribute("name")!.Value == rule && test.Attribute("classname")!.Value == subject);

        Assert.Equal(element, string.Concat(found.Elements().Select(outcome => outcome.Name.LocalName)));
    }

    [Fact]
    public void A_failure_says_what_is_wrong_where_and_what_to_do()
    {
        var failure = Read(JUnitReport.Write(Sheds.Audit("garden"))).Descendants("failure").First();

        Assert.Equal("Ib 25 A against Iz 24 A of `cable`.", failure.Attribute("message")!.Value);
        Assert.Equal(
            """
            finding: Ib 25 A against Iz 24 A of `cable`.
            rule: The conductors carry the load
            clause: requirement, overload: Shed rule 1, Shed rule 1.2
            value: 25 A
            limit: at most 24 A
            margin: -4.2 %
            where: garden/circuits.yaml:12:16
            can be put right by: cable.csa, load.current
            """.ReplaceLineEndings("\n"),
            failure.Value);
    }

    [Fact]
    public void A_departure_is_told_with_its_reason_and_who_agreed()
    {
        var skipped = Read(JUnitReport.Write(Sheds.Audit("garden"))).Descendants("skipped").First();

        Assert.StartsWith("Departed: The pipe is of plastic behind the wall. Agreed by T. Example on 2026-03-01.\n", skipped.Value, StringComparison.Ordinal);
    }

    [Fact]
    public void Files_and_rules_are_told_once()
    {
        var properties = Read(JUnitReport.Write(Sheds.Audit("garden"))).Descendants("property").ToDictionary(each => each.Attribute("name")!.Value, each => each.Attribute("value")!.Value);

        Assert.Equal("shed", properties["rule-set"]);
        Assert.Equal("1d8a0604f05d4fa8b3f4afc343fc5c61801c3a6efb617adfc04fcab531211715", properties["sha-256 of garden.design.yaml"]);
    }

    [Fact]
    public void A_name_of_a_file_that_XML_cannot_hold_is_shown_with_a_stand_in()
    {
        using var folder = new TemporaryFolder();
        var path = folder.Write("a\u0001b.design.yaml", File.ReadAllText(Sheds.Data("designs/hostile.design.yaml")));

        var file = Read(JUnitReport.Write(ExampleAudit.At(path, "a\u0001b.design.yaml", Sheds.Rules)));

        Assert.Contains(file.Descendants("property"), each => each.Attribute("name")!.Value == "sha-256 of a\uFFFDb.design.yaml");
    }

    private static void Counted(XElement suites)
    {
        Assert.Equal(suites.Descendants("testcase").Count(), (int)suites.Attribute("tests")!);
        Assert.Equal(suites.Descendants("failure").Count(), (int)suites.Attribute("failures")!);
        Assert.Equal(suites.Descendants("error").Count(), (int)suites.Attribute("errors")!);
        Assert.Equal(suites.Name.LocalName == "testsuite" ? suites.Descendants("skipped").Count() : null, (int?)suites.Attribute("skipped"));
    }

    private static XDocument Read(byte[] bytes)
    {
        var settings = new XmlReaderSettings { ValidationType = ValidationType.Schema, Schemas = Schema, DtdProcessing = DtdProcessing.Prohibit };
        using var reader = XmlReader.Create(new MemoryStream(bytes), settings);
        return XDocument.Load(reader);
    }

    private static XmlSchemaSet ReadSchema()
    {
        var schema = new XmlSchemaSet();
        using var reader = XmlReader.Create(Repository.PathOf("tests/Auditor.Reports.Tests/JUnit/jenkins-junit.xsd"));
        schema.Add(null, reader);
        schema.Compile();
        return schema;
    }
}
