using MathNet.Numerics;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Factorization;

namespace RegenTrainer.Core.Circuits;

/// <summary>The one door to the general linear algebra library: single-threaded, and no result without a check.</summary>
public static class LinearAlgebra
{
    /// <summary>Largest residual of an eigenpair relative to the matrix's norm that is taken as converged.</summary>
    private const double ResidualTolerance = 1e-6;

    static LinearAlgebra() => Control.UseSingleThread();

    /// <summary>All eigenvalues and vectors of a real matrix, checked by the residual of each real part.</summary>
    /// <param name="matrix">A square matrix.</param>
    /// <param name="evd">The decomposition; null where it failed.</param>
    /// <returns>Whether the matrix was finite and the decomposition reproduces it.</returns>
    public static bool TryEigen(Matrix<double> matrix, out Evd<double>? evd)
    {
        evd = null;
        foreach (double value in matrix.Enumerate())
        {
            if (!double.IsFinite(value))
            {
                return false;
            }
        }

        try
        {
            evd = matrix.Evd(Symmetricity.Asymmetric);
        }
        catch (NonConvergenceException)
        {
            return false;
        }

        double norm = matrix.FrobeniusNorm();
        double residual = ((matrix * evd.EigenVectors) - (evd.EigenVectors * evd.D)).FrobeniusNorm();
        if (residual <= ResidualTolerance * norm * Math.Max(1, evd.EigenVectors.FrobeniusNorm()))
        {
            return true;
        }

        evd = null;
        return false;
    }
}
