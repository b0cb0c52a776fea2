namespace Auditor.Hostile.Tests;

/// <summary>A hostile case: what somebody puts where the program will read it, and the command line that does.</summary>
/// <param name="Name">Its name in the list.</param>
/// <param name="Put">Puts it into a folder.</param>
/// <param name="Arguments">The command line; <c>{folder}</c> stands for the folder.</param>
internal sealed record HostileCase(string Name, Action<HostileFolder> Put, params string[] Arguments)
{
    /// <summary>A design called <c>site.design.yaml</c>, which is audited.</summary>
    public static HostileCase Audit(string name, Action<HostileFolder> put) => new(name, put, "audit", "{folder}/site.design.yaml", "--fail-on", "nonconforming");

    /// <summary>A design that is audited.</summary>
    public static HostileCase Audit(string name, string design) => Audit(name, folder => folder.Write("site.design.yaml", design));
}
