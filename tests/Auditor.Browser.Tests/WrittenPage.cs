using Auditor.Reports.Model;

namespace Auditor.Browser.Tests;

/// <summary>A page that was written, and what it was made from.</summary>
/// <param name="Path">Full path of the file.</param>
/// <param name="Bytes">Its size.</param>
/// <param name="Model">The report model.</param>
internal sealed record WrittenPage(string Path, int Bytes, ReportModel Model);
