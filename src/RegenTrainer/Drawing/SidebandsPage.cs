using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>What page 3 shows beside the stage itself.</summary>
/// <param name="Curve">Both sidebands and what is heard, upward in audio frequency; empty where there is no response.</param>
/// <param name="Pinned">The same of what is pinned; empty where nothing is.</param>
/// <param name="Interaction">How regeneration, dial and station act on each other.</param>
internal sealed record SidebandsPicture(IReadOnlyList<Sideband> Curve, IReadOnlyList<Sideband> Pinned, Interaction Interaction);

/// <summary>Page 3: what the selectivity leaves of the programme at each audio frequency, and how the stage behaves under the hands.</summary>
internal static class SidebandsPage
{
    /// <summary>Ends of the audio scale in Hz.</summary>
    public const double LowestHz = 50;

    /// <summary>Ends of the audio scale in Hz.</summary>
    public const double HighestHz = 10_000;

    private const int TableWidth = 38;
    private const int Gap = 2;

    /// <summary>The scales in dB there are: the first that holds the curves is taken.</summary>
    private static readonly int[] _depthsDb = [20, 40, 60, 80];

    /// <summary>Draws the page.</summary>
    public static void Draw(Canvas canvas, Region region, StageSnapshot stage, SidebandsPicture picture)
    {
        canvas.Put(region.Left, region.Top, "sidebands against the carrier, dB over audio frequency", Ink.Label, region.Right);
        var plot = new Region(region.Left, region.Top + 1, region.Width - TableWidth - Gap, region.Height - 1);
        if (picture.Curve.Count > 1)
        {
            Plot(canvas, plot, picture);
        }
        else
        {
            string why = stage.Reading.GrowthPerSecond > 0 ? "none: the stage oscillates" : stage.Reading.Reachable ? "none at this setting" : "none: out of reach";
            canvas.Put(plot.Left, plot.Top + 1, why, Ink.Text, plot.Right);
        }

        var table = new Region(region.Right - TableWidth, region.Top + 1, TableWidth, region.Height - 1);
        Table(canvas, table, stage, picture.Interaction);
    }

    private static void Plot(Canvas canvas, Region region, SidebandsPicture picture)
    {
        double lowest = picture.Curve.Concat(picture.Pinned).Min(s => Math.Min(s.AudioDb, Math.Min(s.LowerDb, s.UpperDb)));
        double highest = Math.Max(0, picture.Curve.Concat(picture.Pinned).Max(s => Math.Max(s.AudioDb, Math.Max(s.LowerDb, s.UpperDb))));
        int depth = Array.Find(_depthsDb, d => lowest >= -d) is > 0 and var found ? found : _depthsDb[^1];
        double top = highest > 0.05 ? Math.Ceiling(highest / 10) * 10 : 0;
        var scales = new CurvePlot(
            new Axis(LowestHz, HighestHz, true),
            new Axis(-depth, top, false),
            v => v >= 1000 ? Figures.Fixed(v / 1000, "0") + "k" : Figures.Fixed(v, "0"),
            v => Figures.Signed(v, "0"),
            "Hz");
        Glyphs glyphs = canvas.Glyphs;
        List<PlotCurve> curves = [];
        if (picture.Pinned.Count > 0)
        {
            curves.Add(Curve("pinned", Ink.Pinned, glyphs.Dotted, picture.Pinned, s => s.AudioDb));
        }

        curves.Add(Curve("lower", Ink.Label, glyphs.Dotted, picture.Curve, s => s.LowerDb));
        curves.Add(Curve("upper", Ink.Sidebands, glyphs.Dashed, picture.Curve, s => s.UpperDb));
        curves.Add(Curve("heard", Ink.Response, glyphs.Solid, picture.Curve, s => s.AudioDb));
        scales.Draw(canvas, region, curves);
    }

    private static PlotCurve Curve(string name, Ink ink, Stroke stroke, IReadOnlyList<Sideband> curve, Func<Sideband, double> value) =>
        new(name, ink, stroke, [.. curve.Select(s => (s.AudioHz, (double?)value(s)))]);

