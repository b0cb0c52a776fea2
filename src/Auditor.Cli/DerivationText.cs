using Auditor.Engine.Evidence;

namespace Auditor.Cli;

/// <summary>Writes derivations as indented text: each value, its formula, the same with numbers, then what it rests on.</summary>
internal static class DerivationText
{
    /// <summary>Writes derivations.</summary>
    public static void Write(TextWriter output, IEnumerable<Derivation> derivations)
    {
        foreach (var derivation in derivations)
        {
            Write(output, derivation, "");
        }
    }

    private static void Write(TextWriter output, Derivation derivation, string indent)
    {
        output.WriteLine($"{indent}{derivation.Subject} {derivation.Symbol} = {derivation.Value}   ({derivation.Name})");
        var inner = indent + "  ";
        output.WriteLine($"{inner}= {derivation.Formula}");
        if (derivation.WithNumbers != derivation.Formula && derivation.WithNumbers != derivation.Value)
        {
            output.WriteLine($"{inner}= {derivation.WithNumbers}");
        }

        var references = derivation.References.Count == 0 ? "" : string.Join(", ", derivation.References) + "; ";
        output.WriteLine($"{inner}by {references}{derivation.Place}");
        if (derivation.Note.Length > 0)
        {
            output.WriteLine($"{inner}note: {derivation.Note}");
        }

        foreach (var source in derivation.From)
        {
            Write(output, source, inner);
        }
    }

    private static void Write(TextWriter output, EvidenceSource source, string indent)
    {
        if (source.Derivation is { } derivation)
        {
            Write(output, derivation, indent);
            return;
        }

        var place = source.Place.Length == 0 ? "" : $"   [{source.Place}]";
        var remark = source.Remark.Length == 0 ? "" : $"   {source.Remark}";
        var value = source.Kind == EvidenceKind.Missing ? "" : $" = {source.Text}";
        output.WriteLine($"{indent}{Word(source.Kind)}{source.Label}{value}{place}{remark}");
    }

    private static string Word(EvidenceKind kind) => kind switch
    {
        EvidenceKind.Input => "design: ",
        EvidenceKind.Parameter => "parameter: ",
        EvidenceKind.Cell => "table: ",
        EvidenceKind.Curve => "curve: ",
        EvidenceKind.Missing => "missing: ",
        _ => "",
    };
}
