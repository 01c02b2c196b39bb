using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Regeneration;

/// <summary>
/// Finds every travel at which the tank starts or stops oscillating: a scan of the element's value with slopes, so that a
/// double crossing between two points shows, then safeguarded Newton steps [Dahlquist and Bjorck 2008, sec. 6.3].
/// </summary>
public static class TipOverSolver
{
    /// <summary>Intervals of the scan; between points the growth is smooth on the scale of a decade of the element.</summary>
    private const int Intervals = 20;

    /// <summary>Ratio of the element's ends above which the scan is logarithmic.</summary>
    private const double LogarithmicFrom = 3;

    private const int RefineLimit = 60;

    /// <summary>A crossing is found when the place moves by less than this fraction of the scan.</summary>
    private const double PlaceTolerance = 1e-11;

    /// <summary>Finds the crossings.</summary>
    /// <param name="ws">Workspace of the stage; its state afterwards belongs to the last point looked at.</param>
    /// <param name="query">Dial, temperature and the rest; its control value is ignored.</param>
    /// <param name="law">The control's law.</param>
    /// <param name="hint">A tank nearby whose shapes stand in the workspace; changes no result.</param>
    /// <param name="stop">Why a point could not be solved; converged otherwise.</param>
    /// <returns>The crossings, or null where a point could not be solved.</returns>
    public static TipOver? TryFind(StageWorkspace ws, in TankQuery query, IControlLaw law, in TankHint hint, out SolveStop stop)
    {
        (double start, double end) = (law.ValueAtStart, law.ValueAtEnd);
        bool logarithmic = Math.Min(start, end) > 0 && Math.Max(start, end) > LogarithmicFrom * Math.Min(start, end);
        var growth = new GrowthAlongControl(ws, query, hint, logarithmic);
        (double from, double to) = (growth.PlaceOf(start), growth.PlaceOf(end));
        Span<double> places = stackalloc double[Intervals + 1];
        Span<double> values = stackalloc double[Intervals + 1];
        Span<double> slopes = stackalloc double[Intervals + 1];
        for (int k = 0; k <= Intervals; k++)
        {
            places[k] = from + ((to - from) * k / Intervals);
            if (!growth.TryPoint(places[k], out values[k], out slopes[k]))
            {
                stop = growth.Stop;
                return null;
            }
        }

        var crossings = new List<Crossing>();
        for (int k = Intervals - 1; k >= 0; k--)   // backwards: the scan has just ended at the far stop
        {
            Bracket(ref growth, law, places[k], values[k], slopes[k], places[k + 1], values[k + 1], slopes[k + 1], crossings);
        }

        stop = SolveStop.Converged;
        crossings.Sort((a, b) => a.TravelPercent.CompareTo(b.TravelPercent));
        TipOverState state = crossings.Count switch
        {
            0 => values[0] > 0 ? TipOverState.Always : TipOverState.Never,
            1 => TipOverState.Once,
            _ => TipOverState.Several,
        };
        return new TipOver(state, crossings);
    }

    private static void Bracket(
        ref GrowthAlongControl growth, IControlLaw law, double a, double fa, double da, double b, double fb, double db, List<Crossing> crossings)
    {
        if (fa * fb < 0)
        {
            crossings.Add(Refine(ref growth, law, a, fa, b, fb));
            return;
        }

        // The cubic through values and slopes shows an excursion to the other side between two points of one sign.
        double width = b - a;
        if (Excursion(fa, da * width, fb, db * width) is { } t
            && growth.TryPoint(a + (t * width), out double fm, out _) && fm * fa < 0)
        {
            double middle = a + (t * width);
            crossings.Add(Refine(ref growth, law, middle, fm, b, fb));
            crossings.Add(Refine(ref growth, law, a, fa, middle, fm));
        }
    }

    /// <summary>Place in 0..1 of the cubic's extremum beyond or within a twentieth of zero; null where there is none.</summary>
    private static double? Excursion(double f0, double d0, double f1, double d1)
    {
        if (double.IsNaN(d0) || double.IsNaN(d1))
        {
            return null;
        }

        double sign = Math.Sign(f0);
        double c2 = (3 * (f1 - f0)) - (2 * d0) - d1, c3 = (2 * (f0 - f1)) + d0 + d1;
        double discriminant = (c2 * c2) - (3 * c3 * d0);
        if (discriminant < 0)
        {
            return null;
        }

        double? best = null;
        double lowest = 0.05 * Math.Min(Math.Abs(f0), Math.Abs(f1));
        double q = -(c2 + Math.CopySign(Math.Sqrt(discriminant), c2));
        ReadOnlySpan<double> candidates = [q / (3 * c3), d0 / q];
        foreach (double t in candidates)
        {
            if (t is > 0 and < 1)
            {
                double f = sign * (f0 + (t * (d0 + (t * (c2 + (t * c3))))));
                if (f < lowest)
                {
                    (best, lowest) = (t, f);
                }
            }
        }

        return best;
    }

    private static Crossing Refine(ref GrowthAlongControl growth, IControlLaw law, double a, double fa, double b, double fb)
    {
        double scan = Math.Abs(growth.PlaceOf(law.ValueAtEnd) - growth.PlaceOf(law.ValueAtStart));
        double u = a + ((b - a) * fa / (fa - fb));
        for (int step = 0; step < RefineLimit; step++)
        {
            if (!growth.TryPoint(u, out double f, out double slope))
            {
                break;
            }

            if (f * fa > 0)
            {
                a = u;
            }
            else
            {
                b = u;
            }

            double next = u - (f / slope);
            if (!(next > Math.Min(a, b) && next < Math.Max(a, b)))
            {
                next = Math.Abs(f / slope) < PlaceTolerance * scan ? u : 0.5 * (a + b);
            }

            double moved = Math.Abs(next - u);
            u = next;
            if (moved < PlaceTolerance * scan)
            {
                break;
            }
        }

        double value = growth.ValueAt(u);
        double travel = law.TravelAt(value) ?? (Math.Abs(value - law.ValueAtStart) < Math.Abs(value - law.ValueAtEnd) ? 0 : 100);
        return new Crossing(value, travel, law.DegreesAt(travel), fa < 0, growth.State.Mode.Hz, growth.State.Mode.TuningFarad);
    }
}
