using RegenTrainer.Core.Stages;

namespace RegenTrainer.Commands;

/// <summary>The points of a run along the dial.</summary>
internal static class DialRaster
{
    /// <summary>More points than this nobody reads.</summary>
    public const int MostPoints = 2000;

    /// <summary>Both ends of the band and the raster between them, counted from the low end.</summary>
    /// <param name="dial">The dial.</param>
    /// <param name="every">Each so many-th raster frequency is taken; 1 unless there would be too many.</param>
    public static IReadOnlyList<double> Points(Dial dial, out int every)
    {
        double steps = (dial.HighHz - dial.LowHz) / dial.StepHz;
        every = (int)Math.Max(1, Math.Ceiling(steps / (MostPoints - 2)));
        int whole = (int)Math.Floor((steps / every) + 1e-9);
        var points = new List<double>(whole + 2);
        for (int k = 0; k <= whole; k++)
        {
            points.Add(Math.Min(dial.LowHz + (k * every * dial.StepHz), dial.HighHz));
        }

        if (dial.HighHz - points[^1] > 1e-9 * dial.HighHz)
        {
            points.Add(dial.HighHz);
        }

        return points;
    }
}
