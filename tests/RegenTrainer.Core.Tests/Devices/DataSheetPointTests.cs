using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Devices;

/// <summary>Laws held where the makers' sheets held their devices, at 25 °C and 5 V.</summary>
public class DataSheetPointTests
{
    // Printed: BC547A, B and C 5 V, 2 mA and 10 µA; 2N5088 5 V, 1 mA and 0.1 mA (least); 2N4401 150 mA and 0.1 mA (least);
    // BFS19 1 mA (least); BF799 20 mA and 5 mA.
    [Theory]
    [InlineData("BC547A", 180, 2e-3)]
    [InlineData("BC547A", 90, 10e-6)]
    [InlineData("BC547B", 290, 2e-3)]
    [InlineData("BC547B", 150, 10e-6)]
    [InlineData("BC547C", 520, 2e-3)]
    [InlineData("BC547C", 270, 10e-6)]
    [InlineData("2N5088", 350, 1e-3)]
    [InlineData("2N5088", 300, 0.1e-3)]
    [InlineData("2N4401", 100, 150e-3)]
    [InlineData("2N4401", 20, 0.1e-3)]
    [InlineData("BFS19", 65, 1e-3)]
    [InlineData("BF799", 100, 20e-3)]
    [InlineData("BF799", 95, 5e-3)]
    public void Gain_is_the_printed_one_at_the_printed_current(string name, double gain, double ampere)
    {
        TwoPortPoint p = BiasedAt.Point(LawOf(name, Grade.Typical), ampere, 5);
        Assert.Equal(1, p.I2 / p.I1 / gain, 1e-6);
    }

    // Printed limits of the gain groups at 5 V 2 mA.
    [Theory]
    [InlineData("BC547A", 110, 220)]
    [InlineData("BC547B", 200, 450)]
    [InlineData("BC547C", 420, 800)]
    public void Weak_and_strong_devices_have_the_printed_limits_of_gain(string name, double least, double largest)
    {
        TwoPortPoint weak = BiasedAt.Point(LawOf(name, Grade.Weak), 2e-3, 5), strong = BiasedAt.Point(LawOf(name, Grade.Strong), 2e-3, 5);
        Assert.Equal(1, weak.I2 / weak.I1 / least, 1e-6);
        Assert.Equal(1, strong.I2 / strong.I1 / largest, 1e-6);
    }

    [Fact]
    public void Gain_rises_with_the_grade_at_every_current()
    {
        foreach (double ampere in (double[])[1e-6, 1e-5, 1e-4, 1e-3, 1e-2])
        {
            double[] gains =
            [
                .. new[] { Grade.Weak, Grade.Typical, Grade.Strong }
                    .Select(g => BiasedAt.Point(LawOf("BC547B", g), ampere, 5)).Select(p => p.I2 / p.I1),
            ];
            Assert.True(gains[0] < gains[1] && gains[1] < gains[2], $"{ampere} A: {string.Join(", ", gains)}");
        }
    }

    // Printed: f_T at a current, measured at 100 MHz (2N5088: 20 MHz) as gain times frequency.
    [Theory]
    [InlineData("BC547A", 300e6, 10e-3, 100e6)]
    [InlineData("BC547B", 300e6, 10e-3, 100e6)]
    [InlineData("BC547C", 300e6, 10e-3, 100e6)]
    [InlineData("2N5088", 50e6, 0.5e-3, 20e6)]
    [InlineData("2N4401", 250e6, 20e-3, 100e6)]
    [InlineData("BFS19", 260e6, 10e-3, 100e6)]
    [InlineData("BF799", 800e6, 5e-3, 100e6)]
    public void Transition_frequency_is_the_printed_one_within_one_percent(string name, double transition, double ampere, double at)
    {
        BipolarLaw law = LawOf(name, Grade.Typical);
        Assert.False(law.IsTransitTimeClamped);
        TwoPortPoint p = BiasedAt.Point(law, ampere, 5);

        // The pole of a gain of 65 to 520 lies far below, its share is taken out: f_T = f / sqrt(1/|gain|^2 - 1/gain0^2).
        double gain = BiasedAt.ShortCircuitGain(p, at), slow = BiasedAt.ShortCircuitGain(p, 0);
        Assert.InRange(at / Math.Sqrt((1 / (gain * gain)) - (1 / (slow * slow))) / transition, 0.99, 1.01);
    }

