using System.Numerics;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// Polishes a natural frequency of the pencil by two-sided Rayleigh quotient iteration [Ostrowski 1959; Parlett 1974], and
/// where asked solves the tuning capacitor at the same time so that the mode stands at a given frequency.
/// </summary>
public static class ModeSolver
{
    /// <summary>The iteration squares its error at least, so that a last change of this size leaves rounding only.</summary>
    private const double Tolerance = 1e-8;

    private const int StepLimit = 40;

    /// <summary>A single step may change the tuning by this fraction of the mode's own frequency at most.</summary>
    private const double LargestTuningStep = 0.2;

    /// <summary>Polishes the mode near <paramref name="s"/>, starting from the shapes in the workspace, which it replaces.</summary>
    /// <param name="w">Workspace with the pencil set at <paramref name="tuningFarad"/>.</param>
    /// <param name="s">Start, in 1/s.</param>
    /// <param name="tuningFarad">The tuning capacitor of the present pencil, in farad.</param>
    /// <param name="followRadians">The angular frequency at which the capacitor shall hold the mode; null leaves the capacitor alone.</param>
    public static ModeResult Polish(Workspace w, Complex s, double tuningFarad, double? followRadians)
    {
        w.MultiplyC(w.Shape, w.CShape, transposed: false);
        w.MultiplyC(w.LeftShape, w.CLeftShape, transposed: true);
        Complex startWeight = Workspace.Dot(w.LeftShape, w.CShape);
        w.CShape.CopyTo(w.StartCShape, 0);
        w.CLeftShape.CopyTo(w.StartCLeftShape, 0);
        double residual = double.PositiveInfinity;
        for (int iteration = 1; iteration <= StepLimit; iteration++)
        {
            if (!w.TryFactorPencil(s, out _) && !w.TryFactorPencil(s * (1 + 1e-14), out _))
            {
                return new ModeResult(s, tuningFarad, SolveStop.Singular, iteration, residual, 0);
            }

            w.CShape.CopyTo(w.NextShape, 0);
            w.CLeftShape.CopyTo(w.NextLeftShape, 0);
            w.PencilLu.SolveBoth(w.NextShape, w.NextLeftShape);
            if (!Workspace.TryScale(w.NextLeftShape, w.LeftShape, out _) || !Workspace.TryScale(w.NextShape, w.Shape, out double scale))
            {
                return new ModeResult(s, tuningFarad, SolveStop.NotFinite, iteration, residual, 0);
            }

            // z' A y = z' (C x_old), so the quotient needs no product with G and loses no figures.
            Complex numerator = scale * Workspace.Dot(w.LeftShape, w.CShape);
            w.MultiplyC(w.Shape, w.CShape, transposed: false);
            Complex weight = Workspace.Dot(w.LeftShape, w.CShape);
            Complex step = -numerator / weight;
            s += step;
            residual = Complex.Abs(step) / Complex.Abs(s);
            double tuningResidual = 0;
            if (followRadians is { } omega)
            {
                tuningResidual = Retune(w, ref s, ref tuningFarad, omega);
            }

            if (!double.IsFinite(residual))
            {
                return new ModeResult(s, tuningFarad, SolveStop.NotFinite, iteration, residual, 0);
            }

            if (residual < Tolerance && tuningResidual < Tolerance)
            {
                double overlap = OverlapWithStart(w, startWeight * weight);
                return new ModeResult(s, tuningFarad, SolveStop.Converged, iteration, residual, overlap);
            }

            w.MultiplyC(w.LeftShape, w.CLeftShape, transposed: true);
        }

        return new ModeResult(s, tuningFarad, SolveStop.StepLimit, StepLimit, residual, 0);
    }

    /// <summary>The derivative of the mode by the tuning capacitor, in 1/(s F), at the shapes in the workspace.</summary>
    public static Complex ByTuning(Workspace w, Complex s)
    {
        if (w.Network.Tuning is not { } tuning)
        {
            return Complex.Zero;
        }

        Complex across = NetworkValues.Across(w.LeftShape, tuning.Pair.From, tuning.Pair.To)
            * NetworkValues.Across(w.Shape, tuning.Pair.From, tuning.Pair.To);
        return -(s + w.Values.TuningLossPerFarad) * across / Workspace.Dot(w.LeftShape, w.CShape);
    }

    /// <summary>
    /// Moves the capacitor so that the mode comes to stand at the wanted frequency, by a step exact for a lone tank
    /// (1/frequency squared is linear in capacitance). Returns the change relative to the frequency.
    /// </summary>
    private static double Retune(Workspace w, ref Complex s, ref double tuningFarad, double omega)
    {
        Complex slope = ByTuning(w, s);
        if (slope.Imaginary == 0)
        {
            return double.PositiveInfinity;
        }

        double deviation = (omega - s.Imaginary) / omega;
        double bounded = Math.Clamp(deviation, -LargestTuningStep, LargestTuningStep);
        double target = s.Imaginary + (bounded * omega);
        double change = s.Imaginary * (1 - (s.Imaginary * s.Imaginary / (target * target))) / (2 * slope.Imaginary);
        if (!double.IsFinite(change))
        {
            return double.PositiveInfinity;
        }

        tuningFarad += change;
        w.Values.SetTuning(change);
        s = new Complex(s.Real + (slope.Real * change), target);
        AddAcrossTuning(w, w.Shape, w.CShape, change);
        return Math.Abs(deviation);
    }

    /// <summary>Brings C x up to date after a change of the tuning capacitor.</summary>
    private static void AddAcrossTuning(Workspace w, Complex[] shape, Complex[] product, double change)
    {
        PairStamp pair = w.Network.Tuning!.Value.Pair;
        Complex charge = change * NetworkValues.Across(shape, pair.From, pair.To);
        if (pair.From >= 0)
        {
            product[pair.From] += charge;
        }

        if (pair.To >= 0)
        {
            product[pair.To] -= charge;
        }
    }

    /// <summary>How much of the start is in the result: 1 for the same mode, 0 for another, whatever the scale of the shapes.</summary>
    private static double OverlapWithStart(Workspace w, Complex weights)
    {
        double scale = Complex.Abs(weights);
        double cross = Complex.Abs(Workspace.Dot(w.StartCLeftShape, w.Shape) * Workspace.Dot(w.LeftShape, w.StartCShape));
        return scale > 0 ? Math.Min(1, cross / scale) : 0;
    }
}
