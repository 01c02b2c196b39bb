using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>The response around the station, with the span of the programme's sidebands shaded beneath.</summary>
internal static class ResponsePlot
{
    /// <summary>Columns of the scale in dB.</summary>
    public const int ScaleWidth = 6;

    /// <summary>Rows beside the curve itself: heading, neighbours, rule and scale in kHz.</summary>
    private const int OtherRows = 4;

    /// <summary>The caution that names the frequency where it is not the tank that oscillates.</summary>
    private const string OtherCircuitCode = "other-circuit-oscillates";

    /// <summary>Narrower plots have shorter words.</summary>
    private const int FullFrom = 42;

    /// <summary>The scale divides into eighths of its span.</summary>
    private const int ColumnParts = 8;

    private const double SpanKhz = LiveStage.HalfSpanHz / 1000;

    /// <summary>The scales in dB below the peak there are: the first that holds the curve is taken.</summary>
    private static readonly int[] _depthsDb = [40, 60, 80, 100, 120];

    /// <summary>Evenly spaced points of the response that a plot of this width can show.</summary>
    public static int PointsFor(Region region, Glyphs glyphs) => Math.Max(2, (region.Width - ScaleWidth) * glyphs.DotsAcross);

    /// <summary>The largest width up to <paramref name="room"/> at which the station, its neighbours and its channel's ends stand in columns of their own.</summary>
    public static int EvenWidth(int room) => room - ((room - ScaleWidth - 1) % ColumnParts);

    /// <summary>How far from the station a cell lies, in Hz; null outside of the picture.</summary>
    public static double? OffsetAt(Region region, int column, int row)
    {
        var plot = Picture(region);
        return column >= plot.Left && column < plot.Right && row >= plot.Top && row <= plot.Bottom
            ? (((column - plot.Left) / (double)(plot.Width - 1) * 2) - 1) * LiveStage.HalfSpanHz
            : null;
    }

    /// <summary>Draws it over the curves of what the stage is compared with, each about its own station.</summary>
    /// <param name="canvas">The screen.</param>
    /// <param name="region">The region.</param>
    /// <param name="stage">The stage.</param>
    /// <param name="compared">What it is compared with.</param>
    /// <param name="bare">Without heading and neighbours, and with the scale in the rule: where rows are few.</param>
    public static void Draw(Canvas canvas, Region region, StageSnapshot stage, in Compared compared, bool bare = false)
    {
        if (!bare)
        {
            string heading = region.Width >= FullFrom ? "response, \u00b120 kHz around the station" : "\u00b120 kHz around the station";
            canvas.Put(region.Left, region.Top, heading, Ink.Label, region.Right);
        }

        if (stage.Curve.Count < 2)
        {
            NoResponse(canvas, bare ? region : region with { Top = region.Top + 2, Height = region.Height - 2 }, stage);
            return;
        }

        Region plot = bare ? new(region.Left + ScaleWidth, region.Top, region.Width - ScaleWidth, region.Height - 1) : Picture(region);
        double stationHz = stage.Reading.Setting.StationHz;
        double peakDb = compared.Earlier.Select(earlier => earlier.Stage).Append(stage).SelectMany(s => s.Curve).Max(point => point.GainDb);
        double lowestDb = stage.Curve.Min(point => point.GainDb) - peakDb;
        int depth = Array.Find(_depthsDb, d => lowestDb >= -d) is > 0 and var found ? found : _depthsDb[^1];
        var grid = new DotGrid(plot.Width, plot.Height, canvas.Glyphs);
        double ToX(double offsetHz) => (offsetHz + LiveStage.HalfSpanHz) / (2 * LiveStage.HalfSpanHz) * (grid.Width - 1);
        double ToY(double db) => Math.Clamp((peakDb - db) / depth, -1, 2) * (grid.Height - 1);
        for (int k = 1; k < stage.Curve.Count; k++)
        {
            (ResponsePoint a, ResponsePoint b) = (stage.Curve[k - 1], stage.Curve[k]);
            grid.Line(ToX(a.FrequencyHz - stationHz), ToY(a.GainDb), ToX(b.FrequencyHz - stationHz), ToY(b.GainDb));
        }

        Shade(canvas, plot, grid, stage.Dial.StepHz / 2);
        foreach ((StageSnapshot earlier, Ink ink) in compared.Earlier)
        {
            var dotted = new DotGrid(plot.Width, plot.Height, canvas.Glyphs);
            double center = earlier.Reading.Setting.StationHz;
            dotted.Line(earlier.Curve.Select(point => (ToX(point.FrequencyHz - center), ToY(point.GainDb))), canvas.Glyphs.Dotted);
            dotted.CopyTo(canvas, plot.Left, plot.Top, ink);
        }

        grid.CopyTo(canvas, plot.Left, plot.Top, Ink.Response);
        DecibelScale(canvas, region.Left, plot, depth);
        KilohertzScale(canvas, plot, bare ? plot.Bottom : plot.Bottom + 1);
        if (!bare)
        {
            Neighbours(canvas, region, plot, grid, stage);
        }
    }

