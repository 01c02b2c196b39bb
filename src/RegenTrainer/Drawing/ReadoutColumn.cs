using RegenTrainer.Core.Readings;

namespace RegenTrainer.Drawing;

/// <summary>The figures beside the response, or why there are none.</summary>
internal static class ReadoutColumn
{
    /// <summary>Columns that the differences to what is pinned take.</summary>
    public const int DifferenceWidth = 11;

    /// <summary>Draws them; every figure stands on the same row whatever the regime.</summary>
    public static void Draw(Canvas canvas, Region region, Reading reading, Reading? pinned)
    {
        if (reading.TankHz is null)
        {
            canvas.Put(region.Left, region.Top, reading.Reachable ? "no figures" : "out of reach", Ink.Caution, region.Right);
            string why = string.Join("; ", reading.Cautions.Select(caution => caution.Text));
            canvas.PutWrapped(region with { Top = region.Top + 2, Height = region.Height - 2 }, why, Ink.Text);
            return;
        }

        IReadOnlyList<Readout> now = Readout.Of(reading);
        IReadOnlyList<Readout>? then = pinned is null ? null : Readout.Of(pinned);
        int figures = region.Right - (then is null ? 0 : DifferenceWidth);
        for (int k = 0; k < now.Count && k < region.Height; k++)
        {
            int row = region.Top + k;
            canvas.Put(region.Left, row, now[k].Label, Ink.Label, figures);
            canvas.PutBefore(figures, row, now[k].Write(now[k].Value), Ink.Text);
            if (now[k].Value is { } value && then?[k].Value is { } old)
            {
                canvas.PutBefore(region.Right, row, now[k].WriteDifference(value - old), Ink.Pinned);
            }
        }
    }
}
