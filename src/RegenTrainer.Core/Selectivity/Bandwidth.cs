using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Selectivity;

/// <summary>The two -3 dB frequencies of the actual response around its peak.</summary>
public static class Bandwidth
{
    private const double GoldenRatio = 0.381966011250105;

    /// <summary>The peak is bracketed to this fraction of the tank's half bandwidth; its level is then exact to the square of it.</summary>
    private const double PeakTolerance = 3e-6;

    private const double EdgeTolerance = 1e-12;

    private const double StepGrowth = 1.3;

    /// <summary>Finds the two frequencies at which the response is 3 dB (half the power) below its peak.</summary>
    /// <param name="ws">Workspace with the pencil of the setting.</param>
    /// <param name="tankHz">Frequency of the tank mode in Hz.</param>
    /// <param name="halfWidthHz">Half the bandwidth a lone tank of the mode's damping would have, in Hz, above 0.</param>
    /// <returns>Lower and upper frequency in Hz; null where one side never falls by 3 dB between half and twice the tank's frequency.</returns>
    public static (double Lower, double Upper)? TryFind(StageWorkspace ws, double tankHz, double halfWidthHz)
    {
        var transfer = new Transfer(ws);
        double peak = PeakOffset(transfer, tankHz, halfWidthHz);
        double half = transfer.Power(tankHz + peak) / 2;
        double? lower = Edge(transfer, tankHz, peak, -halfWidthHz / 2, half, tankHz / 2);
        double? upper = Edge(transfer, tankHz, peak, halfWidthHz / 2, half, tankHz);
        return lower is { } l && upper is { } u ? (tankHz + l, tankHz + u) : null;
    }

    /// <summary>The peak's offset from the tank's frequency: climbed to by steps, then by golden section [Kiefer 1953].</summary>
    private static double PeakOffset(Transfer transfer, double tankHz, double halfWidth)
    {
        double centre = 0, step = halfWidth / 4, best = transfer.Power(tankHz);
        (double below, double above) = (transfer.Power(tankHz - step), transfer.Power(tankHz + step));
        int guard = 0;
        while ((below > best || above > best) && guard++ < 200)
        {
            bool up = above > below;
            centre += up ? step : -step;
            (below, best, above) = up
                ? (best, above, transfer.Power(tankHz + centre + step))
                : (transfer.Power(tankHz + centre - step), below, best);
        }

        (double a, double b) = (centre - step, centre + step);
        (double left, double right) = (a + (GoldenRatio * (b - a)), b - (GoldenRatio * (b - a)));
        (double fl, double fr) = (transfer.Power(tankHz + left), transfer.Power(tankHz + right));
        while (b - a > PeakTolerance * halfWidth)
        {
            if (fl > fr)
            {
                (b, right, fr) = (right, left, fl);
                left = a + (GoldenRatio * (b - a));
                fl = transfer.Power(tankHz + left);
            }
            else
            {
                (a, left, fl) = (left, right, fr);
                right = b - (GoldenRatio * (b - a));
                fr = transfer.Power(tankHz + right);
            }
        }

        return 0.5 * (a + b);
    }

    private static double? Edge(Transfer transfer, double tankHz, double peak, double step, double half, double reach)
    {
        (double inside, double fInside) = (peak, half);
        double outside = peak;
        while (true)
        {
            outside += step;
            step *= StepGrowth;
            if (Math.Abs(outside) > reach)
            {
                return null;
            }

            double f = transfer.Power(tankHz + outside) - half;
            if (f <= 0)
            {
                return RootSearch.Between(x => transfer.Power(tankHz + x) - half, inside, fInside, outside, f, EdgeTolerance * Math.Abs(outside));
            }

            (inside, fInside) = (outside, f);
        }
    }
}
