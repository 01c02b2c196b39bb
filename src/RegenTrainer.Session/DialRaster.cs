using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>The points of a run along the dial.</summary>
public static class DialRaster
{
    /// <summary>Both ends of the band and the raster between them, counted from the low end.</summary>
    /// <param name="dial">The dial.</param>
    /// <param name="most">The most points wanted, 3 or more.</param>
    /// <param name="every">Each so many-th raster frequency is taken; 1 unless there would be too many.</param>
    public static IReadOnlyList<double> Points(Dial dial, int most, out int every)
    {
        double steps = (dial.HighHz - dial.LowHz) / dial.StepHz;
        every = (int)Math.Max(1, Math.Ceiling(steps / (most - 2)));
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
