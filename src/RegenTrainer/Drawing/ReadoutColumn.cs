using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;

namespace RegenTrainer.Drawing;

/// <summary>The figures beside the response, or why there are none.</summary>
internal static class ReadoutColumn
{
    /// <summary>Draws them; every figure stands on the same row whatever the regime.</summary>
    public static void Draw(Canvas canvas, Region region, Reading reading)
    {
        if (reading.TankHz is null)
        {
            canvas.Put(region.Left, region.Top, reading.Reachable ? "no figures" : "out of reach", Ink.Caution, region.Right);
            string why = string.Join("; ", reading.Cautions.Select(caution => caution.Text));
            canvas.PutWrapped(region with { Top = region.Top + 2, Height = region.Height - 2 }, why, Ink.Text);
            return;
        }

        int row = region.Top;
        foreach ((string label, string figure) in Rows(reading))
        {
            if (row >= region.Bottom)
            {
                return;
            }

            canvas.Put(region.Left, row, label, Ink.Label, region.Right);
            canvas.PutBefore(region.Right, row++, figure, Ink.Text);
        }
    }

    private static IEnumerable<(string Label, string Figure)> Rows(Reading reading)
    {
        yield return ("effective Q", Figures.Q(reading.EffectiveQ));
        yield return ("  regeneration off", Figures.Q(reading.QRegenerationOff));
        yield return ("bandwidth \u22123 dB", Figures.Quantity(reading.BandwidthHz, Unit.Hertz));
        yield return ("stage gain", Figures.Level(reading.StageGainDb));
        yield return ("1 kHz sideband", Sideband(reading, 1000));
        yield return ("3 kHz sideband", Sideband(reading, 3000));
        yield return ("ring time", Figures.Quantity(reading.RingTimeSeconds, Unit.Second));
        yield return ("speech index", reading.SpeechIndex is { } index ? Figures.Fixed(index, "0.00") : Figures.None);
        yield return ("pulled", Figures.Shift(reading.PulledHz));
        yield return ("tank", Figures.Tank(reading.TankHz));
        yield return ("tuning capacitor", Figures.Quantity(reading.TuningFarad, Unit.Farad));
    }

    private static string Sideband(Reading reading, double audioHz)
    {
        foreach (Sideband sideband in reading.Sidebands)
        {
            if (sideband.AudioHz == audioHz)
            {
                return Figures.Level(sideband.AudioDb);
            }
        }

        return Figures.None;
    }
}
