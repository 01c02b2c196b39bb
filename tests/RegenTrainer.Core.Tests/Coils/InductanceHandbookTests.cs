using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

/// <summary>The sum over turns against the handbook tables and formulas of a century.</summary>
public sealed class InductanceHandbookTests
{
    private const double MagneticConstant = 1.25663706212e-6;

    /// <summary>Diameter over length, K of [Nagaoka 1909] as printed in NBS Circular 74 (from memory, confirmed with scipy).</summary>
    public static TheoryData<double, double> Nagaoka { get; } = new()
    {
        { 0.05, 0.9791 }, { 0.1, 0.9588 }, { 0.15, 0.9391 }, { 0.2, 0.9201 }, { 0.25, 0.9016 }, { 0.3, 0.8838 }, { 0.35, 0.8665 },
        { 0.4, 0.8499 }, { 0.45, 0.8337 }, { 0.5, 0.8181 }, { 0.55, 0.8031 }, { 0.6, 0.7885 }, { 0.65, 0.7745 }, { 0.7, 0.7609 },
        { 0.75, 0.7478 }, { 0.8, 0.7351 }, { 0.85, 0.7228 }, { 0.9, 0.7110 }, { 0.95, 0.6995 }, { 1.0, 0.6884 }, { 1.1, 0.6673 },
        { 1.2, 0.6475 }, { 1.25, 0.6381 }, { 1.3, 0.6290 }, { 1.4, 0.6115 }, { 1.5, 0.5950 }, { 1.6, 0.5795 }, { 1.7, 0.5649 },
        { 1.8, 0.5511 }, { 1.9, 0.5379 }, { 2.0, 0.5255 }, { 2.2, 0.5025 }, { 2.5, 0.4719 }, { 2.6, 0.4626 }, { 2.8, 0.4452 },
        { 3.0, 0.4292 }, { 3.5, 0.3944 }, { 4.0, 0.3654 }, { 4.5, 0.3409 }, { 5.0, 0.3198 }, { 5.5, 0.3015 }, { 6.0, 0.2854 },
        { 6.5, 0.2711 }, { 7.0, 0.2584 }, { 7.5, 0.2469 }, { 8.0, 0.2366 }, { 8.5, 0.2272 }, { 9.0, 0.2185 }, { 9.5, 0.2106 },
        { 10.0, 0.2033 }, { 20.0, 0.1236 }, { 100.0, 0.0350 },
    };

    [Theory]
    [MemberData(nameof(Nagaoka))]
    public void Sum_of_turns_gives_Nagaoka_s_coefficient(double diameterOverLength, double coefficient)
    {
        double length = 2.0 / diameterOverLength;
        double longSolenoid = MagneticConstant * Math.PI / length;
        Assert.Equal(coefficient, CurrentSheet.HenryFromTurns(1.0, length) / longSolenoid, 6e-5);
    }

    // NBS Circular 74: L = 0.03948 a² n² K/b uH, a and b in cm; a = 5 cm, b = 10 cm, n = 100, K = 0.6884 (u = 1).
    [Fact]
    public void Circular_74_formula_is_met()
    {
        double microhenry = 1e6 * CurrentSheet.HenryFromTurns(0.05, 0.10) * 100 * 100;
        Assert.Equal(0.03948 * 25.0 * 10000.0 * 0.6884 / 10.0, microhenry, 0.07);
    }

    // Error of [Wheeler 1928] against the exact sheet in percent, computed with scipy; the formula claims 1 % from l = 0.8 r.
    [Theory]
    [InlineData(0.2, -10.822)]
    [InlineData(0.4, -4.058)]
    [InlineData(0.6, -1.571)]
    [InlineData(0.8, -0.544)]
    [InlineData(1.0, -0.122)]
    [InlineData(1.5, 0.044)]
    [InlineData(2.0, -0.096)]
    [InlineData(3.0, -0.360)]
    [InlineData(4.0, -0.495)]
    [InlineData(6.0, -0.579)]
    [InlineData(8.0, -0.581)]
    [InlineData(10.0, -0.563)]
    [InlineData(20.0, -0.469)]
    public void Wheeler_s_formula_of_1928_misses_by_its_known_error(double lengthOverRadius, double percent)
    {
        double wheeler = 1.0 / (9.0 + (10.0 * lengthOverRadius));
        double microhenry = 1e6 * CurrentSheet.HenryFromTurns(0.0254, 0.0254 * lengthOverRadius);
        Assert.Equal(percent, 100.0 * ((wheeler / microhenry) - 1.0), 0.003);
    }

