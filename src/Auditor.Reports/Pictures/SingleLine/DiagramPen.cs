using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Pictures.Drawing;

namespace Auditor.Reports.Pictures.SingleLine;

/// <summary>Draws the lines of one diagram.</summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to write.</param>
/// <param name="canvas">Where to draw.</param>
/// <param name="columns">Where things stand.</param>
/// <param name="diagramOf">Id of the diagram that draws the circuits of a board.</param>
/// <param name="isOverview">Whether the circuits of boards are left to other diagrams.</param>
internal sealed class DiagramPen(Scene scene, PicturePlan plan, Canvas canvas, Columns columns, Func<DesignSubject, string> diagramOf, bool isOverview)
{
    /// <summary>The symbols of a kind of node that a diagram needs.</summary>
    public IEnumerable<string> SymbolsOf(Item item) => item.Kind switch
    {
        ItemKind.Origin => [plan.Holds(item.Subject, "transformer") ? "transformer" : "incoming", DeviceSymbol(item.Subject), "earth"],
        ItemKind.Board => Chosen(("switch", plan.Holds(item.Subject, "switch")), ("rcd", plan.Holds(item.Subject, "rcd"))),
        ItemKind.Circuit => Chosen(
            (DeviceSymbol(item.Subject), true), ("rcd", plan.Holds(item.Subject, "rcd")), (item.Subject.FedBoard is null ? LoadSymbol(item.Subject) : "load", item.Subject.FedBoard is null || !item.IsOwn)),
        _ => [],
    };

    public void Draw(Item item)
    {
        using var group = item.IsOwn ? canvas.Subject(item.Subject.Key) : canvas.Open("g");
        switch (item.Kind)
        {
            case ItemKind.Origin: Origin(item); break;
            case ItemKind.Bonding: Bonding(item); break;
            case ItemKind.Board: Board(item); break;
            default: Circuit(item); break;
        }
    }

    private static IEnumerable<string> Chosen(params (string Name, bool IsThere)[] symbols) =>
        symbols.Where(symbol => symbol.IsThere).Select(symbol => symbol.Name);

    private void Origin(Item item)
    {
        var (origin, y) = (item.Subject, item.Y);
        canvas.Line(Columns.Trunk, y - 14, Columns.Trunk, y + 58, "line");
        canvas.Use(plan.Holds(origin, "transformer") ? "transformer" : "incoming", Columns.Trunk, y);
        using (canvas.Open("g", ("transform", $"translate({Canvas.N(Columns.Trunk)} {Canvas.N(y + 36)})rotate(90)")))
        {
            canvas.Use(DeviceSymbol(origin), 0, 0);
        }

        canvas.Text(56, y - 4, "Origin", "t b");
        canvas.TextWithin(56, y + 11, plan.Known(origin, "text", " · "), "s m", columns.Badge - 76);
        canvas.TextWithin(56, y + 40, plan.Known(origin, "device-text"), "s", 190);
        Badge(item.Subject, y);
        canvas.Use("earth", 64, y + 58);
        canvas.Text(82, y + 68, plan.Holds(origin, "electrode") ? "main earthing terminal, earth electrode of the installation" : "main earthing terminal", "s m");
    }

    private void Bonding(Item item)
    {
        canvas.Path($"M64 {Canvas.N(item.Y - 26)}V{Canvas.N(item.Y)}H104", "line");
        canvas.TextWithin(112, item.Y + 4, "to " + Texts.OwnId(item.Subject), "t", 190);
        canvas.TextWithin(310, item.Y + 4, plan.Known(item.Subject, "text", " · "), "s m", columns.Badge - 330);
        Badge(item.Subject, item.Y, isFlat: true);
    }