    private static void Table(Canvas canvas, Region region, StageSnapshot stage, Interaction interaction)
    {
        Reading reading = stage.Reading;
        int row = region.Top;
        Columns(canvas, region, row++, "audio", ["lower", "upper", "heard"], Ink.Label);
        foreach (Sideband s in reading.Sidebands)
        {
            string[] cells = [Figures.Level(s.LowerDb), Figures.Level(s.UpperDb), Figures.Level(s.AudioDb)];
            Columns(canvas, region, row++, QuantityText.Write(s.AudioHz, Unit.Hertz), cells, Ink.Text);
        }

        (double? db3, double? db6, double? db10) = reading.AudioDownHz;
        Line("3, 6, 10 dB down", $"{Down(db3)}, {Down(db6)}, {Down(db10)} Hz");
        Line("speech index", reading.SpeechIndex is { } index ? Figures.Fixed(index, "0.00") : Figures.None);
        foreach (Neighbour[] pair in stage.Neighbours.GroupBy(n => Math.Abs(n.OffsetHz)).OrderBy(g => g.Key).Select(g => g.OrderBy(n => n.OffsetHz).ToArray()))
        {
            string levels = string.Join(", ", pair.Select(n => Figures.Signed(n.RelativeDb, "0.0")));
            Line($"neighbours \u00b1{Figures.Fixed(Math.Abs(pair[0].OffsetHz) / 1e3, "0.##")} kHz", levels + " dB");
        }

        if (interaction.Approach is { } approach)
        {
            Line(approach.FromStop ? "from stop to tip-over pulls" : "last 10 % of travel pulls", Figures.Shift(approach.PullHz));
            string degrees = approach.RepeakDegrees is { } angle ? $", {Figures.Signed(angle, "0.000")}\u00b0" : "";
            Line("re-peaking takes", Figures.Difference(approach.RepeakFarad, Unit.Farad) + degrees);
        }

        if (interaction.BandwidthDialDegrees is { } span && interaction.VernierRatio is { } ratio)
        {
            string wanted = ratio > 1 ? $", vernier {QuantityText.Write(ratio, Unit.None, 2)}:1" : ", no vernier";
            Line("bandwidth on dial", Figures.Fixed(span, "0.000") + "\u00b0" + wanted);
        }

        Line("hand of 0.1 pF shifts", Figures.Shift(interaction.HandShiftHz ?? reading.HandShiftHz));
        if (interaction.Station is { } station)
        {
            Line("station off", $"{Figures.Shift(station.OffsetHz)}, carrier {Figures.Signed(station.CarrierLossDb, "0.0")} dB");
            if (station.Audio.Count > 0)
            {
                OffTuneAudio worst = station.Audio.MaxBy(audio => audio.SecondHarmonicPercent);
                string harmonic = $"{QuantityText.Write(worst.SecondHarmonicPercent, Unit.None, 2)} % of {QuantityText.Write(worst.AudioHz, Unit.Hertz)}";
                Line("worst second harmonic", worst.SecondHarmonicPercent < 0.05 ? "none" : harmonic);
            }
        }

        void Line(string label, string figure)
        {
            if (row < region.Bottom)
            {
                canvas.Put(region.Left, row, label, Ink.Label, region.Right);
                canvas.PutBefore(region.Right, row++, figure, Ink.Text);
            }
        }
    }

    private static string Down(double? hz) => hz is { } value ? Figures.Fixed(value, "0") : Figures.None;

    private static void Columns(Canvas canvas, Region region, int row, string label, string[] cells, Ink ink)
    {
        canvas.Put(region.Left, row, label, Ink.Label, region.Right);
        int end = region.Right - (10 * (cells.Length - 1));
        foreach (string cell in cells)
        {
            canvas.PutBefore(end, row, cell, ink);
            end += 10;
        }
    }
}
