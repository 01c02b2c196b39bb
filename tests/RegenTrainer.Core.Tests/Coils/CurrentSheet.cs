using RegenTrainer.Core.Coils;

namespace RegenTrainer.Core.Tests.Coils;

/// <summary>The cylindrical current sheet, which the handbooks start from; the program itself sums turns and never uses it.</summary>
internal static class CurrentSheet
{
    private const double MagneticConstant = 1.25663706212e-6;

    /// <summary>Inductance in H of a sheet in N strips [Lorenz 1879, Nagaoka 1909].</summary>
    public static double Henry(double radiusMetre, double lengthMetre, int turns)
    {
        double ratio = 2.0 * radiusMetre / lengthMetre;
        double m = ratio * ratio / (1.0 + (ratio * ratio));
        double rest = 1.0 / (1.0 + (ratio * ratio));
        double first = EllipticIntegrals.FirstKind(m);
        double second = EllipticIntegrals.SecondKind(m);
        double nagaoka = 4.0 / (3.0 * Math.PI * Math.Sqrt(rest)) * ((rest / m * (first - second)) + second - Math.Sqrt(m));
        return MagneticConstant * turns * turns * Math.PI * radiusMetre * radiusMetre / lengthMetre * nagaoka;
    }

    /// <summary>The program's sum over a thousand turns of round wire, made a sheet by Rosa's corrections [Rosa and Grover 1912].</summary>
    public static double HenryFromTurns(double radiusMetre, double lengthMetre)
    {
        const int Turns = 1000;
        double pitch = lengthMetre / Turns;
        Winding winding = new(radiusMetre, Turns, pitch, new Wire(0.5 * pitch, 0.5 * pitch), []);
        double sum = new Coil(winding, distribution: CurrentDistribution.Uniform).TotalHenry;

        // A(0.5) = -0.13629, B(1000) = 0.33639.
        return (sum + (MagneticConstant * radiusMetre * Turns * (-0.13629 + 0.33639))) / ((double)Turns * Turns);
    }
}
