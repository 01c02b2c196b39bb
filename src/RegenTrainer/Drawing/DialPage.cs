using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>What page 2 shows beside the stage itself.</summary>
/// <param name="Curves">The runs along the dial; null while the first is on its way.</param>
/// <param name="Working">Whether newer ones are on their way.</param>
/// <param name="Pinned">The runs of what is pinned; null where nothing is, or while they are on their way.</param>
/// <param name="Quantity">Index of the figure the curves show.</param>
/// <param name="Cursor">Index of the point under the cursor.</param>
internal sealed record DialPicture(DialCurves? Curves, bool Working, DialCurves? Pinned, int Quantity, int Cursor);

/// <summary>Page 2: a figure along the whole dial for weak, typical and strong devices, and all figures under the cursor.</summary>
internal static class DialPage
{
    private const int TableWidth = 38;
    private const int ColumnWidth = 8;
    private const int Gap = 2;

    /// <summary>Draws the page.</summary>
    public static void Draw(Canvas canvas, Region region, StageSnapshot stage, DialPicture picture)
    {
        DialQuantity quantity = DialQuantity.All[picture.Quantity];
        canvas.Put(region.Left, region.Top, quantity.Heading + " (Tab: next figure)", Ink.Label, region.Right);
        if (picture.Curves is not { } curves)
        {
            canvas.Put(region.Left, region.Top + 2, "working it out ...", Ink.Label, region.Right);
            return;
        }

        Region plot = PlotRegion(region);
        CurvePlot scales = Scales(curves, picture.Pinned, quantity);
        scales.Draw(canvas, plot, [.. Pinned(canvas.Glyphs, picture.Pinned, quantity), .. curves.Curves.Select(c => Curve(canvas.Glyphs, c, quantity))]);
        Hands(canvas, plot, scales, stage, quantity);
        OutOfReach(canvas, plot, scales, curves.Curves[0].Points);
        CursorLine(canvas, plot, scales, curves.Curves[0].Points[picture.Cursor].DialHz);
        var table = new Region(region.Right - TableWidth, region.Top + 1, TableWidth, region.Height - 1);
        Table(canvas, table, curves, picture);
    }

    /// <summary>The index of the point nearest to a cell of the picture; -1 outside of it.</summary>
    public static int PointAt(Region region, DialPicture picture, int column, int row)
    {
        if (picture.Curves is not { } curves
            || Scales(curves, picture.Pinned, DialQuantity.All[picture.Quantity]).XAt(PlotRegion(region), column, row) is not { } khz)
        {
            return -1;
        }

        IReadOnlyList<DialPoint> points = curves.Curves[0].Points;
        return Enumerable.Range(0, points.Count).MinBy(k => Math.Abs((points[k].DialHz / 1e3) - khz));
    }

    private static Region PlotRegion(Region region) =>
        new(region.Left, region.Top + 1, region.Width - TableWidth - Gap, region.Height - 1);

    private static CurvePlot Scales(DialCurves curves, DialCurves? pinned, DialQuantity quantity)
    {
        IReadOnlyList<DialPoint> points = curves.Curves[0].Points;
        double[] values =
        [
            .. curves.Curves.Concat(pinned is null ? [] : Typical(pinned)).SelectMany(c => c.Points).Select(quantity.Value).OfType<double>(),
        ];
        return new CurvePlot(
            new Axis(points[0].DialHz / 1e3, points[^1].DialHz / 1e3, false), quantity.AxisFor(values), v => Figures.Fixed(v, "0"), v => Figures.Fixed(v, "0.###"), "kHz");
    }

    private static IEnumerable<DialCurve> Typical(DialCurves curves) => curves.Curves.Where(c => c.Grade == Grade.Typical);

    private static IEnumerable<PlotCurve> Pinned(Glyphs glyphs, DialCurves? pinned, DialQuantity quantity) => pinned is null
        ? []
        : Typical(pinned).Select(c => new PlotCurve("pinned", Ink.Pinned, glyphs.Dotted, Points(c, quantity)));

