using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

public sealed class CoilTests
{
    private static readonly Wire _thin = new(0.4e-3);

    // Nagaoka's current sheet with Rosa's round-wire correction, evaluated independently (scipy elliptic integrals).
    [Theory]
    [InlineData(25.0e-3, CurrentDistribution.Uniform, 314.14e-6)]
    [InlineData(25.0e-3, CurrentDistribution.Surface, 313.4e-6)]
    [InlineData(25.2e-3, CurrentDistribution.Surface, 317.6e-6)]
    public void Ninety_turns_have_the_inductance_of_the_corrected_current_sheet(
        double radiusMetre, CurrentDistribution distribution, double henry)
    {
        Coil coil = new(new Winding(radiusMetre, 90, 0.45e-3, _thin, []), distribution: distribution);
        double digits = distribution == CurrentDistribution.Uniform ? 0.005e-6 : 0.05e-6;
        Assert.Equal(henry, coil.TotalHenry, digits);
    }
}
