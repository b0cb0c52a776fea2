namespace Auditor.Reports.Reading;

/// <summary>How the program calls itself in files for other programs.</summary>
internal static class ThisTool
{
    /// <summary>Its name.</summary>
    public const string Name = "auditor";

    /// <summary>Its version: three numbers.</summary>
    public static string Version { get; } = typeof(ThisTool).Assembly.GetName().Version!.ToString(3);
}
