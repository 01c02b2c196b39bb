using System.Numerics;
using RegenTrainer.Core.Antennas;

namespace RegenTrainer.Core.Tests.Antennas;

public sealed class WireOverGroundTests
{
    // The input impedance of an open line is -j Z0 cot(x), x its length in radian: any textbook of transmission lines.
    [Theory]
    [InlineData(0.05, 19.98333)]
    [InlineData(0.3, 3.232728)]
    [InlineData(0.7853981634, 1.0)]
    [InlineData(1.0, 0.6420926)]
    [InlineData(1.3, 0.2776158)]
    [InlineData(1.5, 0.07091484)]
    public void Three_parts_stand_for_the_open_line_up_to_the_quarter_wave(double radian, double cotangent)
    {
        WireOverGround wire = new(25, 8, 2e-3);
        double z0 = Math.Sqrt(wire.Henry / wire.Farad);
        double omega = radian / Math.Sqrt(wire.Henry * wire.Farad);
        Complex jw = new(0, omega);
        Complex branch = (jw * wire.BranchHenry) + (1 / (jw * wire.BranchFarad));
        Complex admittance = (1 / branch) + (jw * wire.ShuntFarad);
        Assert.Equal(1.0 / cotangent, admittance.Imaginary * z0, 0.005 / cotangent);
    }

    // A quarter-wave mast: 36.6 ohm, half of the 73.1 ohm of the half-wave dipole (Terman 1943; any textbook).
    [Fact]
    public void A_quarter_wave_upright_radiates_as_the_textbooks_say()
    {
        WireOverGround wire = new(75, 75, 20e-3);
        Assert.Equal(36.6, wire.RadiationOhm(wire.QuarterWaveHz), 3.7);
    }

    // 40 pi^2 (h/lambda)^2 for a short upright wire, 160 pi^2 (h/lambda)^2 where a long level part keeps its current even
    // (Terman 1943, from memory): 10 m at 299.792458 kHz, a hundredth of the wavelength, gives 0.0394784 and 0.1579137 ohm.
    [Fact]
    public void Short_wires_radiate_as_the_textbooks_say()
    {
        Assert.Equal(0.0394784, new WireOverGround(10, 10, 2e-3).RadiationOhm(299792.458), 0.0394784 * 2e-3);
        Assert.Equal(0.1579137, new WireOverGround(1000, 10, 2e-3).RadiationOhm(299.792458) * 1e6, 0.1579137 * 0.015);
        Assert.Equal(5.0, new WireOverGround(10, 10, 2e-3).EffectiveHeightMetre(1e3), 1e-3);
    }

    // A straight wire over ground resonates somewhat below the frequency whose quarter wave is its length: 75 m and 999.3 kHz.
    [Theory]
    [InlineData(75, 75)]
    [InlineData(75, 10)]
    public void The_wire_is_a_quarter_wave_where_its_length_is(double length, double height) =>
        Assert.InRange(new WireOverGround(length, height, 2e-3).QuarterWaveHz, 0.95 * 999308.2, 999308.2);

    // 5 to 8 pF a metre is common practice for receiving wires.
    [Fact]
    public void A_receiving_wire_has_the_capacitance_the_trade_reckons_with() =>
        Assert.InRange(new WireOverGround(25, 8, 2e-3).Farad / 25, 5e-12, 8e-12);

    /// <summary>
    /// Charges on short pieces of the wire and of its image, so that all pieces lie at one potential [Harrington 1968, the method
    /// of moments]: an independent way to the capacitance, influence of upright and level part included.
    /// </summary>
    [Theory]
    [InlineData(10, 10, 2e-3)]
    [InlineData(25, 8, 2e-3)]
    [InlineData(60, 5, 1e-3)]
    [InlineData(100, 20, 5e-3)]
    public void Capacitance_agrees_with_charges_on_pieces_of_wire(double length, double height, double diameter)
    {
        double farad = ByPieces(length, height, 0.5 * diameter, 240);
        Assert.Equal(farad, new WireOverGround(length, height, diameter).Farad, 0.12 * farad);
    }

    [Fact]
    public void A_caution_says_where_the_wire_is_too_long()
    {
        WireOverGround wire = new(60, 8, 2e-3);
        Assert.Empty(wire.CautionsAt(1e6));
        Assert.Equal("long-wire-too-long", Assert.Single(wire.CautionsAt(1.7e6)).Code);
        Assert.Equal(wire.EffectiveHeightMetre(wire.QuarterWaveHz), wire.EffectiveHeightMetre(3e6), 1e-12);
    }

    [Fact]
    public void Faulty_wires_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new WireOverGround(5, 8, 2e-3));
        Assert.Throws<ArgumentOutOfRangeException>(() => new WireOverGround(5, 0.01, 2e-3));
        Assert.Throws<ArgumentOutOfRangeException>(() => new WireOverGround(5, 1, 0.2));
        Assert.Throws<ArgumentOutOfRangeException>(() => new WireOverGround(5, 1, 2e-3).RadiationOhm(0));
    }

    private static double ByPieces(double length, double height, double radius, int count)
    {
        double step = length / count;
        (double X, double Y)[] middles =
        [
            .. Enumerable.Range(0, count).Select(k => (k + 0.5) * step).Select(s => s < height ? (0.0, s) : (s - height, height)),
        ];
        double[,] potential = new double[count, count];
        double[] right = new double[count];
        for (int i = 0; i < count; i++)
        {
            right[i] = 1;
            for (int j = 0; j < count; j++)
            {
                double away = double.Hypot(middles[i].X - middles[j].X, middles[i].Y - middles[j].Y);
                double image = double.Hypot(middles[i].X - middles[j].X, middles[i].Y + middles[j].Y);
                double own = i == j ? 2 * Math.Log(step / radius) : step / away;
                potential[i, j] = (own - (step / image)) / (4 * Math.PI * 8.8541878128e-12);
            }
        }

        double[] perMetre = MathNet.Numerics.LinearAlgebra.Double.DenseMatrix.OfArray(potential)
            .Solve(MathNet.Numerics.LinearAlgebra.Double.DenseVector.OfArray(right)).ToArray();
        return step * perMetre.Sum();
    }
}
