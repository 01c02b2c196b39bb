using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>Steps of the hands, so made that many small ones add up exactly.</summary>
public static class Steps
{
    /// <summary>The finest step of the travel: thousandths of a percent in one percent.</summary>
    public const int ThousandthsInPercent = 1000;

    private const int FullTravel = 100 * ThousandthsInPercent;

    /// <summary>A frequency this fraction of a step away from the raster counts as on it.</summary>
    private const double OnRaster = 1e-6;

    /// <summary>The travel in % after a step, kept between the stops.</summary>
    /// <param name="travelPercent">Travel now, 0 to 100 %.</param>
    /// <param name="thousandths">Thousandths of a percent, either sign.</param>
    public static double Travel(double travelPercent, int thousandths) =>
        Math.Clamp((int)Math.Round(travelPercent * ThousandthsInPercent) + thousandths, 0, FullTravel) / (double)ThousandthsInPercent;

    /// <summary>The next channel of the raster above or below a frequency, in Hz.</summary>
    /// <param name="hz">Frequency in Hz.</param>
    /// <param name="rasterHz">Distance of the channels in Hz, above 0; the raster counts from 0 Hz.</param>
    /// <param name="up">Upward or downward.</param>
    public static double Channel(double hz, double rasterHz, bool up)
    {
        double channel = hz / rasterHz;
        return rasterHz * (up ? Math.Floor(channel + OnRaster) + 1 : Math.Ceiling(channel - OnRaster) - 1);
    }

    /// <summary>The raster frequency nearest to the geometric mean of the band's ends, in Hz.</summary>
    /// <param name="dial">The dial.</param>
    public static double MiddleOfBand(Dial dial)
    {
        double steps = Math.Round((Math.Sqrt(dial.LowHz * dial.HighHz) - dial.LowHz) / dial.StepHz);
        return Math.Min(dial.LowHz + (steps * dial.StepHz), dial.HighHz);
    }

    /// <summary>A voltage one tenth of a volt up or down, on whole tenths.</summary>
    /// <param name="volt">Voltage in volt.</param>
    /// <param name="up">Upward or downward.</param>
    public static double TenthOfVolt(double volt, bool up) => (Math.Round(volt * 10) + (up ? 1 : -1)) / 10;
}
