using Auditor.Reports.Pictures;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Model;

/// <summary>A picture, with the words and figures that say the same.</summary>
/// <param name="Id">Its id within the report.</param>
/// <param name="Kind">What kind of picture it is: single-line, margins, voltage-drop, time-current, demand or insulation.</param>
/// <param name="Title">Its title.</param>
/// <param name="Description">What it shows and how to read it.</param>
/// <param name="Svg">The picture as markup.</param>
/// <param name="Table">The figures behind it.</param>
public sealed record ReportPicture(string Id, string Kind, string Title, string Description, Markup Svg, PictureTable Table)
{
    internal static ReportPicture Of(Picture picture) =>
        new(picture.Id, picture.Kind, picture.Title, picture.Description, new Markup(HtmlInk.Narrow(picture.Svg)), picture.Table);
}