    private void Board(Item item)
    {
        var (board, y, bus) = (item.Subject, item.Y, Columns.Bus(item.Depth));
        var isNested = item.Depth > 0;
        var (device, ring, words) = isNested ? (Columns.Device(item.Depth), Columns.Rcd(item.Depth), Columns.Cable(item.Depth)) : (46d, 76d, bus + 12);
        var far = isNested ? columns.Load : Columns.Trunk;
        var hasSwitch = plan.Holds(board, "switch");
        if (hasSwitch)
        {
            canvas.Line(Math.Min(bus, far), y, device - 15, y, "line");
            canvas.Line(device + 15, y, Math.Max(bus, far), y, "line");
            canvas.Use("switch", device, y);
        }
        else
        {
            canvas.Line(bus, y, far, y, "line");
        }

        var residual = plan.Holds(board, "rcd") ? plan.Known(board, "rcd-text") : "";
        if (plan.Holds(board, "rcd"))
        {
            canvas.Use("rcd", ring, y);
            canvas.TextWithin(ring, y + 17, isNested ? residual : "", "s c", 62);
        }

        var room = columns.Load - words - 12;
        canvas.TextWithin(words, y - 5, Scene.Label(board), "t b", room);
        var feeder = !isNested && board.Parent!.Parent is not null ? $"fed from {board.Parent.Key}" : "";
        var said = new[] { feeder, plan.Known(board, "text", " · "), isNested || residual.Length == 0 ? "" : "RCD " + residual };
        canvas.TextWithin(words, y + 12, string.Join(" · ", said.Where(text => text.Length > 0)), "s m", room);
        canvas.TextWithin(device - 15, y + 17, hasSwitch ? plan.Known(board, "switch-text") : "", "s m", 44);
        if (item.IsOwn)
        {
            Badge(board, y);
        }
        else if (isOverview)
        {
            Inside(board, y);
        }
    }

    /// <summary>What a board holds that another diagram draws.</summary>
    private void Inside(DesignSubject board, double y)
    {
        var circuits = scene.CircuitsOf[board].ToArray();
        var standing = Standing.Of([.. circuits.Prepend(board).SelectMany(scene.FindingsOf)]);
        using (canvas.Link(diagramOf(board), $"Board {board.Key}: its diagram"))
        {
            canvas.Text(columns.Load + 12, y - 2, circuits.Length == 1 ? "1 circuit" : $"{circuits.Length} circuits", "t");
            canvas.TextWithin(columns.Load + 12, y + 12, $"findings: {standing.NotMet} not met, {standing.Open} open", "s m", columns.LoadRoom);
        }

        Badge(standing, $"Board {board.Key} and its circuits", y, isFlat: false);
    }

    private void Circuit(Item item)
    {
        var (circuit, y, bus) = (item.Subject, item.Y, Columns.Bus(item.Depth));
        var (device, ring, cable) = (Columns.Device(item.Depth), Columns.Rcd(item.Depth), Columns.Cable(item.Depth));
        canvas.Line(bus, y, device - 15, y, "line");
        canvas.Use(DeviceSymbol(circuit), device, y);
        canvas.TextWithin(bus + 6, y - 4, Texts.OwnId(circuit), "t b", 50);
        canvas.TextWithin(bus + 6, y + 12, plan.Word(circuit, "line") ?? "", "s m", 56);
        canvas.TextWithin(device, y + 17, plan.Known(circuit, "device-text"), "s c", 58);
        if (plan.Holds(circuit, "rcd"))
        {
            canvas.Use("rcd", ring, y);
            canvas.Path($"M{Canvas.N(ring)} {Canvas.N(y - 8)}V{Canvas.N(y - 13)}H{Canvas.N(device + 2)}V{Canvas.N(y - 5)}", "thin dash");
            canvas.TextWithin(ring, y + 17, plan.Known(circuit, "rcd-text"), "s c", 62);
        }

        canvas.Line(device + 15, y, cable, y, "line");
        Cable(item, cable);
        Load(item);
        if (item.IsOwn)
        {
            Badge(circuit, y);
        }
    }