    // Printed: 2.5 pF between 1.7 and 3.5 pF at 10 V from collector to base, 9 pF at 0.5 V from emitter to base.
    [Fact]
    public void Capacitances_are_the_stated_ones_at_their_reverse_voltages()
    {
        BipolarLaw law = LawOf("BC547B", Grade.Typical);
        Assert.Equal(2.5, 1e12 * law.Evaluate(0, 10).C22, 1e-9);
        TwoPortPoint open = law.Evaluate(-0.5, 10);
        Assert.Equal(9, 1e12 * (open.C11 + open.C12), 1e-9);
        Assert.Equal(6, 1e12 * LawOf("BC547B", Grade.Weak).Evaluate(0, 10).C22, 1e-9);
    }

    // Printed: base to emitter 580 to 700 mV, typically 660 mV, at 5 V 2 mA.
    [Fact]
    public void Base_voltage_is_the_printed_one()
    {
        Assert.InRange(BiasedAt.BaseVolt(LawOf("BC547B", Grade.Typical), 2e-3, 5), 0.650, 0.660);
    }

    // Printed: collector to emitter at most 250 mV at 10 mA with 0.5 mA into the base (from memory); without the resistance of
    // leads and crystal some tens of millivolt remain (Gray and Meyer 1977).
    [Fact]
    public void Saturation_leaves_some_tens_of_millivolt()
    {
        BipolarLaw law = LawOf("BC547B", Grade.Typical);
        double low = 0, high = 1;
        for (int k = 0; k < 80; k++)
        {
            double middle = 0.5 * (low + high);
            (low, high) = BiasedAt.Point(law, 10e-3, middle).I1 > 0.5e-3 ? (middle, high) : (low, middle);
        }

        Assert.InRange(low, 0.02, 0.25);
    }

    // Emitter and collector exchanged: gains of 1 to 10 are usual for small planar transistors (common practice).
    [Fact]
    public void Exchanged_emitter_and_collector_leave_little_gain()
    {
        TwoPortPoint p = LawOf("BC547B", Grade.Typical).Evaluate(-1, -1.6);
        Assert.True(p.I1 > 0);
        Assert.InRange(-(p.I1 + p.I2) / p.I1, 1, 10);
    }

    // A gain that falls faster than the root of the current cannot come from recombination alone: the base must never feed the circuit.
    [Fact]
    public void Base_takes_current_however_steeply_the_stated_gain_falls()
    {
        BipolarModel steep = SheetTypes.Bc547b with { CurrentGainLow = new DeviceFigure(null, 10, null, 1e-3, KnownBy.Memory, "") };
        BipolarLaw law = steep.LawAt(Grade.Typical, 25);
        TwoPortPoint stated = BiasedAt.Point(law, 2e-3, 5);
        Assert.Equal(290, stated.I2 / stated.I1, 1e-3);
        for (double volt = 0.1; volt < 1; volt += 0.05)
        {
            Assert.True(law.Evaluate(volt, 5).I1 > -1e-14, $"{volt} V");
        }
    }

    // A type whose junctions alone are slower than its stated transition frequency has no transit time left: 100 pF x 25.7 mV / 1 mA
    // is 2.6 ns against 0.16 ns of 1 GHz.
    [Fact]
    public void Contradicting_speed_and_capacitance_are_reported()
    {
        BipolarModel slow = SheetTypes.Textbook with
        {
            InputCapacitance = new DeviceFigure(null, 100e-12, null, 0.5, KnownBy.Memory, ""),
            TransitionFrequency = new DeviceFigure(null, 1e9, null, 1e-3, KnownBy.Memory, ""),
        };
        Assert.True(slow.LawAt(Grade.Typical, 25).IsTransitTimeClamped);
    }

    private static BipolarLaw LawOf(string name, Grade grade) => SheetTypes.All.Single(m => m.Name == name).LawAt(grade, 25);
}
