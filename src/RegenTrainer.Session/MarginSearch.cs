using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>Finds the travel that stands a wanted margin below tip-over, by halving over readings.</summary>
public static class MarginSearch
{
    /// <summary>The travel is found in hundredths of a percent.</summary>
    private const int PlacesInPercent = 100;

    /// <summary>
    /// The largest travel below the tip-over that leaves at least the wanted margin. The tip-over is the next one upward of the
    /// travel now, or the first where there is none.
    /// </summary>
    /// <param name="solver">The stage.</param>
    /// <param name="setting">The setting.</param>
    /// <param name="reading">The reading there.</param>
    /// <param name="marginDb">Loop gain left in dB, above 0.</param>
    /// <param name="why">Why there is no such travel; empty where there is.</param>
    /// <returns>The travel in %, or null.</returns>
    public static double? Find(IStageSolver solver, Setting setting, Reading reading, double marginDb, out string why)
    {
        if (Stretch(reading, setting.TravelPercent, out why) is not { } stretch)
        {
            return null;
        }

        int low = (int)Math.Ceiling(stretch.From * PlacesInPercent), high = (int)Math.Ceiling(stretch.To * PlacesInPercent);
        if (!Leaves(solver, setting, low, marginDb))
        {
            why = $"less than {marginDb:0.0} dB is left everywhere below this tip-over";
            return null;
        }

        while (high - low > 1)
        {
            int middle = (low + high) / 2;
            if (Leaves(solver, setting, middle, marginDb))
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return low / (double)PlacesInPercent;
    }

    private static (double From, double To)? Stretch(Reading reading, double travelPercent, out string why)
    {
        why = reading.TipOver?.State switch
        {
            null => "the tip-over is not known here",
            TipOverState.Never => "this stage never tips over",
            TipOverState.Always => "this stage oscillates along the whole travel",
            _ => "",
        };
        IReadOnlyList<Crossing> crossings = reading.TipOver?.Crossings ?? [];
        int at = -1;
        for (int k = 0; k < crossings.Count && (at < 0 || crossings[at].TravelPercent < travelPercent); k++)
        {
            at = crossings[k].Upward && (at < 0 || crossings[k].TravelPercent >= travelPercent) ? k : at;
        }

        if (at < 0)
        {
            why = why.Length > 0 ? why : "this stage only stops oscillating along the travel";
            return null;
        }

        return (at > 0 ? crossings[at - 1].TravelPercent : 0, crossings[at].TravelPercent);
    }

    /// <summary>Where the device gives less than it takes there is no margin in dB: the tip-over is far.</summary>
    private static bool Leaves(IStageSolver solver, Setting setting, int place, double marginDb)
    {
        Reading there = solver.Read(setting with { TravelPercent = place / (double)PlacesInPercent });
        return there.GrowthPerSecond < 0 && (there.MarginDb is not { } left || left >= marginDb);
    }
}