    // r = 1 in, l = 2 in, 100 turns: exact current sheet 345.159 uH (scipy); Wheeler's formula gives 344.83.
    [Fact]
    public void Hundred_turns_an_inch_in_radius() =>
        Assert.Equal(345.159e-6, 1e4 * CurrentSheet.HenryFromTurns(0.0254, 0.0508), 0.005e-6);

    // [Wheeler 1982] L = mu0 N² r [ln(1 + pi r/l) + 1/(2.3 + 1.6 l/r + 0.44 (l/r)²)], good to 0.1 %; computed: 0.001 to 0.0972 %.
    [Theory]
    [InlineData(0.01)]
    [InlineData(0.1)]
    [InlineData(0.5)]
    [InlineData(1.0)]
    [InlineData(3.0)]
    [InlineData(10.0)]
    public void Wheeler_s_formula_of_1982_holds_to_a_tenth_of_a_percent(double length)
    {
        double formula = MagneticConstant
            * (Math.Log(1.0 + (Math.PI / length)) + (1.0 / (2.3 + (1.6 * length) + (0.44 * length * length))));
        Assert.InRange((formula / CurrentSheet.HenryFromTurns(1.0, length)) - 1.0, 0.5e-5, 1.0e-3);
    }

    // [Lundin 1985], good to 3 ppm; five more for Rosa's correction, which neglects the curvature of the turns.
    [Theory]
    [InlineData(0.05)]
    [InlineData(0.3)]
    [InlineData(1.0)]
    [InlineData(2.0)]
    [InlineData(4.0)]
    [InlineData(10.0)]
    public void Lundin_s_formula_holds_to_parts_in_a_million(double length)
    {
        double x = 4.0 / (length * length);
        double formula = length >= 2.0
            ? MagneticConstant * Math.PI / length * (F1(x) - (4.0 / (3.0 * Math.PI) * 2.0 / length))
            : MagneticConstant * (((Math.Log(8.0 / length) - 0.5) * F1(1.0 / x)) + F2(1.0 / x));
        Assert.Equal(1.0, CurrentSheet.HenryFromTurns(1.0, length) / formula, 8e-6);

        static double F1(double x) => (1.0 + (0.383901 * x) + (0.017108 * x * x)) / (1.0 + (0.258952 * x));
        static double F2(double x) => (0.093842 * x) + (0.002029 * x * x) - (0.000801 * x * x * x);
    }

    // Rosa and Grover 1912, B(n) of the round-wire correction: to 15 turns as printed (from memory), beyond the exact sum.
    [Theory]
    [InlineData(1, 0.0)]
    [InlineData(2, 0.1137)]
    [InlineData(3, 0.1663)]
    [InlineData(4, 0.1973)]
    [InlineData(5, 0.2180)]
    [InlineData(6, 0.2329)]
    [InlineData(7, 0.2443)]
    [InlineData(8, 0.2532)]
    [InlineData(9, 0.2604)]
    [InlineData(10, 0.2664)]
    [InlineData(15, 0.2857)]
    [InlineData(20, 0.29637)]
    [InlineData(30, 0.30795)]
    [InlineData(40, 0.31424)]
    [InlineData(50, 0.31822)]
    [InlineData(100, 0.32689)]
    public void Difference_from_the_sheet_is_Rosa_s_B(int turns, double b)
    {
        // A(0.5) = -0.13629 from the other table.
        Assert.Equal(b, RosaCorrection(turns, 0.5) + 0.13629, 1e-4);
    }

    // Rosa and Grover 1912, A(d/D) of the round-wire correction (from memory, confirmed to 1e-4); B(10) = 0.2664.
    [Theory]
    [InlineData(1.0, 0.5568)]
    [InlineData(0.95, 0.5055)]
    [InlineData(0.9, 0.4515)]
    [InlineData(0.8, 0.3337)]
    [InlineData(0.7, 0.2001)]
    [InlineData(0.6, 0.0460)]
    [InlineData(0.5, -0.1363)]
    [InlineData(0.4, -0.3594)]
    [InlineData(0.3, -0.6471)]
    [InlineData(0.2, -1.0526)]
    [InlineData(0.1, -1.7457)]
    public void Difference_from_the_sheet_is_Rosa_s_A(double wireOverPitch, double a) =>
        Assert.Equal(a, RosaCorrection(10, wireOverPitch) - 0.2664, 1.5e-4);

    /// <summary>A + B as the program's sum over turns implies it.</summary>
    private static double RosaCorrection(int turns, double wireOverPitch)
    {
        const double Pitch = 1e-4;
        double wire = wireOverPitch * Pitch;
        Coil coil = new(new Winding(1.0, turns, Pitch, new Wire(wire, wire), []), distribution: CurrentDistribution.Uniform);
        return (CurrentSheet.Henry(1.0, turns * Pitch, turns) - coil.TotalHenry) / (MagneticConstant * turns);
    }
}
