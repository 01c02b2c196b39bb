using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

public sealed class TransientTests
{
    private const double Omega = 2 * Math.PI * 1e6;
    private static readonly int[] _stepCounts = [200, 400, 800, 1600];

    [Fact]
    public void The_error_of_a_driven_circuit_falls_by_four_when_the_step_halves()
    {
        // 1 kohm into 100 pF from a sine that starts at zero; closed form of the first-order equation.
        Part[] parts = [new Antenna("emf", "in", Part.Earth), new Resistor("r", "in", "out", 1000), new Capacitor("c", "out", Part.Earth, 100e-12)];
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6);
        const double tau = 1e-7;
        const double time = 1.3e-6;
        double exact = (Math.Sin(Omega * time) - (Omega * tau * Math.Cos(Omega * time)) + (Omega * tau * Math.Exp(-time / tau)))
            / (1 + (Omega * tau * Omega * tau));
        double coarse = LastVolt(oracle, time, 156) - exact;
        double fine = LastVolt(oracle, time, 312) - exact;
        Assert.InRange(coarse / fine, 3.98, 4.02);
        Assert.InRange(Math.Abs(fine), 1e-7, 1e-4);
    }

    [Fact]
    public void The_error_of_a_nonlinear_circuit_falls_by_four_when_the_step_halves()
    {
        // A saturating negative conductance with a charge that bends, no closed form: the differences of successive halvings.
        Part[] parts = [new Antenna("emf", "in", Part.Earth), new Resistor("r", "in", "out", 1000), new Inductor("l", "out", Part.Earth, 250e-6)];
        OracleDevice device = new("d", "out", "out", Part.Earth, 0, new CubicLaw(1e-3, 0.3, 100e-12, 50e-12));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        double[] volts = [.. _stepCounts.Select(n => LastVolt(oracle, 1.3e-6, n))];
        Assert.InRange((volts[0] - volts[1]) / (volts[1] - volts[2]), 3.9, 4.1);
        Assert.InRange((volts[1] - volts[2]) / (volts[2] - volts[3]), 3.95, 4.05);
    }

    [Fact]
    public void A_loss_free_tank_keeps_its_energy()
    {
        Part[] parts = [new Capacitor("c", "top", Part.Earth, 100e-12) { Role = PartRole.Tuning }, new Inductor("l", "top", Part.Earth, 250e-6)];
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6);
        OracleSamples samples = oracle.Run(new OracleRun(1 / (1e6 * 120), 1_200_000)
        {
            KickAmpere = CarrierLevelOracle.Burst(1e6, 1e-3),
            Nodes = ["top"],
            Branches = ["l"],
            Every = 120,
        });
        double early = Energy(samples, 20);
        Assert.True(early > 1e-12);
        Assert.InRange(Energy(samples, 9_999) / early, 1 - 1e-9, 1 + 1e-9);
    }

    [Fact]
    public void What_the_antenna_gives_is_stored_or_dissipated()
    {
        Part[] parts =
        [
            new Antenna("emf", "in", Part.Earth),
            new Resistor("r", "in", "top", 10e3),
            new Capacitor("c", "top", Part.Earth, 100e-12),
            new Inductor("l", "top", Part.Earth, 250e-6),
            new Resistor("load", "top", "out", 5e3),
        ];
        OracleDevice diode = new("d", "out", "out", Part.Earth, 0, new ExponentialLaw(1e-9, 0.025, 1e9));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [diode]);
        const double step = 1 / (1e6 * 400);
        OracleSamples s = oracle.Run(new OracleRun(step, 20_000)
        {
            AntennaVolt = t => 2 * Math.Sin(Omega * t),
            Nodes = ["in", "top", "out"],
            Branches = ["emf", "l"],
        });
        double given = 0;
        double lost = 0;
        for (int k = 1; k < 20_000; k++)
        {
            double Middle(double[] x) => (x[k] + x[k - 1]) / 2;
            given -= step * Middle(s.Volt["in"]) * Middle(s.Ampere["emf"]);
            double across = Middle(s.Volt["in"]) - Middle(s.Volt["top"]);
            double overLoad = Middle(s.Volt["top"]) - Middle(s.Volt["out"]);
            lost += step * ((across * across / 10e3) + (overLoad * overLoad / 5e3) + (Middle(s.Volt["out"]) * overLoad / 5e3));
        }

        double stored = Energy(s, 19_999) - Energy(s, 0);
        Assert.True(Math.Abs(s.Volt["out"].Max()) > 0.1);
        Assert.InRange((lost + stored) / given, 1 - 1e-9, 1 + 1e-9);
    }

    [Fact]
    public void Stepping_and_the_ring_reading_agree()
    {
        Part[] parts =
        [
            new Capacitor("c", "top", Part.Earth, 100e-12, 800) { Role = PartRole.Tuning },
            new Inductor("l", "top", "tap", 150e-6, 3),
            new Inductor("m", "tap", Part.Earth, 100e-6, 2),
            new Capacitor("lead", "tap", Part.Earth, 8e-12),
        ];
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6);
        RingReading ring = oracle.SmallSignalRing("tap", 1e6, 800, 120);
        OracleSamples samples = oracle.Run(new OracleRun(1 / (1e6 * 120), 800 * 120)
        {
            KickAmpere = CarrierLevelOracle.Burst(1e6, 1e-3),
            Nodes = ["tap"],
            Linear = true,
        });
        DecayReading stepped = DecayFit.Fit(samples.Volt["tap"].AsSpan(400 * 120), 1e6, 120);
        Assert.Equal(ring.GrowthPerS, stepped.GrowthPerS, Math.Abs(1e-7 * ring.GrowthPerS));
        Assert.Equal(ring.Hz, stepped.Hz, 1e-4);
    }

    private static double Energy(OracleSamples s, int k) =>
        (0.5 * 100e-12 * s.Volt["top"][k] * s.Volt["top"][k]) + (0.5 * 250e-6 * s.Ampere["l"][k] * s.Ampere["l"][k]);

    private static double LastVolt(CarrierLevelOracle oracle, double time, int steps) =>
        oracle.Run(new OracleRun(time / steps, steps) { AntennaVolt = t => Math.Sin(Omega * t), Nodes = ["out"], Every = steps }).Volt["out"][0];
}
