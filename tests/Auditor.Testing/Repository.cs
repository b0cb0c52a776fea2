namespace Auditor.Testing;

/// <summary>The checkout that the tests run in.</summary>
public static class Repository
{
    /// <summary>The full path of the checkout.</summary>
    public static string Root { get; } = FindRoot();

    /// <summary>The full path of a file or folder of the checkout.</summary>
    /// <param name="path">The path from the root of the checkout, with forward slashes.</param>
    public static string PathOf(string path) => Path.GetFullPath(Path.Combine(Root, path));

    private static string FindRoot()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "auditor.sln")))
            {
                return folder.FullName;
            }
        }

        throw new InvalidOperationException("the tests run outside the checkout");
    }
}
