using CsCheck;
using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class EllipticIntegralsTests
{
    // Abramowitz and Stegun 1964, table 17.1 (from memory; the digits agree with scipy 1.10).
    [Fact]
    public void Half_parameter_has_the_tabulated_integrals()
    {
        Assert.Equal(1.8540746773, EllipticIntegrals.FirstKind(0.5), 5e-11);
        Assert.Equal(1.350643881, EllipticIntegrals.SecondKind(0.5), 5e-10);
    }

    // The integrals at their ends are elementary: an arc of a circle, and a straight line.
    [Fact]
    public void Ends_of_the_range_are_elementary()
    {
        Assert.Equal(1.5707963267948966, EllipticIntegrals.FirstKind(0.0), 1e-15);
        Assert.Equal(1.5707963267948966, EllipticIntegrals.SecondKind(0.0), 1e-15);
        Assert.Equal(1.0, EllipticIntegrals.SecondKind(1.0), 1e-15);
    }

    // Legendre's relation: E K' + E' K - K K' = pi/2.
    [Fact]
    public void Legendre_s_relation_holds() => Gen.Double[0.001, 0.999].Sample(m =>
    {
        double k = EllipticIntegrals.FirstKind(m);
        double e = EllipticIntegrals.SecondKind(m);
        double k1 = EllipticIntegrals.FirstKind(1.0 - m);
        double e1 = EllipticIntegrals.SecondKind(1.0 - m);
        Assert.Equal(1.5707963267948966, (e * k1) + (e1 * k) - (k * k1), 1e-13);
    });

    // The defining integrals by the trapezoid rule, which converges exponentially for a periodic integrand.
    [Theory]
    [InlineData(0.01)]
    [InlineData(0.3)]
    [InlineData(0.9)]
    [InlineData(0.99)]
    public void Integrals_agree_with_quadrature(double m)
    {
        const int Steps = 400;
        double first = 0.0;
        double second = 0.0;
        for (int step = 0; step < Steps; step++)
        {
            double sine = Math.Sin(Math.PI * step / Steps);
            double root = Math.Sqrt(1.0 - (m * sine * sine));
            first += 1.0 / root;
            second += root;
        }

        Assert.Equal(first * Math.PI / 2.0 / Steps, EllipticIntegrals.FirstKind(m), 1e-12);
        Assert.Equal(second * Math.PI / 2.0 / Steps, EllipticIntegrals.SecondKind(m), 1e-12);
    }

    [Theory]
    [InlineData(-1e-9)]
    [InlineData(1.0)]
    [InlineData(double.NaN)]
    public void First_kind_refuses_what_lies_outside(double m) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => EllipticIntegrals.FirstKind(m));
}
