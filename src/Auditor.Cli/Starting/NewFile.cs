using System.Text;
using Auditor.Documents;
using Auditor.Reports.Files;

namespace Auditor.Cli.Starting;

/// <summary>Writes files that are not there yet.</summary>
internal static class NewFile
{
    /// <summary>Writes a file whole or not at all; one that is there already stays as it is.</summary>
    /// <returns>Whether it was written; else a problem is added.</returns>
    public static bool Write(string path, string text, Problems problems)
    {
        if (File.Exists(path))
        {
            problems.Add(StartMessages.IsThere(path));
            return false;
        }

        return ReportFile.Write(path, Encoding.UTF8.GetBytes(text), problems);
    }
}
