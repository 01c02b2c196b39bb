namespace RegenTrainer.Core.Tests.Oracles;

public sealed class DecayFitTests
{
    [Theory]
    [InlineData(-300.0, 1.0123e6)]
    [InlineData(50_000.0, 0.9e6)]
    [InlineData(0.0, 1.0e6)]
    public void A_known_ring_is_read_beside_direct_voltage_drift_and_a_stray_mode(double growth, double hz)
    {
        const int perCycle = 120;
        double[] samples = new double[300 * perCycle];
        for (int k = 0; k < samples.Length; k++)
        {
            double t = k / (1e6 * perCycle);
            samples[k] = (Math.Exp(growth * t) * Math.Cos((2 * Math.PI * hz * t) + 0.7)) + 5 - (2000 * t) + (0.1 * Math.Sin(2 * Math.PI * 7.5e6 * t));
        }

        DecayReading reading = DecayFit.Fit(samples, 1e6, perCycle);
        Assert.Equal(growth, reading.Sampled.Real, 0.05);
        Assert.Equal(hz, reading.Sampled.Imaginary / (2 * Math.PI), 0.01);
        Assert.True(reading.WorstDeviation < 1e-5);
    }

    [Fact]
    public void Two_rings_side_by_side_show_as_a_deviation()
    {
        double[] samples = [.. Enumerable.Range(0, 36_000).Select(k => Math.Cos(2 * Math.PI * k / 120.0) + (0.5 * Math.Cos(2 * Math.PI * 1.01 * k / 120.0)))];
        Assert.True(DecayFit.Fit(samples, 1e6, 120).WorstDeviation > 0.1);
    }
}
