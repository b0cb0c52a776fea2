namespace Auditor.Reports.Model;

/// <summary>Words of the design that identify the job; each is empty where the design has none.</summary>
/// <param name="Title">Name of the job.</param>
/// <param name="Reference">Job or drawing number.</param>
/// <param name="Revision">Revision of the design.</param>
/// <param name="Designer">Who designed it.</param>
/// <param name="Checker">Who checks it.</param>
public sealed record ReportProject(string Title, string Reference, string Revision, string Designer, string Checker);
