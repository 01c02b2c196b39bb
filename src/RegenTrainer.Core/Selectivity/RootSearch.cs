namespace RegenTrainer.Core.Selectivity;

/// <summary>A bracketed root without slopes: regula falsi with Illinois weights [Dowell and Jarratt 1971].</summary>
internal static class RootSearch
{
    private const int StepLimit = 100;

    /// <summary>Finds a root between two places of opposite sign.</summary>
    /// <param name="f">A continuous function.</param>
    /// <param name="a">One end.</param>
    /// <param name="fa">Its value there.</param>
    /// <param name="b">The other end.</param>
    /// <param name="fb">Its value there, of the other sign or zero.</param>
    /// <param name="tolerance">Absolute, in the unit of the places.</param>
    public static double Between(Func<double, double> f, double a, double fa, double b, double fb, double tolerance)
    {
        for (int step = 0; step < StepLimit && Math.Abs(b - a) > tolerance && fb != 0; step++)
        {
            double next = b - (fb * (b - a) / (fb - fa));
            double value = f(next);
            if (value * fb < 0)
            {
                (a, fa) = (b, fb);
            }
            else
            {
                fa /= 2;
            }

            double moved = Math.Abs(next - b);
            (b, fb) = (next, value);
            if (moved < tolerance)
            {
                break;
            }
        }

        return b;
    }
}