    private void Cable(Item item, double from)
    {
        var legs = item.Subject.Legs;
        var shown = legs.Count > 3 ? 3 : legs.Count;
        if (shown == 0)
        {
            canvas.Line(from, item.Y, columns.Load, item.Y, "line");
            return;
        }

        var step = (columns.Load - from) / shown;
        for (var i = 0; i < legs.Count; i++)
        {
            using var group = item.IsOwn ? canvas.Subject(legs[i].Key) : canvas.Open("g");
            if (i >= shown)
            {
                continue;
            }

            var x = from + (i * step);
            canvas.Line(x, item.Y, x + step, item.Y, "line");
            if (i > 0)
            {
                canvas.Line(x, item.Y - 4, x, item.Y + 4, "line");
            }

            var more = i == shown - 1 && legs.Count > shown ? $", and {legs.Count - shown} more" : "";
            canvas.TextWithin(x + 6, item.Y - 4, plan.Known(legs[i], "text", ", ") + more, "s", step - 12);
            canvas.TextWithin(x + 6, item.Y + 13, plan.Known(legs[i], "note", ", "), "s m", step - 12);
        }
    }

    private void Load(Item item)
    {
        var (circuit, y) = (item.Subject, item.Y);
        var x = columns.Load + (circuit.FedBoard is not null && item.IsOwn ? 12 : 28);
        var name = Scene.Name(circuit);
        if (circuit.FedBoard is { } fed)
        {
            var words = $"to {fed.Key}" + (name.Length > 0 ? $", {name}" : "");
            if (item.IsOwn)
            {
                canvas.Line(columns.Load, y, columns.Load, y + Layout.RowHeight, "line");
                canvas.TextWithin(x, y - 2, words, "t", columns.LoadRoom);
            }
            else
            {
                using var link = canvas.Link(diagramOf(fed), $"{circuit.Key} feeds board {fed.Key}: its diagram");
                canvas.Use("load", columns.Load, y);
                canvas.TextWithin(x, y - 2, words, "t", columns.LoadRoom);
            }
        }
        else
        {
            canvas.Use(LoadSymbol(circuit), columns.Load, y);
            canvas.TextWithin(x, y - 2, name, "t", columns.LoadRoom);
        }

        canvas.TextWithin(x, y + 12, plan.Known(circuit, "text", " · "), "s m", columns.LoadRoom);
    }

    private void Badge(DesignSubject subject, double y, bool isFlat = false) => Badge(scene.StandingOf(subject), Scene.Label(subject), y, isFlat);

    private void Badge(Standing standing, string label, double y, bool isFlat)
    {
        var (x, room) = (columns.Badge, columns.BadgeRoom);
        if (standing.Lead is not { } lead)
        {
            canvas.Text(x + 14, y + 4, standing.Headline, "s m");
            return;
        }

        using var link = canvas.Link(Anchor.Of(lead.Key), $"{label}: {lead.VerdictText}, {standing.Headline}, {standing.Topic}");
        canvas.Use(Standing.Mark(lead), x, y);
        canvas.Text(x + 14, isFlat ? y + 4 : y - 2, standing.Headline, "t b");
        var after = Canvas.WidthOf(standing.Headline, "t b") + 6;
        if (isFlat)
        {
            canvas.TextWithin(x + 14 + after, y + 4, standing.Topic, "s m", room - after);
        }
        else
        {
            canvas.TextWithin(x + 14 + after, y - 2, standing.Least, "s m", room - after);
            canvas.TextWithin(x + 14, y + 12, standing.Topic, "s m", room);
        }
    }

    private string DeviceSymbol(DesignSubject subject) => Symbol("device-symbols", [plan.Word(subject, "device") ?? ""]) ?? "circuit-breaker";

    private string LoadSymbol(DesignSubject circuit) => plan.Holds(circuit, "source")
        ? "generator"
        : Symbol("load-symbols", plan.Words(circuit, "load")) ?? "load";

    /// <summary>The symbol of the first word that the plan lists, else that of `other`.</summary>
    private string? Symbol(string list, IEnumerable<string> words)
    {
        var symbols = (Documents.MappingNode)plan.Settings.Find(list)!;
        return words.Append("other").Select(word => (symbols.Find(word) as Documents.ScalarNode)?.Text).FirstOrDefault(symbol => symbol is not null);
    }
}
