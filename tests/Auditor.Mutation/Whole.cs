using System.Security.Cryptography;
using System.Text;

namespace Auditor.Mutation;

/// <summary>The whole run: compile with all mutants, try a sample of them, tell the score and the survivors.</summary>
internal static class Whole
{
    private static readonly string[] Mutated = ["Auditor.Formulas", "Auditor.Engine"];

    private static readonly string[] Tests = ["Auditor.Formulas.Tests", "Auditor.Engine.Tests", "Auditor.Limits.Tests"];

    /// <summary>Runs.</summary>
    /// <param name="args">How many mutants to draw at random (all by default), the seed of the draw, and the test projects, each of them perhaps with
    /// the classes that are wanted of it: <c>Auditor.Rules.Tests:CaseTests,CourseTests</c>. With <c>on</c> before all this, what an earlier run of the
    /// same mutants noticed stands, and the rest is tried against these projects.</param>
    public static int Run(string[] args)
    {
        var goesOn = args is ["on", ..];
        args = goesOn ? args[1..] : args;
        var root = Root();
        var work = Path.Combine(root, "tests", "Auditor.Mutation", "bin", "mutated");
        Directory.CreateDirectory(work);
        var projects = (args.Length > 2 ? args[2..] : Tests).Select(name => new TestProject(Path.Combine(root, "tests"), name, work)).ToArray();

        var all = new List<Mutant>();
        var next = 1;
        var references = Path.Combine(work, "references");
        Directory.CreateDirectory(references);
        foreach (var file in Tests.SelectMany(name => Directory.GetFiles(TestProject.FolderOf(Path.Combine(root, "tests"), name), "*.dll")))
        {
            File.Copy(file, Path.Combine(references, Path.GetFileName(file)), overwrite: true);
        }

        foreach (var name in Mutated)
        {
            (var mutants, next) = MutatedAssembly.Compile(Path.Combine(root, "src", name), next, name == Mutated[0], references, work);
            all.AddRange(mutants);
            File.Copy(Path.Combine(work, name + ".dll"), Path.Combine(references, name + ".dll"), overwrite: true);
            Array.ForEach(projects, project => project.Take(Path.Combine(work, name + ".dll")));
        }

        var size = args.Length > 0 && args[0] != "all" ? int.Parse(args[0]) : all.Count;
        var seed = args.Length > 1 ? int.Parse(args[1]) : 1;
        var order = all.ToArray();
        new Random(seed).Shuffle(order);
        Mutant[] drawn = [.. order.Take(size).OrderBy(mutant => mutant.Id)];
        var title = $"{drawn.Length} of {all.Count} mutants, seed {seed}";
        Console.WriteLine(title);

        title += $", {Convert.ToHexString(SHA256.HashData(Encoding.UTF8.GetBytes(string.Join('\n', all))))[..16]}";
        var outcomes = Path.Combine(work, "outcomes.tsv");
        string[] earlier = goesOn ? File.ReadAllLines(outcomes) : [title];
        if (earlier.FirstOrDefault() != title)
        {
            throw new InvalidOperationException($"{outcomes} is not of these mutants: draw as then, from the same source");
        }

        using var log = new StreamWriter(outcomes, append: goesOn);
        if (!goesOn)
        {
            log.WriteLine(title);
        }

        var campaign = new Campaign(drawn, log);
        campaign.GoOnFrom(earlier);
        Array.ForEach(projects, project => campaign.Run(project, work));
        Tell(drawn, campaign);
        return 0;
    }

    private static void Tell(Mutant[] drawn, Campaign campaign)
    {
        foreach (var name in Mutated.Append(""))
        {
            var own = drawn.Where(mutant => mutant.Place.StartsWith(name, StringComparison.Ordinal)).ToArray();
            var counts = own.CountBy(mutant => Became(mutant, campaign)).ToDictionary();
            var found = Count("killed") + Count("timeout") + Count("crashed");
            var judged = own.Length - Count(Campaign.OnlyOnce);
            Console.WriteLine(
                $"{(name.Length == 0 ? "all" : name),-18} {100.0 * found / Math.Max(judged, 1):0.0} % of {judged} noticed: {Count("killed")} killed, {Count("timeout")} timed out, "
                + $"{Count("crashed")} crashed; {Count("survived")} survived, {Count("met by no test")} met by no test; {Count(Campaign.OnlyOnce)} met only while something is made once, not counted");

            int Count(string what) => counts.GetValueOrDefault(what);
        }

        foreach (var mutant in drawn.Where(mutant => Became(mutant, campaign) is "survived" or "met by no test"))
        {
            Console.WriteLine($"{Became(mutant, campaign)}\t{mutant.Place}\t{mutant.Change}");
        }
    }

    private static string Became(Mutant mutant, Campaign campaign) =>
        campaign.Outcomes.GetValueOrDefault(mutant.Id, "met by no test");

    private static string Root()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (!File.Exists(Path.Combine(folder.FullName, "auditor.sln")))
        {
            folder = folder.Parent ?? throw new InvalidOperationException("run it within the checkout");
        }

        return folder.FullName;
    }
}
