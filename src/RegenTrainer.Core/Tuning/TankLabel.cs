using System.Numerics;
using RegenTrainer.Core.Circuits;

namespace RegenTrainer.Core.Tuning;

/// <summary>Finds which natural frequency belongs to the tuned circuit.</summary>
public static class TankLabel
{
    /// <summary>A tank rings: its Q with the device removed is above this.</summary>
    private const double SmallestQ = 5;

    /// <summary>Shares of energy closer than this factor count as equal, and the mode nearer the dial wins.</summary>
    private const double EqualShares = 0.9;

    /// <summary>
    /// The lightly damped mode with the largest share of its energy in the tuning capacitor, of equal ones the nearest to the
    /// dial. The pencil stands with the regenerating device removed; the mode's shape is left in the workspace, also as
    /// the left shape, which it equals in a reciprocal network.
    /// </summary>
    /// <param name="w">Workspace with the pencil set.</param>
    /// <param name="dialHz">Dial in Hz.</param>
    /// <param name="tuningFarad">The tuning capacitor of the present pencil, in farad.</param>
    /// <param name="s">The mode's natural frequency in 1/s.</param>
    /// <param name="resonances">How many lightly damped modes lie about the dial: more than one where circuits are coupled.</param>
    public static bool TryFind(Workspace w, double dialHz, double tuningFarad, out Complex s, out int resonances)
    {
        (s, resonances) = (default, 0);
        if (w.Network.Tuning is not { } tuning || ModeSpectrum.TryFind(w, 2 * Math.PI * dialHz) is not { } modes)
        {
            return false;
        }

        SpectralMode? best = null;
        (double bestShare, double bestDistance) = (0, double.PositiveInfinity);
        foreach (SpectralMode mode in modes)
        {
            if (mode.S.Imaginary <= 0 || Complex.Abs(mode.S) < -2 * SmallestQ * mode.S.Real)
            {
                continue;
            }

            resonances += TankFamily.MayContain(mode.S, dialHz) ? 1 : 0;
            double volt = Complex.Abs(NetworkValues.Across(mode.Shape, tuning.Pair.From, tuning.Pair.To));
            double share = tuningFarad * volt * volt / Energy(w, mode.Shape);
            double distance = Math.Abs(Math.Log(mode.S.Imaginary / (2 * Math.PI * dialHz)));
            bool equal = share > EqualShares * bestShare && share < bestShare / EqualShares;
            if (best is null || (equal ? distance < bestDistance : share > bestShare))
            {
                (best, bestShare, bestDistance) = (mode, share, distance);
            }
        }

        if (best is null)
        {
            return false;
        }

        best.Shape.CopyTo(w.Shape, 0);
        best.Shape.CopyTo(w.LeftShape, 0);
        s = best.S;
        return true;
    }

    /// <summary>Twice the electric and magnetic energy of a shape: capacitances stand positive in C, inductances negative.</summary>
    private static double Energy(Workspace w, Complex[] shape)
    {
        double sum = 0;
        foreach (int k in w.Network.CapacitiveEntries)
        {
            int row = w.Network.Rows[k];
            Complex product = Complex.Conjugate(shape[row]) * shape[w.Network.Columns[k]];
            sum += (w.Network.IsBranch(row) ? -1 : 1) * w.Values.C[k] * product.Real;
        }

        return sum;
    }
}