    private static Region Picture(Region region) =>
        new(region.Left + ScaleWidth, region.Top + 2, region.Width - ScaleWidth, region.Height - OtherRows);

    /// <summary>The column of a distance from the station.</summary>
    internal static int ColumnOf(Region plot, double offsetHz) =>
        plot.Left + (int)Math.Round((offsetHz + LiveStage.HalfSpanHz) / (2 * LiveStage.HalfSpanHz) * (plot.Width - 1), MidpointRounding.AwayFromZero);

    /// <summary>The programme reaches half the raster to either side of its carrier (common practice of the channel raster).</summary>
    private static void Shade(Canvas canvas, Region plot, DotGrid grid, double halfChannelHz)
    {
        for (int column = ColumnOf(plot, -halfChannelHz); column <= ColumnOf(plot, halfChannelHz); column++)
        {
            for (int row = grid.TopOf(column - plot.Left) + 1; row < plot.Height; row++)
            {
                canvas.Set(column, plot.Top + row, canvas.Glyphs.Shade, Ink.Sidebands);
            }
        }
    }

    private static void DecibelScale(Canvas canvas, int left, Region plot, int depth)
    {
        for (int db = 0; db <= depth; db += 20)
        {
            int row = plot.Top + (int)Math.Round((plot.Height - 1) * db / (double)depth);
            canvas.PutBefore(left + ScaleWidth - 1, row, db == 0 ? "dB 0" : Figures.Fixed(-db, "0"), Ink.Label);
        }
    }

    private static void KilohertzScale(Canvas canvas, Region plot, int labels)
    {
        for (int column = plot.Left; column < plot.Right; column++)
        {
            canvas.Set(column, plot.Bottom, canvas.Glyphs.Rule, Ink.Label);
        }

        for (double khz = -SpanKhz; khz <= SpanKhz; khz += SpanKhz / 2)
        {
            int column = ColumnOf(plot, khz * 1000);
            canvas.Set(column, plot.Bottom, canvas.Glyphs.Tick, Ink.Label);
            string label = Figures.Signed(khz, "0");
            if (khz == SpanKhz)
            {
                canvas.PutBefore(plot.Right, labels, label + " kHz", Ink.Label);
            }
            else if (khz != SpanKhz / 2 || plot.Width + ScaleWidth >= FullFrom)
            {
                canvas.Put(column - (khz == -SpanKhz ? 0 : label.Length / 2), labels, label, Ink.Label);
            }
        }
    }

    /// <summary>How much of the next channels is heard, and where they lie on the curve.</summary>
    private static void Neighbours(Canvas canvas, Region region, Region plot, DotGrid grid, StageSnapshot stage)
    {
        var next = stage.Neighbours.Where(n => Math.Abs(Math.Abs(n.OffsetHz) - stage.Dial.StepHz) < 1).ToList();
        if (next.Count == 0)
        {
            return;
        }

        string words = string.Join(", ", next.Select(n => $"{Figures.Signed(n.OffsetHz / 1000, "0.##")} kHz {Figures.Level(n.RelativeDb)}"));
        if (region.Width < FullFrom)
        {
            words = string.Join(", ", next.Select(n => Figures.Signed(n.RelativeDb, "0"))) + " dB";
        }

        canvas.Put(region.Left, region.Top + 1, "o neighbours " + words, Ink.Text, region.Right);
        foreach (Neighbour neighbour in next.Where(n => Math.Abs(n.OffsetHz) < LiveStage.HalfSpanHz))
        {
            int column = ColumnOf(plot, neighbour.OffsetHz);
            int row = grid.TopOf(column - plot.Left);
            if (row < plot.Height)
            {
                canvas.Set(column, plot.Top + row, "o", Ink.Text);
            }
        }
    }

    private static void NoResponse(Canvas canvas, Region region, StageSnapshot stage)
    {
        if (stage.Reading is { GrowthPerSecond: > 0 and var growth, TankHz: { } hz })
        {
            string heading = region.Width >= FullFrom ? "no response is drawn: the stage oscillates" : "no response: the stage oscillates";
            canvas.Put(region.Left, region.Top, heading, Ink.Oscillating, region.Right);
            string where = stage.Reading.Cautions.FirstOrDefault(c => c.Code == OtherCircuitCode)?.Text ?? $"at {Figures.Tank(hz)}, as it begins";
            canvas.Put(region.Left, region.Top + 2, where, Ink.Text, region.Right);
            string time = Figures.Quantity(1 / growth, Unit.Second);
            canvas.Put(region.Left, region.Top + 3, $"the amplitude grows to 2.72 times in {time}", Ink.Text, region.Right);
            return;
        }

        string words = stage.Reading.TankHz is null ? "no response: no tank is found at this setting" : "no response: it could not be solved here";
        canvas.PutWrapped(region, stage.Reading.Reachable ? words : "no response: the dial is out of the capacitor's reach", Ink.Text);
    }
}
