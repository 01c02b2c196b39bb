using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tests.Stages;

namespace RegenTrainer.Core.Tests.Devices;

/// <summary>What holds for any bipolar law, checked over a grid of port voltages.</summary>
public class BipolarPropertyTests
{
    private static readonly double[] _volts = [-12.3, -3.1, -0.71, -0.2, -0.013, 0, 0.017, 0.21, 0.33, 0.42, 0.55, 0.68, 0.79, 1.1, 2.7, 9.3];

    private static readonly BipolarLaw _law = TestDevices.Bc547b.LawAt(Grade.Typical, 25);

    [Fact]
    public void Pnp_is_the_exact_mirror_of_npn()
    {
        BipolarLaw mirror = (TestDevices.Bc547b with { Polarity = Polarity.Pnp }).LawAt(Grade.Typical, 25);
        foreach ((double v1, double v2) in Grid())
        {
            TwoPortPoint n = _law.Evaluate(v1, v2), p = mirror.Evaluate(-v1, -v2);
            Assert.Equal(n, p with { I1 = -p.I1, I2 = -p.I2, Q1 = -p.Q1, Q2 = -p.Q2 });
            (double n1, double n2, double p1, double p2) = (v1 + 3, v2 - 1, -v1 - 3, -v2 + 1);
            Assert.Equal(_law.LimitStep(v1, v2, ref n1, ref n2), mirror.LimitStep(-v1, -v2, ref p1, ref p2));
            Assert.Equal((n1, n2), (-p1, -p2));
        }
    }

    [Theory]
    [InlineData(Grade.Weak, -40)]
    [InlineData(Grade.Typical, 25)]
    [InlineData(Grade.Strong, 80)]
    public void Conductances_and_capacitances_are_the_slopes_of_currents_and_charges(Grade grade, double celsius)
    {
        BipolarLaw law = TestDevices.Bc547b.LawAt(grade, celsius);
        const double h = 1e-5;
        foreach ((double v1, double v2) in Grid())
        {
            TwoPortPoint p = law.Evaluate(v1, v2);
            TwoPortPoint right = law.Evaluate(v1 + h, v2), left = law.Evaluate(v1 - h, v2);
            TwoPortPoint up = law.Evaluate(v1, v2 + h), down = law.Evaluate(v1, v2 - h);
            Slope(p.G11, right.I1, left.I1);
            Slope(p.G12, up.I1, down.I1);
            Slope(p.G21, right.I2, left.I2);
            Slope(p.G22, up.I2, down.I2);
            Slope(p.C11, right.Q1, left.Q1);
            Slope(p.C12, up.Q1, down.Q1);
            Slope(p.C21, right.Q2, left.Q2);
            Slope(p.C22, up.Q2, down.Q2);

            void Slope(double stated, double above, double below)
            {
                // The two values are rounded to 1 part in 2^53 each, and the exponentials carry a few more.
                double rounding = 16 * Math.ScaleB(Math.Max(Math.Abs(above), Math.Abs(below)), -53) / (2 * h);
                double measured = (above - below) / (2 * h);
                Assert.True(Math.Abs(measured - stated) <= (1e-6 * Math.Abs(stated)) + rounding, $"{v1} V, {v2} V: stated {stated}, measured {measured}");
            }
        }
    }

    [Fact]
    public void Nothing_flows_and_no_charge_is_held_without_voltage()
    {
        TwoPortPoint p = _law.Evaluate(0, 0);
        Assert.Equal((0.0, 0.0, 0.0, 0.0), (p.I1, p.I2, p.Q1, p.Q2));
    }

    // A transistor has no source of its own: the power into its terminals is never negative.
    [Fact]
    public void Device_never_gives_power()
    {
        foreach (double celsius in (double[])[-55, 25, 125])
        {
            BipolarLaw law = TestDevices.Bc547b.LawAt(Grade.Strong, celsius);
            foreach ((double v1, double v2) in Grid())
            {
                TwoPortPoint p = law.Evaluate(v1, v2);
                Assert.True((p.I1 * v1) + (p.I2 * v2) >= 0, $"{v1} V, {v2} V: {p}");
            }
        }
    }

