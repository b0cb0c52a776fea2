namespace Auditor.Reports.Pictures;

/// <summary>A picture of a report, with the words and figures that say the same.</summary>
/// <param name="Id">Its name in the page: letters, digits and hyphens; every id inside the picture starts with it.</param>
/// <param name="Kind">What kind of picture it is, as its plan says.</param>
/// <param name="Title">Its title.</param>
/// <param name="Description">What it shows and how to read it.</param>
/// <param name="Svg">
/// A complete <c>svg</c> element to stand inside a page, safe whatever the design says. It is an image, or a group where it holds links.
/// Colours come from the classes and custom properties of <c>templates/pictures.css</c> alone:
/// <list type="bullet">
/// <item>properties <c>--ink --paper --muted --grid --band --nonconforming --unproven --undetermined --departed --conforms --series-1 … --series-4</c>;</item>
/// <item>classes, all with the prefix <c>p-</c>: strokes <c>line heavy thin grid faint limit stroke cut dot</c> and their dashes <c>dash dots long close chain chains</c>, areas <c>solid fill band area hollow</c>,
/// texts <c>t s b m e c halo</c> (text, small, bold, muted, ended at, centred at, set off), states <c>nonconforming unproven undetermined departed conforms</c>,
/// series <c>s1 … s4</c>, and <c>picture</c> on the element itself.</item>
/// </list>
/// </param>
/// <param name="Table">The data behind it.</param>
public sealed record Picture(string Id, string Kind, string Title, string Description, string Svg, PictureTable Table);
