using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Tests.Devices;

namespace RegenTrainer.Core.Tests.Circuits;

/// <summary>A diode among other parts: its operating point and what it does to a tank.</summary>
public sealed class DiodeCircuitTests
{
    // Tank of 250 uH and 100 pF with Q = 100: dynamic resistance 158 113.9 ohm (Terman). The diode at zero bias puts n V_T/I_S across
    // it (25 692.6 ohm for 1 uA at 25 °C, any textbook); both in parallel over w L = 1 581.139 ohm leave the Q.
    [Theory]
    [InlineData(1e-8, 1, 94.2027)]
    [InlineData(1e-7, 1, 61.9038)]
    [InlineData(1e-6, 1, 13.9781)]
    [InlineData(1e-6, 2, 24.5276)]
    public void It_takes_the_Q_of_a_tank_down_by_its_resistance_at_zero_bias(double saturation, double emission, double q)
    {
        foreach (bool reversed in new[] { false, true })
        {
            (string anode, string cathode) = reversed ? (Part.Earth, "top") : ("top", Part.Earth);
            ModeResult mode = Ring(
            [
                new Inductor("coil", "top", Part.Earth, 250e-6), new Capacitor("tuning", "top", Part.Earth, 100e-12),
                new Resistor("loss", "top", Part.Earth, 158113.883), new Diode("diode", anode, cathode, TestDiodes.Plain(saturation, emission)),
            ]);
            Assert.Equal(q, mode.Q, 2e-4 * q);
        }
    }

    // Its capacitance adds to the tank's: 250 uH with 125 pF, 25330.3 = L C f^2 (Terman, uH, pF, MHz), 0.900316 MHz.
    [Fact]
    public void Its_capacitance_tunes_the_tank()
    {
        ModeResult mode = Ring(
        [
            new Inductor("coil", "top", Part.Earth, 250e-6), new Capacitor("tuning", "top", Part.Earth, 100e-12),
            new Diode("diode", "top", Part.Earth, TestDiodes.Plain(1e-12, farad: 25e-12)),
        ]);
        Assert.Equal(0.900316e6, mode.Hz, 1.0);
    }

    // A forward current of 10 uA leaves V_T/(I + I_S) = 2335.7 ohm at 25 °C with 1 uA of saturation current (any textbook).
    [Fact]
    public void A_small_bias_brings_its_resistance_down()
    {
        const double volt = 0.0616077;   // V_T ln 11
        Workspace w = Biased(
        [
            new Supply("battery", "plus", Part.Earth, 1 + volt, 0), new Resistor("feed", "plus", "top", 1e5),
            new Diode("diode", "top", Part.Earth, TestDiodes.Plain(1e-6)),
        ]);
        Assert.Equal(10e-6, w.Points[0].I1, 2e-11);
        Assert.Equal(2335.69, 1 / w.Linear[0].G11, 0.02);
    }

    /// <summary>Diode, resistor and battery against the root of their one equation, found by halving.</summary>
    [Theory]
    [InlineData(1e-6, 1, 100)]
    [InlineData(100, 1, 1)]
    [InlineData(1000, 4, 1e4)]
    [InlineData(-50, 1.1, 1e6)]
    [InlineData(0.1, 1, 1e6)]
    public void The_operating_point_is_the_root_of_its_equation(double volt, double emission, double ohm)
    {
        const double saturation = 1e-7, thermal = 0.025692579;
        foreach (bool fromAnode in new[] { true, false })
        {
            // The battery at the anode, or turned round at the cathode.
            (string anode, string cathode) = fromAnode ? ("x", Part.Earth) : (Part.Earth, "x");
            Workspace w = Biased(
            [
                new Supply("battery", "plus", Part.Earth, fromAnode ? volt : -volt, 0), new Resistor("feed", "plus", "x", ohm),
                new Diode("diode", anode, cathode, TestDiodes.Plain(saturation, emission)),
            ]);
            (double low, double high) = (Math.Min(volt, 0), Math.Max(volt, 0));
            for (int k = 0; k < 200; k++)
            {
                double middle = (low + high) / 2, through = saturation * (Math.Exp(Math.Min(middle / (emission * thermal), 60)) - 1);
                (low, high) = through < (volt - middle) / (ohm + 0.01) ? (middle, high) : (low, middle);
            }

            double ampere = (volt - low) / (ohm + 0.01);
            Assert.Equal(ampere, w.Points[0].I1, 1e-7 * Math.Abs(ampere));
        }
    }

    [Fact]
    public void A_diode_with_both_leads_on_one_node_does_nothing()
    {
        Workspace w = Biased(
        [
            new Supply("battery", "plus", Part.Earth, 3, 0), new Resistor("feed", "plus", "x", 1e3), new Resistor("load", "x", Part.Earth, 1e3),
            new Diode("diode", "x", "x", TestDiodes.Plain(1e-6)),
        ]);
        Assert.Equal(1.5, w.Voltages[w.Network.NodeIndex("x")], 1e-12);
    }

    private static Workspace Biased(IReadOnlyList<Part> parts, double lossHz = 1e6)
    {
        var w = new Workspace(Network.Compile(parts));
        w.Values.SetConditions(new NetworkConditions(lossHz, 25, Grade.Typical, null, null));
        w.Values.SetDirect(0, regeneratingRemoved: false);
        OperatingPoint point = OperatingPointSolver.Solve(w, regeneratingRemoved: false, fromVoltages: false);
        Assert.True(point.Found, $"{point}");
        w.Values.SetPencil(0, 0, w.Linear, 1);
        return w;
    }

    private static ModeResult Ring(IReadOnlyList<Part> parts)
    {
        Workspace w = Biased(parts);
        SpectralMode mode = ModeSpectrum.TryFind(w, 2 * Math.PI * 1e6)!.MaxBy(m => m.S.Imaginary)!;
        mode.Shape.CopyTo(w.Shape, 0);
        mode.Shape.CopyTo(w.LeftShape, 0);
        return ModeSolver.Polish(w, mode.S, 0, null);
    }
}
