using System.Text;
using Auditor.Documents;
using Auditor.Quantities;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Texts of quantities and of units. What is taken for a quantity is written and read again as the same.</summary>
internal sealed class QuantityTexts : FuzzKind
{
    public override IReadOnlyList<byte[]> Seeds { get; } =
    [
        .. Corpus.Files("examples", "*.design.yaml").SelectMany(file => Corpus.Scalars(Corpus.Read(file)))
            .Where(scalar => scalar.Kind == ScalarKind.Text && QuantityText.TryParse(scalar.Text, out _, out _))
            .Select(scalar => scalar.Text).Concat(["18 m +3 m -1 m", "0.32 ohm ± 10 %, assumed", "1.5e3 Ω·mm²/m", "-5 °C"])
            .Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal).Select(Encoding.UTF8.GetBytes),
    ];

    public override Judgement Judge(byte[] input)
    {
        var text = Encoding.UTF8.GetString(input);
        _ = UnitCatalog.Find(text);
        _ = UnitCatalog.FindIdentifier(text);
        if (QuantityText.TryParse(text, out var stated, out var fault))
        {
            return QuantityText.TryParse(QuantityText.Write(stated), out var again, out _) && again.Quantity == stated.Quantity ? Judgement.Taken : Judgement.Neither;
        }

        return fault.Message.Length > 0 && fault.Start >= 0 && fault.Length >= 0 && fault.Start + fault.Length <= text.Length ? Judgement.Refused : Judgement.Neither;
    }
}
