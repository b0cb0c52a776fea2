using System.CommandLine;
using Auditor.Documents;
using Auditor.Formulas.Types;

namespace Auditor.Cli.Importing;

/// <summary>The options that say of the supply what every design has to: the keys that the schema asks of it.</summary>
/// <param name="Option">The option.</param>
/// <param name="What">What it says, as part of a sentence.</param>
/// <param name="Key">The key of <c>supply</c>.</param>
/// <param name="Type">What the key holds.</param>
internal sealed record SupplyOptions(Option<string?> Option, string What, string Key, FormulaType Type)
{
    /// <summary>All of them.</summary>
    public static IReadOnlyList<SupplyOptions> Make() =>
    [
        Of("earthing", "WORD", "Earthing system: TN-S, TN-C-S, TT, ...", "how the installation is earthed", FormulaType.Text),
        Of("phases", "NUMBER", "Number of phases of the supply: 1 or 3.", "how many phases the supply has", FormulaType.Number),
        Of("voltage", "VOLTAGE", "Nominal voltage: between lines with 3 phases, else to neutral.", "the voltage of the supply", FormulaType.Text),
    ];

    /// <summary>What the caller says; a bad value is told by the schema, at the name of the option.</summary>
    public SupplyFact Read(ParseResult parsed)
    {
        if (parsed.GetValue(Option) is not { Length: > 0 } text)
        {
            return new SupplyFact(Option.Name, What, null);
        }

        var value = ImportedDesign.Scalar(text, new SourceText(Option.Name, text).WholeSpan(), Type, isIdentifier: false);
        return new SupplyFact(Option.Name, What, new MappingEntry(new Located<string>(Key, value.Span), value));
    }

    private static SupplyOptions Of(string key, string form, string description, string what, FormulaType type) =>
        new(new Option<string?>("--" + key) { Description = description, HelpName = form }, what, key, type);
}