    private static PlotCurve Curve(Glyphs glyphs, DialCurve curve, DialQuantity quantity) => curve.Grade switch
    {
        Grade.Weak => new("weak", Ink.Label, glyphs.Dotted, Points(curve, quantity)),
        Grade.Strong => new("strong", Ink.Edge, glyphs.Dashed, Points(curve, quantity)),
        _ => new("typical", Ink.Response, glyphs.Solid, Points(curve, quantity)),
    };

    private static (double X, double? Y)[] Points(DialCurve curve, DialQuantity quantity) =>
        [.. curve.Points.Select(p => (p.DialHz / 1e3, p.Reachable ? quantity.Value(p) : null))];

    /// <summary>Where the hands are: the dial on the scale, and the travel across the picture where that is what it shows.</summary>
    private static void Hands(Canvas canvas, Region plot, CurvePlot scales, StageSnapshot stage, DialQuantity quantity)
    {
        Region picture = CurvePlot.Picture(plot);
        double khz = stage.Setting.DialHz / 1e3;
        if (khz >= scales.X.From && khz <= scales.X.To)
        {
            canvas.Set(scales.ColumnOf(plot, khz), picture.Bottom, canvas.Glyphs.Marker, Ink.Marker);
        }

        if (quantity.Unit == "%" && stage.Control is not null)
        {
            int row = scales.RowOf(plot, stage.Setting.TravelPercent);
            for (int column = picture.Left; column < picture.Right; column += 4)
            {
                if (canvas[column, row].Grapheme == " ")
                {
                    canvas.Set(column, row, canvas.Glyphs.Rule, Ink.Marker);
                }
            }
        }
    }

    private static void OutOfReach(Canvas canvas, Region plot, CurvePlot scales, IReadOnlyList<DialPoint> points)
    {
        Region picture = CurvePlot.Picture(plot);
        for (int k = 0; k < points.Count; k++)
        {
            if (!points[k].Reachable)
            {
                int from = scales.ColumnOf(plot, points[Math.Max(0, k - 1)].DialHz / 1e3), to = scales.ColumnOf(plot, points[k].DialHz / 1e3);
                for (int column = k == 0 ? to : from + 1; column <= to; column++)
                {
                    canvas.Set(column, picture.Bottom - 1, canvas.Glyphs.Oscillating, Ink.Caution);
                }
            }
        }

        if (points.Any(point => !point.Reachable))
        {
            string words = canvas.Glyphs.Oscillating + " out of the capacitor's reach";
            canvas.PutBefore(picture.Right, picture.Bottom - 2, words, Ink.Caution);
        }
    }

    private static void CursorLine(Canvas canvas, Region plot, CurvePlot scales, double hz)
    {
        Region picture = CurvePlot.Picture(plot);
        int column = scales.ColumnOf(plot, hz / 1e3);
        for (int row = picture.Top; row < picture.Bottom; row++)
        {
            if (canvas[column, row].Grapheme == " ")
            {
                canvas.Set(column, row, canvas.Glyphs.Upright, Ink.Label);
            }
        }
    }

    private static void Table(Canvas canvas, Region region, DialCurves curves, DialPicture picture)
    {
        DialPoint[] points = [.. curves.Curves.Select(c => c.Points[picture.Cursor])];
        int row = region.Top;
        int column = canvas.Put(region.Left, row, "cursor " + Figures.Dial(points[0].DialHz), Ink.Heading, region.Right);
        canvas.Put(column + 1, row++, picture.Working ? "..." : "Enter: dial there", Ink.Label, region.Right);
        if (!points.Any(point => point.Reachable))
        {
            canvas.Put(region.Left, row + 1, "out of the capacitor's reach", Ink.Caution, region.Right);
            return;
        }

        string[] heads = [.. curves.Curves.Select(c => c.Grade.ToString().ToLowerInvariant())];
        PutColumns(canvas, region, row++, "", heads, "", Ink.Label);
        foreach (DialQuantity quantity in DialQuantity.All)
        {
            string[] values = [.. points.Select(point => quantity.Value(point) is { } value ? quantity.Write(value) : Word(point, quantity))];
            PutColumns(canvas, region, row++, quantity.Name, values, quantity.Unit, Ink.Text);
        }

        row = DeadSpots(canvas, region with { Top = row, Height = region.Bottom - row }, curves);
        Against(canvas, region with { Top = row + 1, Height = region.Bottom - row - 1 }, points, curves, picture);
    }

