using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tests.Stages;

namespace RegenTrainer.Core.Tests.Devices;

public class JunctionStepTests
{
    private static readonly double[] _starts = [-100, -5, -0.4, 0, 0.1, 0.45, 0.6, 0.75, 0.9, 1.2, 1.6, 3, 20, 100];

    [Theory]
    [InlineData(Polarity.Npn, -55)]
    [InlineData(Polarity.Npn, 25)]
    [InlineData(Polarity.Npn, 125)]
    [InlineData(Polarity.Pnp, 25)]
    public void Newton_settles_from_any_start_on_a_diode_fed_by_a_resistor(Polarity polarity, double celsius)
    {
        BipolarLaw law = (TestDevices.Bc547b with { Polarity = polarity }).LawAt(Grade.Typical, celsius);
        double sign = polarity == Polarity.Npn ? 1 : -1;
        foreach (double supply in (double[])[-9, 0, 0.5, 1.5, 9, 300])
        {
            foreach (double ohm in (double[])[1, 1e3, 1e6])
            {
                foreach (double start in _starts)
                {
                    (double volt, int steps) = Settle(law, sign * supply, ohm, sign * start);
                    Assert.True(steps < 60, $"{supply} V, {ohm} ohm from {start} V: {steps} steps");

                    // Kirchhoff at the node, as far as the voltage's last digits let the current be told.
                    TwoPortPoint p = law.Evaluate(volt, volt);
                    double slope = (1 / ohm) + p.G11 + p.G12 + p.G21 + p.G22;
                    Assert.True(Math.Abs(((sign * supply) - volt) / ohm - p.I1 - p.I2) <= 1e-9 * slope, $"{supply} V, {ohm} ohm from {start} V");
                }
            }
        }
    }

    [Theory]
    [InlineData(0.6, 0.61)]
    [InlineData(0.6, 0.2)]
    [InlineData(0.6, -50)]
    [InlineData(0, 0.3)]
    public void Harmless_steps_are_left_alone(double before, double after)
    {
        (double v1, double v2) = (after, 5.0);
        Assert.False(TestDevices.Bc547b.LawAt(Grade.Typical, 25).LimitStep(before, 5, ref v1, ref v2));
        Assert.Equal((after, 5.0), (v1, v2));
    }

    [Theory]
    [InlineData(0.6, 5)]
    [InlineData(0, 5)]
    [InlineData(-3, 0.9)]
    public void Leaps_up_the_exponential_are_shortened_and_keep_their_direction(double before, double after)
    {
        (double v1, double v2) = (after, 20.0);
        Assert.True(TestDevices.Bc547b.LawAt(Grade.Typical, 25).LimitStep(before, 20, ref v1, ref v2));
        Assert.InRange(v1, before, 0.9);
        Assert.True(v1 < after);
        Assert.Equal(20.0 - after, v2 - v1, 12);
    }

    /// <summary>Node voltage and number of steps; the node's voltage may not move by more than 1 nV in the last step.</summary>
    private static (double Volt, int Steps) Settle(BipolarLaw law, double supply, double ohm, double volt)
    {
        for (int step = 1; step <= 200; step++)
        {
            TwoPortPoint p = law.Evaluate(volt, volt);
            double excess = ((volt - supply) / ohm) + p.I1 + p.I2;
            double next = volt - (excess / ((1 / ohm) + p.G11 + p.G12 + p.G21 + p.G22)), output = next;
            law.LimitStep(volt, volt, ref next, ref output);
            Assert.Equal(next, output, 9);
            double moved = Math.Abs(next - volt);
            volt = next;
            if (moved < 1e-9)
            {
                return (volt, step);
            }
        }

        return (volt, 200);
    }
}
