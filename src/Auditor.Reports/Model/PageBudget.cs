using Auditor.Engine.Evidence;

namespace Auditor.Reports.Model;

/// <summary>
/// Room for derivations and workings, so that the page of the largest design can still be opened: a page of six hundred circuits is to stay
/// under 5 MB, one of two thousand under 20 MB. Counted in characters of the page, roughly.
/// </summary>
internal sealed class PageBudget
{
    private const int Page = 4_200_000;
    private const int LeastForFinding = 30;
    private const int OfFinding = 290;
    private const int AroundSource = 70;
    private const int AroundWorking = 190;

    private int _left;

    private PageBudget(int characters)
    {
        _left = characters;
        ShareOfOne = characters / 12;
    }

    /// <summary>Whether there is room for another finding.</summary>
    public bool IsLeft => _left > 0;

    /// <summary>How much of it the quantities behind one finding may take.</summary>
    public int ShareOfOne { get; }

    /// <summary>The room beside so many findings and so many characters of pictures.</summary>
    public static PageBudget For(int findings, int pictures) => new(Math.Max(findings * LeastForFinding, Page - (findings * OfFinding) - pictures));

    /// <summary>Takes the room of a derivation.</summary>
    public void Spend(ReportDerivation derivation) =>
        _left -= derivation.Condition.Length + derivation.Quantities.Concat(derivation.Inputs).Concat(derivation.Figures)
            .Sum(source => AroundSource + source.Label.Length + source.Text.Length + source.Place.Length);

    /// <summary>Takes the room of a working, and tells how much that was.</summary>
    public int Spend(Derivation working)
    {
        var taken = AroundWorking + working.Formula.Length + working.WithNumbers.Length + working.Value.Length + working.Name.Length
            + working.From.Sum(source => AroundSource + source.Label.Length + source.Text.Length + source.Place.Length + source.Remark.Length);
        _left -= taken;
        return taken;
    }
}
