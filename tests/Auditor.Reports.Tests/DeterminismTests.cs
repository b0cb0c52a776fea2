using System.Globalization;
using System.Text;
using Auditor.Reports.Files;
using Auditor.Reports.Json;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Tests;

/// <summary>Reports depend on their input alone.</summary>
public class DeterminismTests
{
    [Fact]
    public void Culture_of_the_thread_and_time_zone_change_no_byte()
    {
        var before = Everything();
        var culture = CultureInfo.CurrentCulture;
        var zone = Environment.GetEnvironmentVariable("TZ");
        try
        {
            CultureInfo.CurrentCulture = Contrary();
            Environment.SetEnvironmentVariable("TZ", "Pacific/Kiritimati");
            TimeZoneInfo.ClearCachedData();

            Assert.Equal("1,5", 1.5.ToString());
            Assert.Equal(before, Everything());
        }
        finally
        {
            CultureInfo.CurrentCulture = culture;
            Environment.SetEnvironmentVariable("TZ", zone);
            TimeZoneInfo.ClearCachedData();
        }
    }

    [Theory]
    [InlineData("")]
    [InlineData("elsewhere/")]
    [InlineData("/srv/jobs/7/")]
    public void Reports_do_not_tell_where_the_audit_was_started(string folder)
    {
        var result = Sheds.Audit("garden", folder);

        Assert.Equal(Findings(""), Encoding.UTF8.GetString(Sheds.Json(result, new FindingsOptions(AllEvidence: true))));
    }

    private static string Everything() =>
        Sheds.Render("garden", ReportFormat.Markdown, TemplateFile.Shipped(ReportFormat.Markdown))
        + Sheds.Render("garden", ReportFormat.Text, TemplateFile.Shipped(ReportFormat.Text))
        + Findings("");

    private static string Findings(string folder) =>
        Encoding.UTF8.GetString(Sheds.Json(Sheds.Audit("garden", folder), new FindingsOptions(AllEvidence: true)));

    /// <summary>A culture that writes numbers and days as differently as can be.</summary>
    private static CultureInfo Contrary()
    {
        var culture = (CultureInfo)CultureInfo.InvariantCulture.Clone();
        culture.NumberFormat.NumberDecimalSeparator = ",";
        culture.NumberFormat.NegativeSign = "minus";
        culture.NumberFormat.PositiveSign = "plus";
        culture.DateTimeFormat.ShortDatePattern = "dd/MM/yy";
        culture.DateTimeFormat.DateSeparator = "'";
        return culture;
    }
}
