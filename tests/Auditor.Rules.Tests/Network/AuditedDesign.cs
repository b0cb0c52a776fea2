using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Formulas.Values;

namespace Auditor.Rules.Tests.Network;

/// <summary>A design read from its text by the shipped rule set for the United Kingdom, as the program reads it.</summary>
internal sealed class AuditedDesign
{
    private readonly Dictionary<string, DesignSubject> _subjects;

    private AuditedDesign(Design design)
    {
        Design = design;
        _subjects = design.Subjects.ToDictionary(subject => subject.Key);
    }

    /// <summary>The design.</summary>
    public Design Design { get; }

    /// <summary>Reads a design; it must have no problem of any kind.</summary>
    public static AuditedDesign Read(string text)
    {
        var folder = Directory.CreateTempSubdirectory("network-");
        try
        {
            var path = Path.Combine(folder.FullName, "tree.design.yaml");
            File.WriteAllText(path, text);
            var problems = new Problems();
            var file = DesignFile.Read(path, "tree.design.yaml", problems);
            Assert.Equal("", ProblemText.Render(problems.All));
            var rules = Shipped.Set(Shipped.UnitedKingdom);
            rules.Schema.Validation.Validate(file!.Root, problems);
            var design = DesignBuilder.Build(file, new Evaluator(rules), problems);
            Assert.Equal("", ProblemText.Render(problems.All));
            return new AuditedDesign(design!);
        }
        finally
        {
            folder.Delete(recursive: true);
        }
    }

    /// <summary>A quantity in coherent units (Ω, A, V; a percentage as a share of one).</summary>
    /// <param name="key">Key of the subject; <c>-</c> for the installation.</param>
    /// <param name="symbol">Symbol of the quantity.</param>
    public double Number(string key, string symbol)
    {
        var subject = _subjects[key];
        var value = subject.Quantity(subject.Shape.Quantity(symbol)!.Index);
        Assert.False(value.IsMissing, value.IsMissing ? $"{key} {symbol}: {string.Join("; ", value.Absences.Items)}" : "");
        Assert.Equal(ValueKind.Quantity, value.Kind);
        return value.Number;
    }

    /// <summary>Audits the design; it must have no problem of any kind.</summary>
    public AuditResult Audit()
    {
        var problems = new Problems();
        var result = Engine.Evaluation.Audit.Run(Design, new DateOnly(2026, 12, 1), problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return result;
    }
}
