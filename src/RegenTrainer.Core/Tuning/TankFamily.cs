using System.Numerics;
using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Tuning;

/// <summary>The natural frequencies near the dial: two coupled tanks have two, and either may oscillate.</summary>
public static class TankFamily
{
    /// <summary>Modes within this factor of the dial belong to the tank family.</summary>
    public const double Factor = 2;

    /// <summary>Below this Q a mode does not ring.</summary>
    private const double SmallestQ = 0.5;

    /// <summary>Whether a natural frequency belongs to the tank family of a dial.</summary>
    /// <param name="s">The natural frequency in 1/s.</param>
    /// <param name="dialHz">Dial in Hz.</param>
    public static bool Contains(Complex s, double dialHz)
    {
        double hz = s.Imaginary / (2 * Math.PI);
        return Rings(s) && hz > dialHz / Factor && hz < dialHz * Factor;
    }

    /// <summary>
    /// Whether a natural frequency of the circuit without its regenerating device may come to belong to the family: the device's
    /// capacitances and the tuning move it by less than another such factor, while windings resonating by themselves stay far above.
    /// </summary>
    internal static bool MayContain(Complex s, double dialHz)
    {
        double ratio = s.Imaginary / (2 * Math.PI * dialHz);
        return ratio is > 1 / (Factor * Factor) and < Factor * Factor;
    }

    /// <summary>Whether a natural frequency rings rather than creeps.</summary>
    public static bool Rings(Complex s) => s.Imaginary > 0 && Complex.Abs(s) > 2 * SmallestQ * Math.Abs(s.Real) * (1 + 1e-9);

    /// <summary>
    /// The fastest growing mode of the family with the tank in the workspace: the tank's own mode where no other circuit is
    /// tuned near it.
    /// </summary>
    /// <param name="ws">Workspace with the pencil of the state.</param>
    /// <param name="dialHz">Dial in Hz.</param>
    /// <param name="state">The state in the workspace.</param>
    public static Complex FastestGrowing(StageWorkspace ws, double dialHz, in TankState state)
    {
        Complex fastest = state.Mode.S;
        if (ws.Resonances <= 1 || ModeSpectrum.TryFind(ws.Circuit, 2 * Math.PI * dialHz) is not { } modes)
        {
            return fastest;
        }

        foreach (SpectralMode mode in modes)
        {
            // The tank itself is among the modes, less exactly: only a clearly faster one is another.
            if (Contains(mode.S, dialHz) && mode.S.Real > fastest.Real + (1e-7 * fastest.Imaginary))
            {
                fastest = mode.S;
            }
        }

        return fastest;
    }
}
