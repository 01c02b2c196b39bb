using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>Compares every figure of two readings.</summary>
internal static class ReadingComparison
{
    /// <summary>Asserts equality to 1e-9 relative, with capacitances and resistances of the second scaled.</summary>
    public static void AssertSame(Reading a, Reading b, double farads = 1, double ohms = 1, double relative = 1e-9)
    {
        Assert.Equal(a.Reachable, b.Reachable);
        Assert.Equal(a.Regime, b.Regime);
        Assert.Equal(a.Parasitic, b.Parasitic);
        (string Name, double? A, double? B)[] figures =
        [
            ("tuning", a.TuningFarad * farads, b.TuningFarad), ("control", a.ControlValue * ohms, b.ControlValue), ("Q", a.EffectiveQ, b.EffectiveQ),
            ("Q off", a.QRegenerationOff, b.QRegenerationOff), ("Q idle", a.QAtIdleStop, b.QAtIdleStop), ("bandwidth", a.BandwidthHz, b.BandwidthHz),
            ("tank", a.TankHz, b.TankHz), ("growth", a.GrowthPerSecond, b.GrowthPerSecond), ("gain", a.StageGainDb, b.StageGainDb),
            ("ring", a.RingTimeSeconds, b.RingTimeSeconds), ("margin", a.MarginDb, b.MarginDb), ("margin %", a.MarginPercent, b.MarginPercent),
            ("margin degrees", a.MarginDegrees, b.MarginDegrees), ("device margin", a.DeviceMarginDb, b.DeviceMarginDb),
            ("speech", a.SpeechIndex, b.SpeechIndex), ("3 dB", a.AudioDownHz.Db3, b.AudioDownHz.Db3), ("6 dB", a.AudioDownHz.Db6, b.AudioDownHz.Db6),
            ("10 dB", a.AudioDownHz.Db10, b.AudioDownHz.Db10), ("dial degrees", a.BandwidthDialDegrees, b.BandwidthDialDegrees),
            ("tip-over", a.TipOver?.First?.TravelPercent, b.TipOver?.First?.TravelPercent),
            ("tip-over value", a.TipOver?.First?.Value * ohms, b.TipOver?.First?.Value),
            ("strays", a.StrayModes.Count, b.StrayModes.Count),
        ];
        foreach ((string name, double? x, double? y) in figures)
        {
            Close(name, x, y, relative);
        }

        // A pull is a difference of two frequencies near 1 MHz: their rounding is its accuracy.
        Assert.Equal(a.PulledHz!.Value, b.PulledHz!.Value, 1e-9 * a.TankHz!.Value * 0.01);
        foreach ((StrayMode x, StrayMode y) in a.StrayModes.Zip(b.StrayModes))
        {
            Close("stray", x.FrequencyHz, y.FrequencyHz, relative);
            Close("stray decay", x.DecayPerSecond, y.DecayPerSecond, relative);
        }

        foreach ((Sideband x, Sideband y) in a.Sidebands.Zip(b.Sidebands))
        {
            Close("upper", x.UpperDb, y.UpperDb, relative);
            Close("lower", x.LowerDb, y.LowerDb, relative);
            Close("audio", x.AudioDb, y.AudioDb, relative);
        }
    }

    private static void Close(string name, double? expected, double? actual, double relative)
    {
        Assert.True(expected.HasValue == actual.HasValue, $"{name}: {actual} for {expected}");
        if (expected is { } e && actual is { } a)
        {
            Assert.True(Math.Abs(e - a) <= relative * Math.Abs(e), $"{name}: {a:R} for {e:R}, off by {(a - e) / e:G3}");
        }
    }
}
