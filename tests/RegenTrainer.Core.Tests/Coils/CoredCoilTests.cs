using CsCheck;
using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class CoredCoilTests
{
    // The inductance factor of a core is defined by L = A_L N^2 of the whole winding (IEC 60401-3, from memory).
    [Fact]
    public void The_whole_winding_has_its_inductance_factor_wherever_the_taps_are() =>
        Gen.Select(Gen.Int[3, 300], Gen.Double[0.01, 0.99], Gen.Double[0.01, 0.99], Gen.Double[0.0, 0.999]).Sample((turns, one, other, k) =>
        {
            int[] taps = [.. new[] { one, other }.Select(share => 1 + (int)(share * (turns - 2))).Distinct().Order()];
            CoredCoil coil = new(55e-9, turns, taps, k, (200, 1e6));
            Assert.Equal(1.0, Sum(coil) / (55e-9 * turns * turns), 1e-12);
            Assert.Equal(turns, coil.SectionTurns.Sum());

            // k = M/sqrt(L1 L2), and sections stand to each other as their turns squared: the definitions.
            Assert.Equal(k, coil.Henry(0, 1) / Math.Sqrt(coil.Henry(0, 0) * coil.Henry(1, 1)), 1e-12);
            double ratio = (double)coil.SectionTurns[1] / coil.SectionTurns[0];
            Assert.Equal(ratio * ratio, coil.Henry(1, 1) / coil.Henry(0, 0), 1e-9 * ratio * ratio);
        });

    // 66 turns at 55 nH: 239.58 uH.
    [Theory]
    [InlineData(55e-9, 66, 239.58e-6)]
    [InlineData(170e-9, 108, 1.98288e-3)]
    [InlineData(5e-9, 32, 5.12e-6)]
    public void Inductance_is_the_factor_times_turns_squared(double factor, int turns, double henry) =>
        Assert.Equal(henry, Sum(new CoredCoil(factor, turns, [2, 9], 0.99, (200, 1e6))), 1e-12 * henry);

    // The Q is measured with the resistance of the wire in it; above its frequency the wire's share falls, below it rises.
    [Fact]
    public void The_measured_Q_holds_where_it_was_measured()
    {
        CoredCoil coil = new(170e-9, 108, [5, 30], 0.99, (120, 200e3), 6e-12, new TurnWire(0.1e-3, 0.04));
        Assert.Equal(120, QAt(coil, 200e3), 1e-9);
        Assert.True(QAt(coil, 150e3) < 120 && QAt(coil, 285e3) > 120);
        Assert.Equal(120, QAt(new CoredCoil(170e-9, 108, [5, 30], 0.99, (120, 200e3)), 150e3), 1e-9);
    }

    // IEC 60028: 0.017241 ohm mm^2/m at 20 °C, 0.393 % more a kelvin. 100 turns of 40 mm of 0.3 mm wire: 4 m of 0.0706858 mm^2.
    [Fact]
    public void The_wire_has_the_resistance_of_copper()
    {
        CoredCoil coil = new(170e-9, 100, [25], 0.99, (120, 200e3), wire: new TurnWire(0.3e-3, 0.04));
        Assert.Equal(0.97564, coil.DcOhm(0, 20) + coil.DcOhm(1, 20), 1e-4);
        Assert.Equal(0.25, coil.DcOhm(0, 20) / (coil.DcOhm(0, 20) + coil.DcOhm(1, 20)), 1e-12);
        Assert.Equal(1.0786, coil.DcOhm(0, 40) / coil.DcOhm(0, 20), 1e-9);
        Assert.Equal(4.0, coil.Windings[0].WireLengthMetre, 1e-12);
    }

    [Fact]
    public void A_caution_says_where_the_Q_was_not_measured()
    {
        CoredCoil coil = new(55e-9, 66, [3], 0.9, (200, 1e6));
        Assert.Empty(coil.CautionsAt(530e3));
        Assert.Empty(coil.CautionsAt(1.7e6));
        Assert.Equal("core-q-far", Assert.Single(coil.CautionsAt(300e3)).Code);
        Assert.Equal("core-q-far", Assert.Single(coil.CautionsAt(2.1e6)).Code);
    }

    [Fact]
    public void Faulty_coils_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new CoredCoil(0, 66, [], 0.9, (200, 1e6)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CoredCoil(55e-9, 0, [], 0.9, (200, 1e6)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CoredCoil(55e-9, 66, [66], 0.9, (200, 1e6)));
        Assert.Throws<ArgumentException>(() => new CoredCoil(55e-9, 66, [9, 9], 0.9, (200, 1e6)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CoredCoil(55e-9, 66, [], 1.0, (200, 1e6)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CoredCoil(55e-9, 66, [], 0.9, (0, 1e6)));
        ArgumentException refused = Assert.Throws<ArgumentException>(
            () => new CoredCoil(170e-9, 108, [], 0.99, (2000, 200e3), wire: new TurnWire(0.1e-3, 0.04)));
        Assert.Contains("wire alone", refused.Message, StringComparison.Ordinal);
    }

    private static double Sum(CoredCoil coil) =>
        Enumerable.Range(0, coil.SectionCount).Sum(i => Enumerable.Range(0, coil.SectionCount).Sum(j => coil.Henry(i, j)));

    private static double QAt(CoredCoil coil, double hz)
    {
        double[] ohm = new double[coil.SectionCount * coil.SectionCount];
        coil.SeriesOhm(hz, 20, ohm);
        return 2 * Math.PI * hz * Sum(coil) / ohm.Sum();
    }
}
