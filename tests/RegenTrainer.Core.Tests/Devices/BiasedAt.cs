using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Devices;

/// <summary>A law held at a collector current and collector voltage, as a transistor tester holds it.</summary>
internal static class BiasedAt
{
    /// <summary>The base voltage, found by halving.</summary>
    internal static double BaseVolt(IDeviceLaw law, double collectorAmpere, double collectorVolt)
    {
        double low = 0, high = 1.4;
        for (int k = 0; k < 100; k++)
        {
            double middle = 0.5 * (low + high);
            (low, high) = law.Evaluate(middle, collectorVolt).I2 < collectorAmpere ? (middle, high) : (low, middle);
        }

        return 0.5 * (low + high);
    }

    /// <summary>The law at that point.</summary>
    internal static TwoPortPoint Point(IDeviceLaw law, double collectorAmpere, double collectorVolt) =>
        law.Evaluate(BaseVolt(law, collectorAmpere, collectorVolt), collectorVolt);

    /// <summary>Gain with the output short-circuited for alternating current, by amount, at a frequency in Hz.</summary>
    internal static double ShortCircuitGain(in TwoPortPoint p, double hertz)
    {
        double omega = 2 * Math.PI * hertz;
        return Math.Sqrt(((p.G21 * p.G21) + (omega * p.C21 * omega * p.C21)) / ((p.G11 * p.G11) + (omega * p.C11 * omega * p.C11)));
    }
}
