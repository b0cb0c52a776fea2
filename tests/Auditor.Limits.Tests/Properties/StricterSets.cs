using System.Globalization;
using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;
using Auditor.Testing;

namespace Auditor.Limits.Tests.Properties;

/// <summary>House sets on the shipped rules for the United Kingdom that move parameters in the direction declared to be the stricter one.</summary>
internal static class StricterSets
{
    /// <summary>The parameters that have a stricter direction.</summary>
    public static IReadOnlyList<Parameter> Movable { get; } =
        [.. Shipped.UnitedKingdom.Parameters.Where(parameter => parameter.Tighter != "none")];

    /// <summary>A set with some parameters moved.</summary>
    /// <param name="moves">Parameters with the share by which each is moved; a flag takes its stricter side.</param>
    public static RuleSet Of(params IEnumerable<(Parameter Parameter, double Share)> moves)
    {
        var path = Path.Combine(Directory.CreateTempSubdirectory("stricter-").FullName, "stricter.set.yaml");
        try
        {
            File.WriteAllText(path, "set: stricter\ntitle: Stricter\nextends: united-kingdom\nparameters:\n"
                + string.Concat(moves.Select(move => $"  {move.Parameter.Id}: {{ value: {Moved(move.Parameter, move.Share)} }}\n")));
            var problems = new Problems();
            var set = RuleSetLoader.Load(Shipped.Home, path, Repository.Root, null, problems);
            Assert.Equal("", ProblemText.Render(problems.All));
            return set!;
        }
        finally
        {
            Directory.Delete(Path.GetDirectoryName(path)!, recursive: true);
        }
    }

    /// <summary>The number as the set writes it, moved by a share of itself, or by the share where it is nought; in the same unit.</summary>
    private static string Moved(Parameter parameter, double share)
    {
        var isHigher = parameter.Tighter == "higher";
        if (parameter.Value.Kind == ValueKind.Flag)
        {
            return isHigher ? "true" : "false";
        }

        var written = parameter.Text.Split(' ', 2);
        var number = double.Parse(written[0], CultureInfo.InvariantCulture);
        var step = share * (number == 0 ? 1 : number);
        written[0] = Math.Max(number + (isHigher ? step : -step), 0).ToString("0.######", CultureInfo.InvariantCulture);
        return string.Join(' ', written);
    }
}
