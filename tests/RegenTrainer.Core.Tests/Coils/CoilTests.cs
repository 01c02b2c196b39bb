using CsCheck;
using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class CoilTests
{
    private static readonly Wire _wire = new(0.4e-3);

    // Nagaoka's current sheet with Rosa's round-wire correction, evaluated independently (scipy elliptic integrals).
    [Theory]
    [InlineData(25.0e-3, CurrentDistribution.Uniform, 314.14e-6, 0.005e-6)]
    [InlineData(25.0e-3, CurrentDistribution.Surface, 313.4e-6, 0.05e-6)]
    [InlineData(25.2e-3, CurrentDistribution.Surface, 317.6e-6, 0.05e-6)]
    public void Ninety_turns_have_the_inductance_of_the_corrected_current_sheet(
        double radiusMetre, CurrentDistribution distribution, double henry, double digits)
    {
        Coil coil = new(new Winding(radiusMetre, 90, 0.45e-3, _wire, []), distribution: distribution);
        Assert.Equal(henry, coil.TotalHenry, digits);
    }

    [Fact]
    public void Taps_leave_the_whole_winding_as_it_is() => Gen.Int[1, 89].Array[1, 6].Sample(chosen =>
    {
        int[] taps = [.. chosen.Distinct().Order()];
        Coil whole = new(Winding.OnForm(0.05, _wire, 90), formLossQ: 400);
        Coil tapped = new(Winding.OnForm(0.05, _wire, 90, tapTurns: taps), formLossQ: 400);
        double sum = 0.0;
        for (int i = 0; i < tapped.SectionCount; i++)
        {
            for (int j = 0; j < tapped.SectionCount; j++)
            {
                sum += tapped.Henry(i, j);
                Assert.Equal(tapped.Henry(i, j), tapped.Henry(j, i));
            }
        }

        Assert.Equal(taps.Length + 1, tapped.SectionCount);
        Assert.Equal(1.0, sum / whole.Henry(0, 0), 1e-12);
        Assert.Equal(1.0, tapped.TotalHenry / whole.TotalHenry, 1e-12);
        Assert.Equal(1.0, tapped.OhmAt(1e6, 20.0) / whole.OhmAt(1e6, 20.0), 1e-12);
    });

    [Fact]
    public void Inductance_matrix_is_positive_definite() => Gen.Int[1, 39].Array[1, 12].Sample(chosen =>
    {
        Coil coil = new(
            [Winding.OnForm(0.05, _wire, 40, tapTurns: [.. chosen.Distinct().Order()]), Winding.OnForm(0.05, _wire, 9, 0.5e-3, startMetre: 0.02)]);
        MathNet.Numerics.LinearAlgebra.Matrix<double> matrix =
            MathNet.Numerics.LinearAlgebra.Matrix<double>.Build.Dense(coil.SectionCount, coil.SectionCount, coil.Henry);
        Assert.All(matrix.Evd().EigenValues, value => Assert.True(value.Real > 0.0));
    });

    // One winding cut in two and laid end to end is the same coil.
    [Fact]
    public void Two_windings_end_to_end_are_one()
    {
        Coil whole = new(Winding.OnForm(0.05, _wire, 90, 0.6e-3, [40]));
        Coil parts = new([Winding.OnForm(0.05, _wire, 40, 0.6e-3), Winding.OnForm(0.05, _wire, 50, 0.6e-3, startMetre: 40 * 0.6e-3)]);
        for (int i = 0; i < 2; i++)
        {
            for (int j = 0; j < 2; j++)
            {
                Assert.Equal(1.0, parts.Henry(i, j) / whole.Henry(i, j), 1e-12);
            }
        }
    }

    [Fact]
    public void Unequal_windings_couple_alike_in_either_order() =>
        Gen.Select(Gen.Double[0.03, 0.08], Gen.Int[2, 20], Gen.Double[0.45e-3, 2e-3], Gen.Double[0.031, 0.2]).Sample((form, turns, pitch, start) =>
        {
            Winding first = Winding.OnForm(0.05, _wire, 30, 1e-3, [7]);
            Winding second = Winding.OnForm(form, new Wire(0.3e-3), turns, pitch, startMetre: start);
            Coil forth = new([first, second]);
            Coil back = new([second, first]);
            Assert.Equal(1.0, forth.Henry(0, 2) / back.Henry(1, 0), 1e-12);
            Assert.Equal(1.0, forth.Henry(1, 2) / back.Henry(2, 0), 1e-12);
        });

    // Equal pitch takes the sum by distance, a pitch a hair apart the sum by pairs.
    [Fact]
    public void Both_ways_of_summing_agree()
    {
        Winding first = Winding.OnForm(0.05, _wire, 30, 1e-3, [7]);
        Coil byDistance = new([first, Winding.OnForm(0.05, _wire, 12, 1e-3, [5], 0.035)]);
        Coil byPairs = new([first, Winding.OnForm(0.05, _wire, 12, 1e-3 * (1.0 + 1e-14), [5], 0.035)]);
        for (int i = 0; i < 2; i++)
        {
            for (int j = 2; j < 4; j++)
            {
                Assert.Equal(1.0, byPairs.Henry(i, j) / byDistance.Henry(i, j), 1e-12);
            }
        }
    }

    // Far apart two coils are dipoles of N turns: M = mu0 pi a^4 N1 N2/(2 d³) (any text on magnetostatics).
    [Fact]
    public void Distant_windings_are_dipoles()
    {
        Coil coil = new([new Winding(0.01, 20, 1e-3, _wire, []), new Winding(0.01, 10, 1e-3, _wire, [], 10.005)]);
        Assert.Equal(1.0, coil.Henry(0, 1) / (1.25663706212e-6 * 3.141592653589793 * 1e-8 * 200 / 2000.0), 1e-4);
    }

    // NBS Circular 31, ohm for 1000 ft at 20 °C (from memory); the finest as computed from the gauge.
    [Theory]
    [InlineData(2.5882e-3, 0.9989)]
    [InlineData(0.8118e-3, 10.15)]
    [InlineData(0.5106e-3, 25.67)]
    [InlineData(0.2546e-3, 103.2)]
    [InlineData(0.0799e-3, 1049.0)]
    public void Copper_wire_has_the_tabulated_resistance(double diameterMetre, double ohmPerThousandFeet)
    {
        Coil coil = new(Winding.OnForm(0.05, new Wire(diameterMetre), 50));
        Assert.Equal(1.0, coil.DcOhm(0, 20.0) / coil.WireLengthMetre * 304.8 / ohmPerThousandFeet, 1.5e-3);
    }

    // IEC 60028: 0.017241 ohm mm²/m, and 0.00393 more of it for each kelvin above 20 °C.
    [Fact]
    public void Copper_follows_its_standard()
    {
        Coil coil = new(Winding.OnForm(0.05, _wire, 50));
        Assert.Equal(0.017241, coil.DcOhm(0, 20.0) / coil.WireLengthMetre * 0.12566371, 1e-6);
        Assert.Equal(1.0393, coil.DcOhm(0, 30.0) / coil.DcOhm(0, 20.0), 1e-12);
        Assert.Equal(coil.DcOhm(0, 20.0), coil.OhmAt(0.0, 20.0), 1e-12);
    }

    // Length of a helix: turns times the root of circumference squared plus pitch squared; 84 turns of 25.22 mm, 0.6 mm apart.
    [Fact]
    public void Wire_is_as_long_as_its_helix() =>
        Assert.Equal(13.310898, new Coil(Winding.OnForm(0.05, _wire, 84, 0.6e-3)).WireLengthMetre, 1e-6);

    [Fact]
    public void Wire_loss_is_shared_by_length_and_form_loss_by_inductance()
    {
        Winding winding = Winding.OnForm(0.05, _wire, 84, 0.6e-3, [4, 24]);
        double[] bare = new double[9];
        double[] full = new double[9];
        Coil lossy = new(winding, formLossQ: 400);
        new Coil(winding).SeriesOhm(1e6, 20.0, bare);
        lossy.SeriesOhm(1e6, 20.0, full);
        Assert.Equal(20.0 / 4.0, bare[4] / bare[0], 1e-12);
        Assert.Equal(60.0 / 4.0, bare[8] / bare[0], 1e-12);
        Assert.Equal(0.0, bare[1]);
        for (int element = 0; element < 9; element++)
        {
            double reactance = 2.0 * Math.PI * 1e6 * lossy.Henry(element / 3, element % 3);
            Assert.Equal(1.0 / 400.0, (full[element] - bare[element]) / reactance, 1e-12);
        }

        Assert.Equal(1.0, full.Sum() / lossy.OhmAt(1e6, 20.0), 1e-12);
    }

    [Fact]
    public void Loss_matrix_never_gives_power_back() =>
        Gen.Select(Gen.Double[-1, 1].Array[5], Gen.Double[1e4, 3e7]).Sample((current, hz) =>
        {
            Coil coil = new(
                [Winding.OnForm(0.05, _wire, 84, 0.6e-3, [4, 24]), Winding.OnForm(0.05, _wire, 12, 0.5e-3, [5], 0.055)], formLossQ: 50);
            double[] matrix = new double[25];
            coil.SeriesOhm(hz, 20.0, matrix);
            double power = 0.0;
            for (int element = 0; element < 25; element++)
            {
                power += matrix[element] * current[element / 5] * current[element % 5];
            }

            Assert.True(power >= 0.0);
        });

    [Fact]
    public void Measured_q_is_met_and_the_law_of_frequency_kept()
    {
        Winding winding = Winding.OnForm(0.05, _wire, 84, 0.6e-3, [4, 24]);
        Coil computed = new(winding, formLossQ: 400);
        Coil measured = new(winding, formLossQ: 400, measured: (180.0, 1e6));
        Assert.Equal(180.0, measured.Q(1e6, 20.0), 1e-9);
        Assert.Equal(computed.Q(0.6e6, 35.0) / computed.Q(1e6, 20.0), measured.Q(0.6e6, 35.0) / 180.0, 1e-12);
        double[] matrix = new double[9];
        measured.SeriesOhm(1e6, 20.0, matrix);
        Assert.Equal(180.0, 2.0 * Math.PI * 1e6 * measured.TotalHenry / matrix.Sum(), 1e-9);
        Assert.Equal(computed.DcOhm(1, 20.0), measured.DcOhm(1, 20.0));
    }

    [Fact]
    public void Filling_the_loss_matrix_allocates_nothing()
    {
        Coil coil = new(Winding.OnForm(0.05, _wire, 84, 0.6e-3, [4, 24]), formLossQ: 400);
        double[] matrix = new double[9];
        coil.SeriesOhm(1e6, 20.0, matrix);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int round = 0; round < 1000; round++)
        {
            coil.SeriesOhm(1e6 + round, 20.0, matrix);
        }

        Assert.Equal(0, GC.GetAllocatedBytesForCurrentThread() - before);
    }

    // [Medhurst 1947]: 84 turns 0.6 mm apart on 50.44 mm are as long as wide (l/D = 0.9992), 0.46 pF for each cm.
    [Fact]
    public void Each_winding_has_its_own_span_and_capacitance()
    {
        Coil coil = new([Winding.OnForm(0.05, _wire, 84, 0.6e-3, [4, 24]), Winding.OnForm(0.05, _wire, 1, startMetre: 0.06)]);
        Assert.Equal(4, coil.SectionCount);
        Assert.Equal((0, 3, 84), (coil.Windings[0].FirstSection, coil.Windings[0].SectionCount, coil.Windings[0].Turns));
        Assert.Equal((3, 1, 1), (coil.Windings[1].FirstSection, coil.Windings[1].SectionCount, coil.Windings[1].Turns));
        Assert.Equal(0.46e-12 * 5.044, coil.SelfCapacitanceFarad[0], 1e-16);
        Assert.Equal(0.0, coil.SelfCapacitanceFarad[1]);
    }

    [Theory]
    [InlineData(84, 0.6, 0.4, 1e6, "")]
    [InlineData(84, 0.6, 0.4, 0.3e6, "coil-thin-wire")]
    [InlineData(84, 0.6, 0.4, 3.7e6, "")]
    [InlineData(84, 0.6, 0.4, 3.8e6, "coil-not-lumped")]
    [InlineData(20, 0.6, 0.4, 1e6, "coil-few-turns")]
    [InlineData(40, 6.0, 0.4, 1e6, "coil-wide-pitch")]
    [InlineData(3, 0.6, 0.4, 1e6, "coil-few-turns,coil-short")]
    [InlineData(1, 0.6, 0.4, 1e6, "")]
    public void Leaving_a_table_is_said(int turns, double pitchMillimetre, double wireMillimetre, double hz, string codes)
    {
        Coil coil = new(Winding.OnForm(0.05, new Wire(wireMillimetre * 1e-3), turns, pitchMillimetre * 1e-3));
        Assert.Equal(codes, string.Join(',', coil.CautionsAt(hz).Select(caution => caution.Code)));
    }

    [Fact]
    public void Measured_q_needs_no_table_of_loss() =>
        Assert.Empty(new Coil(Winding.OnForm(0.05, _wire, 20, 0.6e-3), measured: (100.0, 1e6)).CautionsAt(1e6));

    [Fact]
    public void Windings_in_the_same_place_are_refused()
    {
        Winding main = Winding.OnForm(0.05, _wire, 84, 0.6e-3);
        ArgumentException refused = Assert.Throws<ArgumentException>(
            () => new Coil([main, Winding.OnForm(0.05, _wire, 10, 0.6e-3, startMetre: 0.03)]));
        Assert.Contains("same place", refused.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => new Coil([main, Winding.OnForm(0.05, _wire, 10, 0.5e-3, startMetre: 0.0501)]));
        Assert.Equal(2, new Coil([main, Winding.OnForm(0.05088, _wire, 10, 0.6e-3, startMetre: 0.03)]).SectionCount);
    }

    [Fact]
    public void Impossible_coils_are_refused()
    {
        Winding winding = Winding.OnForm(0.05, _wire, 10);
        Assert.Throws<ArgumentException>(() => new Coil([]));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Coil(winding, formLossQ: 0.0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Coil(winding, measured: (double.NaN, 1e6)));
        Assert.Throws<ArgumentOutOfRangeException>(() => new Coil(winding, measured: (100.0, 0.0)));
        Coil coil = new(winding);
        Assert.Throws<ArgumentOutOfRangeException>(() => coil.Henry(0, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => coil.Q(0.0, 20.0));
        Assert.Throws<ArgumentException>(() => coil.SeriesOhm(1e6, 20.0, new double[2]));
        Assert.Throws<ArgumentOutOfRangeException>(() => coil.SeriesOhm(-1.0, 20.0, new double[1]));
    }
}
