using OxyPlot;

namespace Auditor.Reports.Pictures.Plotting;

/// <summary>
/// Lets the plotting library speak of looks: each look is a colour that stands for it until it is drawn, when it turns into classes.
/// </summary>
internal sealed class Looks
{
    private readonly List<string> _looks = [];

    /// <summary>The colour that stands for a look.</summary>
    public OxyColor Of(string look)
    {
        if (!_looks.Contains(look))
        {
            _looks.Add(look);
        }

        return OxyColor.FromRgb(1, 0, (byte)_looks.IndexOf(look));
    }

    /// <summary>The look that a colour stands for.</summary>
    public string Of(OxyColor color) => _looks[color.B];
}
