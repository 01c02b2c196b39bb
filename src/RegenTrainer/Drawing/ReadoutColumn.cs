using RegenTrainer.Core.Readings;

namespace RegenTrainer.Drawing;

/// <summary>The figures beside the response, or why there are none.</summary>
internal static class ReadoutColumn
{
    /// <summary>Columns that the differences to what is pinned take.</summary>
    public const int DifferenceWidth = 11;

    /// <summary>Draws them; every figure stands on the same row whatever the regime.</summary>
    public static void Draw(Canvas canvas, Region region, Reading reading, Reading? pinned) =>
        Draw(canvas, region, reading, pinned, Readout.Of, Ink.Pinned, unchanged: true);

    /// <summary>Draws those that tell most of a change of parts, with what it changed; what it did not has nothing beside it.</summary>
    public static void DrawChange(Canvas canvas, Region region, Reading reading, Reading? before) =>
        Draw(canvas, region, reading, before, Readout.OfChange, Ink.Label, unchanged: false);

    private static void Draw(
        Canvas canvas, Region region, Reading reading, Reading? earlier, Func<Reading, IReadOnlyList<Readout>> readouts, Ink difference, bool unchanged)
    {
        if (reading.TankHz is null)
        {
            canvas.Put(region.Left, region.Top, reading.Reachable ? "no figures" : "out of reach", Ink.Caution, region.Right);
            string why = string.Join("; ", reading.Cautions.Select(caution => caution.Text));
            canvas.PutWrapped(region with { Top = region.Top + 2, Height = region.Height - 2 }, why, Ink.Text);
            return;
        }

        IReadOnlyList<Readout> now = readouts(reading);
        IReadOnlyList<Readout>? then = earlier is null ? null : readouts(earlier);
        int figures = region.Right - (then is null ? 0 : DifferenceWidth);
        for (int k = 0; k < now.Count && k < region.Height; k++)
        {
            int row = region.Top + k;
            canvas.Put(region.Left, row, now[k].Label, Ink.Label, figures);
            canvas.PutBefore(figures, row, now[k].Write(now[k].Value), Ink.Text);
            if (now[k].Value is { } value && then?[k].Value is { } old && (unchanged || value != old))
            {
                canvas.PutBefore(region.Right, row, now[k].WriteDifference(value - old), difference);
            }
        }
    }
}
