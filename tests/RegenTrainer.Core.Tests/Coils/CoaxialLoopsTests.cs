using CsCheck;
using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class CoaxialLoopsTests
{
    // Rosa and Grover 1912, worked example: radii 20 and 25 cm, 10 cm apart, M = 248.787 cm (from memory, confirmed by scipy).
    [Fact]
    public void Worked_example_of_two_coaxial_circles() =>
        Assert.Equal(248.787e-9, CoaxialLoops.MutualHenry(0.20, 0.25, 0.10), 1e-12);

    // Maxwell 1873, art. 701, evaluated with scipy's elliptic integrals; nH.
    [Theory]
    [InlineData(0.25, 0.25, 0.01, 1036.66485)]
    [InlineData(0.25, 0.25, 0.05, 538.464)]
    [InlineData(0.25, 0.25, 0.1, 337.68472)]
    [InlineData(0.25, 0.25, 0.2, 167.08578)]
    [InlineData(0.1, 0.25, 0.2, 36.18333)]
    [InlineData(0.16, 0.25, 0.1, 164.27344)]
    [InlineData(0.01, 0.01, 0.002, 21.53856)]
    [InlineData(0.02, 0.025, 0.005, 36.10032)]
    [InlineData(0.025, 0.025, 0.025, 12.35196)]
    public void Coaxial_circles_agree_with_independent_values(double first, double second, double distance, double nanohenry) =>
        Assert.Equal(nanohenry, 1e9 * CoaxialLoops.MutualHenry(first, second, distance), 6e-6);

    // NIST DLMF 19.34.5: M by Carlson's symmetric integrals, here through his duplication theorem.
    [Fact]
    public void Mutual_inductance_agrees_with_Carlson_s_form() =>
        Gen.Select(Gen.Double[0.01, 1.0], Gen.Double[0.01, 1.0], Gen.Double[0.002, 1.0]).Sample((a, b, d) =>
        {
            double far = ((a + b) * (a + b)) + (d * d);
            double near = ((a - b) * (a - b)) + (d * d);
            (double rf, double rd) = Carlson(0.0, far, near);
            double expected = 2.0 / 3.0 * 1.25663706212e-6 * a * b * ((3.0 * rf) - (2.0 * near * rd));
            Assert.Equal(1.0, CoaxialLoops.MutualHenry(a, b, d) / expected, 1e-9);
        });

    // Far apart two loops are magnetic dipoles: M = mu0 pi a² b²/(2 d³) (any text on magnetostatics).
    [Fact]
    public void Distant_loops_are_dipoles()
    {
        double dipole = 1.25663706212e-6 * 3.141592653589793 * 1e-4 * 4e-4 / (2.0 * 1e9);
        Assert.Equal(1.0, CoaxialLoops.MutualHenry(0.01, 0.02, 1000.0) / dipole, 1e-8);
    }

    [Fact]
    public void Mutual_inductance_is_reciprocal_and_even_in_distance() =>
        Gen.Select(Gen.Double[0.01, 1.0], Gen.Double[0.01, 1.0], Gen.Double[0.002, 1.0]).Sample((a, b, d) =>
            Assert.Equal(CoaxialLoops.MutualHenry(a, b, d), CoaxialLoops.MutualHenry(b, a, -d), 1e-20));

    // Loop of 25 cm radius, wire of 0.05 cm radius (Rosa and Grover 1912): 2.05587 uH at low frequency, 1.97733 uH at high.
    [Fact]
    public void Single_turn_has_the_handbook_inductance()
    {
        Assert.Equal(2.05587e-6, CoaxialLoops.SelfHenry(0.25, 0.0005, CurrentDistribution.Uniform), 5e-12);
        Assert.Equal(1.97733e-6, CoaxialLoops.SelfHenry(0.25, 0.0005, CurrentDistribution.Surface), 5e-12);
    }

    // Rectangular sections filled with filaments. Brooks 1931 (b = c, a = 1.5 c): 1.6994 uH/m for one turn per metre of radius.
    // Wheeler's multilayer shape a = 1, l = 2/3, c = 0.6 in: 0.044654 uH (exact rectangular-section integral; his formula, good
    // to 1 %, gives 0.044444).
    [Theory]
    [InlineData(1.5, 1.0, 1.0, 1.69938 * 1.5)]
    [InlineData(0.0254, 0.0169333333, 0.01524, 0.044654)]
    public void Filled_sections_sum_to_the_published_inductance(double meanRadius, double length, double depth, double microhenry)
    {
        const int Rings = 24;
        double sum = 0.0;
        double meshLength = length / Rings;
        double meshDepth = depth / Rings;

        // Geometric mean distance of a rectangle from itself: 0.2235 of the sum of its sides (Maxwell 1873, art. 692).
        double own = 0.2235 * (meshLength + meshDepth);
        for (int inner = 0; inner < Rings; inner++)
        {
            double a = meanRadius + ((inner + 0.5 - (Rings / 2.0)) * meshDepth);
            for (int outer = 0; outer < Rings; outer++)
            {
                double b = meanRadius + ((outer + 0.5 - (Rings / 2.0)) * meshDepth);
                for (int lag = 1 - Rings; lag < Rings; lag++)
                {
                    double distance = lag == 0 && inner == outer ? own : lag * meshLength;
                    sum += (Rings - Math.Abs(lag)) * CoaxialLoops.MutualHenry(a, b, distance);
                }
            }
        }

        Assert.Equal(1.0, 1e6 * sum / Math.Pow(Rings, 4) / microhenry, 2e-4);
    }

    [Fact]
    public void Loops_in_the_same_place_are_refused()
    {
        ArgumentOutOfRangeException refused =
            Assert.Throws<ArgumentOutOfRangeException>(() => CoaxialLoops.MutualHenry(0.1, 0.1, 0.0));
        Assert.Contains("same place", refused.Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => CoaxialLoops.MutualHenry(0.1, double.NaN, 0.1));
        Assert.Throws<ArgumentOutOfRangeException>(() => CoaxialLoops.SelfHenry(0.001, 0.002, CurrentDistribution.Surface));
    }

    /// <summary>R_F(x, y, z) and R_D(x, y, z) by duplication [Carlson 1979].</summary>
    private static (double First, double Second) Carlson(double x, double y, double z)
    {
        double tail = 0.0;
        double power = 1.0;
        for (int step = 0; step < 40; step++)
        {
            double lambda = Math.Sqrt(x * y) + Math.Sqrt(x * z) + Math.Sqrt(y * z);
            tail += power / (Math.Sqrt(z) * (z + lambda));
            power *= 0.25;
            (x, y, z) = ((x + lambda) / 4.0, (y + lambda) / 4.0, (z + lambda) / 4.0);
        }

        double mean = (x + y + z) / 3.0;
        return (1.0 / Math.Sqrt(mean), (3.0 * tail) + (power / Math.Pow(mean, 1.5)));
    }
}
