using System.Globalization;
using Microsoft.CodeAnalysis;
using Microsoft.CodeAnalysis.CSharp;
using Microsoft.CodeAnalysis.CSharp.Syntax;

namespace Auditor.Mutation;

/// <summary>An assembly compiled once with all its mutants; those that do not compile are left out.</summary>
internal static class MutatedAssembly
{
    private static readonly CSharpParseOptions Language = new(LanguageVersion.Latest);

    /// <summary>Compiles.</summary>
    /// <param name="project">Full path of the folder of the project, which must have been built.</param>
    /// <param name="first">Number of its first mutant.</param>
    /// <param name="withSwitch">Whether the class that tells which mutant is at work goes into it.</param>
    /// <param name="references">Folder with the assemblies that it needs.</param>
    /// <param name="output">Where the assembly is written.</param>
    /// <returns>Its mutants, and the number after the last one.</returns>
    public static (IReadOnlyList<Mutant> Mutants, int Next) Compile(string project, int first, bool withSwitch, string references, string output)
    {
        var name = Path.GetFileName(project);
        var files = Directory.EnumerateFiles(project, "*.cs", SearchOption.AllDirectories)
            .Where(file => !Path.GetRelativePath(project, file).StartsWith("obj", StringComparison.Ordinal) && !Path.GetRelativePath(project, file).StartsWith("bin", StringComparison.Ordinal))
            .Order(StringComparer.Ordinal).Select(file => Parse(file, File.ReadAllText(file))).ToArray();
        var made = Directory.EnumerateFiles(Path.Combine(project, "obj", "Release", "net10.0"), "*.cs")
            .Select(file => Parse(file, File.ReadAllText(file))).Concat(withSwitch ? [Parse("Switch.cs", Switch.Source)] : []).ToArray();
        var needed = Needed(references, name);
        var dropped = new HashSet<int>();
        while (true)
        {
            var next = first;
            var mutants = new List<Mutant>();
            var trees = files.Select(file =>
            {
                var planter = new Planter(Path.GetRelativePath(Path.GetDirectoryName(project)!, file.FilePath), next, dropped);
                var root = planter.Visit(file.GetRoot())!;
                next = planter.Next;
                mutants.AddRange(planter.Mutants);
                return CSharpSyntaxTree.Create((CSharpSyntaxNode)root, Language, file.FilePath);
            }).ToArray();
            var options = new CSharpCompilationOptions(OutputKind.DynamicallyLinkedLibrary, optimizationLevel: OptimizationLevel.Release, nullableContextOptions: NullableContextOptions.Enable);
            var compilation = CSharpCompilation.Create(name, [.. trees, .. made], needed, options);
            var result = compilation.Emit(Path.Combine(output, name + ".dll"));
            if (result.Success)
            {
                return (mutants, next);
            }

            var faults = result.Diagnostics.Where(found => found.Severity == DiagnosticSeverity.Error).ToArray();
            var before = dropped.Count;
            dropped.UnionWith(faults.SelectMany(At));
            if (dropped.Count == before)
            {
                throw new InvalidOperationException(string.Join('\n', faults.Take(5)));
            }
        }
    }

    private static SyntaxTree Parse(string path, string text) => CSharpSyntaxTree.ParseText(text, Language, path);

    private static List<MetadataReference> Needed(string folder, string name)
    {
        var platform = ((string)AppContext.GetData("TRUSTED_PLATFORM_ASSEMBLIES")!).Split(Path.PathSeparator).Where(path => Path.GetFileName(path).StartsWith("System.", StringComparison.Ordinal));
        var own = Directory.EnumerateFiles(folder, "*.dll").Where(path => Path.GetFileName(path) != name + ".dll" && !Path.GetFileName(path).Contains("Tests", StringComparison.Ordinal));
        return [.. platform.Concat(own).DistinctBy(Path.GetFileName).Select(path => MetadataReference.CreateFromFile(path))];
    }

    /// <summary>The mutant that a fault lies in; where it lies in none, as a name that is not set for certain, all mutants of the member.</summary>
    private static IEnumerable<int> At(Diagnostic fault)
    {
        var node = fault.Location.SourceTree!.GetRoot().FindNode(fault.Location.SourceSpan, getInnermostNodeForTie: true);
        var nearest = node.AncestorsAndSelf().FirstOrDefault(part => part.HasAnnotations(Planter.Mark));
        var member = node.AncestorsAndSelf().OfType<MemberDeclarationSyntax>().FirstOrDefault();
        return (nearest is null ? member?.GetAnnotatedNodes(Planter.Mark) ?? [] : [nearest])
            .SelectMany(part => part.GetAnnotations(Planter.Mark)).Select(mark => int.Parse(mark.Data!, CultureInfo.InvariantCulture));
    }
}