    /// <summary>Where on the dial which device is of no use, and why; returns the row after.</summary>
    private static int DeadSpots(Canvas canvas, Region region, DialCurves curves)
    {
        var spots = curves.Curves.SelectMany(curve => curve.DeadSpots.Select(spot => (spot, curve.Grade))).GroupBy(pair => pair.spot, pair => pair.Grade);
        foreach (IGrouping<DeadSpot, Grade> spot in spots)
        {
            Grade[] grades = [.. spot];
            string who = grades.Length == curves.Curves.Count ? "" : string.Join(", ", grades).ToLowerInvariant() + " ";
            string range = spot.Key.FromHz == spot.Key.ToHz
                ? Figures.Dial(spot.Key.FromHz)
                : $"{Figures.Fixed(spot.Key.FromHz / 1e3, "0")} to {Figures.Dial(spot.Key.ToHz)}";
            int next = canvas.PutWrapped(region, $"{who}{range}: {Words(spot.Key.Reason)}", Ink.Caution);
            region = region with { Top = next, Height = region.Bottom - next };
        }

        return region.Top;
    }

    private static string Words(DeadSpotReason reason) => reason switch
    {
        DeadSpotReason.OutOfReach => "out of reach",
        DeadSpotReason.AlwaysOscillates => "always oscillates",
        DeadSpotReason.OscillatesAtIdle => "oscillates at the idle stop",
        DeadSpotReason.TipsOverBeyondTravel => "tips over beyond the travel",
        DeadSpotReason.NeverTipsOver => "never tips over",
        _ => "cannot be solved",
    };

    /// <summary>Why there is no tip-over, in a word; a dash for other figures.</summary>
    private static string Word(DialPoint point, DialQuantity quantity) => quantity.Unit != "%" ? Figures.None : point.TipOver?.State switch
    {
        Core.Regeneration.TipOverState.Never => "never",
        Core.Regeneration.TipOverState.Always => "always",
        _ => Figures.None,
    };

    /// <summary>What the typical device differs by from what is pinned.</summary>
    private static void Against(Canvas canvas, Region region, DialPoint[] points, DialCurves curves, DialPicture picture)
    {
        if (picture.Pinned is null || Typical(picture.Pinned).FirstOrDefault() is not { } pinned)
        {
            return;
        }

        int typical = curves.Curves.ToList().FindIndex(c => c.Grade == Grade.Typical);
        DialPoint then = pinned.Points.MinBy(p => Math.Abs(p.DialHz - points[typical].DialHz))!;
        int row = region.Top;
        canvas.Put(region.Left, row++, "typical against pinned", Ink.Pinned, region.Right);
        foreach (DialQuantity quantity in DialQuantity.All.Take(DialQuantity.All.Count - 1))
        {
            if (row < region.Bottom && quantity.Value(points[typical]) is { } now && quantity.Value(then) is { } old)
            {
                canvas.Put(region.Left, row, quantity.Name, Ink.Label, region.Right);
                canvas.PutBefore(region.Right, row++, $"{Sign(now - old)}{quantity.Write(Math.Abs(now - old)).TrimStart('+')} {quantity.Unit}", Ink.Pinned);
            }
        }
    }

    private static string Sign(double difference) => difference < 0 ? "\u2212" : "+";

    private static void PutColumns(Canvas canvas, Region region, int row, string label, string[] cells, string unit, Ink ink)
    {
        if (row >= region.Bottom)
        {
            return;
        }

        canvas.Put(region.Left, row, label, Ink.Label, region.Right);
        int end = region.Right - (ColumnWidth * (cells.Length - 1)) - 4;
        foreach (string cell in cells)
        {
            canvas.PutBefore(end, row, cell, ink);
            end += ColumnWidth;
        }

        canvas.PutBefore(region.Right, row, unit, Ink.Label);
    }
}