    [Fact]
    public void Charges_are_stored_without_loss_or_gain()
    {
        foreach ((double v1, double v2) in Grid())
        {
            TwoPortPoint p = _law.Evaluate(v1, v2);
            Assert.Equal(p.C12, p.C21);
            Assert.True(p.C11 > 0 && p.C22 > 0 && (p.C11 * p.C22) - (p.C12 * p.C21) > 0);
        }
    }

    // Where an exponential passes into its straight line, and where a capacitance does (half of 0.75 V): value and slope go on.
    [Theory]
    [InlineData(60 * 0.025692579, 0.9)]
    [InlineData(120 * 0.025692579, 0.9)]
    [InlineData(0.375, 5)]
    public void Emitter_junction_goes_on_smoothly_where_its_law_changes(double bend, double v2)
    {
        Smooth(d => _law.Evaluate(bend + d, v2));
    }

    [Theory]
    [InlineData(60 * 0.025692579)]
    [InlineData(0.375)]
    public void Collector_junction_goes_on_smoothly_where_its_law_changes(double bend)
    {
        Smooth(d => _law.Evaluate(0.3, 0.3 - bend - d));
    }

    // A capacitance bends nowhere: its own slopes on both sides of half the built-in voltage agree.
    [Fact]
    public void Capacitance_keeps_its_slope_where_it_becomes_straight()
    {
        const double h = 1e-5;
        double before = (_law.Evaluate(0, -0.375).C22 - _law.Evaluate(0, -0.375 + h).C22) / h;
        double after = (_law.Evaluate(0, -0.375 - h).C22 - _law.Evaluate(0, -0.375).C22) / h;
        Assert.Equal(1, after / before, 1e-4);
    }

    [Fact]
    public void Far_voltages_stay_finite()
    {
        double[] far = [-1e3, -30, -1.5, 0, 0.7, 1.5, 1.7, 30, 1e3];
        foreach (double celsius in (double[])[-100, 25, 200])
        {
            BipolarLaw law = TestDevices.Bc547b.LawAt(Grade.Typical, celsius);
            foreach (double v1 in far)
            {
                foreach (double v2 in far)
                {
                    TwoPortPoint p = law.Evaluate(v1, v2);
                    double[] all = [p.I1, p.I2, p.G11, p.G12, p.G21, p.G22, p.Q1, p.Q2, p.C11, p.C12, p.C21, p.C22];
                    Assert.True(Array.TrueForAll(all, double.IsFinite), $"{v1} V, {v2} V: {p}");
                }
            }
        }
    }

    [Fact]
    public void Evaluating_allocates_nothing()
    {
        double sum = _law.Evaluate(0.6, 5).I2;
        (double n1, double n2) = (3, 1);
        _law.LimitStep(0.6, 5, ref n1, ref n2);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int k = 0; k < 1000; k++)
        {
            sum += _law.Evaluate(0.6 + (1e-4 * k), 5).I2;
            _law.LimitStep(0.6, 5, ref n1, ref n2);
        }

        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
        Assert.True(sum > 0);
    }

    private static IEnumerable<(double V1, double V2)> Grid() => _volts.SelectMany(v1 => _volts.Select(v2 => (v1, v2 + 0.0005)));

    private static void Smooth(Func<double, TwoPortPoint> around)
    {
        TwoPortPoint below = around(-1e-9), above = around(1e-9);
        Near(below.I1, above.I1);
        Near(below.I2, above.I2);
        Near(below.G11, above.G11);
        Near(below.G21, above.G21);
        Near(below.G22, above.G22);
        Near(below.Q1, above.Q1);
        Near(below.Q2, above.Q2);
        Near(below.C11, above.C11);
        Near(below.C22, above.C22);
    }

    // Over 2 nV an exponential of kT/q rises by 1 part in 1e7.
    private static void Near(double below, double above) => Assert.True(Math.Abs(above - below) <= 1e-6 * Math.Abs(below), $"{below} against {above}");
}
