using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Readings;

/// <summary>What the trade would remark on an operating point; every hint is common practice and marked so.</summary>
public static class BiasHints
{
    /// <summary>Less than this across a transistor leaves little swing, and its capacitances grow: common practice.</summary>
    private const double LeastCollectorVolt = 1;

    /// <summary>Below this current a small transistor's speed falls off: common practice.</summary>
    private const double LeastCollectorAmpere = 50e-6;

    /// <summary>A supply that moves tip-over by more than this many percent of travel a tenth of a volt wants steadying: common practice.</summary>
    private const double MostPercentPerTenthVolt = 0.5;

    /// <summary>A kelvin that moves tip-over by more than this many percent of travel keeps the hand on the knob: common practice.</summary>
    private const double MostPercentPerKelvin = 0.1;

    /// <summary>An antenna that drives the stage out of its range below this many volt calls for looser coupling: common practice.</summary>
    private const double LeastAntennaVolt = 10e-3;

    /// <summary>The hints, the most telling first.</summary>
    /// <param name="bias">The operating point.</param>
    /// <param name="headroom">How far the stage can be driven there.</param>
    public static IReadOnlyList<Caution> Of(BiasReading bias, HeadroomReading headroom)
    {
        var hints = new List<Caution>();
        foreach (DeviceBias device in bias.Devices.Where(d => !d.Saturated))
        {
            if (device.CollectorEmitterVolt < LeastCollectorVolt)
            {
                Add("hint-collector-volt", $"{device.Name} has only {QuantityText.Write(device.CollectorEmitterVolt, Unit.Volt)} across it: little swing");
            }

            if (device.CollectorAmpere < LeastCollectorAmpere)
            {
                Add("hint-collector-current", $"{device.Name} draws only {QuantityText.Write(device.CollectorAmpere, Unit.Ampere)}: slow and noisy");
            }
        }

        if (headroom.First is { Level.AntennaVolt: < LeastAntennaVolt and var volt })
        {
            Add("hint-coupling", $"{QuantityText.Write(volt, Unit.Volt)} from the antenna overload it: couple it more loosely");
        }

        if (Math.Abs(bias.PerTenthVolt?.TipOverPercent ?? 0) > MostPercentPerTenthVolt)
        {
            Add("hint-supply", "tip-over follows the battery: steady the supply");
        }

        if (Math.Abs(bias.PerKelvin?.TipOverPercent ?? 0) > MostPercentPerKelvin)
        {
            Add("hint-temperature", "tip-over follows the room: let it warm up before setting it");
        }

        return hints;

        void Add(string code, string text) => hints.Add(new Caution(code, text + " (common practice)"));
    }
}
