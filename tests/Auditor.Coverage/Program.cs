using System.Text.Json;
using Auditor.Coverage;

if (args is not [var sources, var measured])
{
    Console.Error.WriteLine("Auditor.Coverage SOURCES MEASURED: both are folders, the second one is searched for coverage*.json");
    return 2;
}

var coverage = new Union(Path.GetFullPath(sources));
foreach (var file in Directory.EnumerateFiles(measured, "coverage*.json", SearchOption.AllDirectories))
{
    using var document = JsonDocument.Parse(File.ReadAllBytes(file));
    coverage.Add(document.RootElement);
}

Console.Write(Table.Of(coverage.Tallies()));
if (coverage.Tallies().Count > 0)
{
    return 0;
}

Console.Error.WriteLine($"no coverage was written below {measured}");
return 1;
