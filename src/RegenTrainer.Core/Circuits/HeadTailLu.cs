using System.Numerics;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// Elimination of a real matrix whose nonlinear part touches few unknowns: the head, everything linear, is eliminated once per
/// set of values and the tail, the devices' own unknowns, again at every Newton step.
/// </summary>
/// <param name="size">Number of unknowns, from 1.</param>
/// <param name="rows">Row of each entry; each place at most once.</param>
/// <param name="columns">Column of each entry.</param>
/// <param name="late">The unknowns between which entries change from step to step.</param>
public sealed class HeadTailLu(int size, int[] rows, int[] columns, int[] late)
{
    /// <summary>A multiplier above this says that the plan does not suit the values (it would cost that many digits).</summary>
    private const double LargestMultiplier = 1e7;

    private LuPlan? _plan;
    private double[] _head = [];
    private double[] _values = [];
    private double[] _inverse = [];
    private double[] _forward = [];
    private double[] _scratch = [];
    private int _tailTarget;

    /// <summary>Eliminates the head of the linear matrix and of its right side.</summary>
    /// <param name="linear">Entries of the linear part.</param>
    /// <param name="sample">Entries with the devices stamped in, to steer the choice of pivots where there is no plan yet.</param>
    /// <param name="right">The linear right side.</param>
    /// <param name="blamed">The unknown at which a singular matrix fails; -1 otherwise.</param>
    public bool TryHead(ReadOnlySpan<double> linear, ReadOnlySpan<double> sample, ReadOnlySpan<double> right, out int blamed)
    {
        blamed = -1;
        if (_plan is null || !RunHead(linear, right))
        {
            if (!TryPlan(sample, out blamed) || !RunHead(linear, right))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>Whether pivots have been chosen.</summary>
    public bool HasPlan => _plan is not null;

    /// <summary>Forgets the plan, so that the next head makes one for its values.</summary>
    public void Forget() => _plan = null;

    /// <summary>Starts a Newton step: the matrix and right side as the head left them. Stamps may be added to the entries between late unknowns.</summary>
    public Span<double> BeginTail(Span<double> right)
    {
        _head.CopyTo(_values, 0);
        _forward.CopyTo(right);
        return _values;
    }

    /// <summary>Eliminates the tail and solves; <paramref name="right"/> becomes the solution.</summary>
    public bool TryTail(Span<double> right, out int blamed)
    {
        LuPlan plan = _plan!;
        blamed = -1;
        if (!Eliminate(plan, plan.HeadSteps, plan.Size, _tailTarget, right, out _))
        {
            blamed = Array.FindIndex(_inverse, v => !double.IsFinite(v)) is var k && k >= 0 ? plan.PivotColumn[k] : -1;
            return false;
        }

        right.CopyTo(_scratch);
        for (int k = plan.Size - 1; k >= 0; k--)
        {
            double sum = _scratch[plan.PivotRow[k]];
            for (int u = plan.UpperStart[k]; u < plan.UpperStart[k + 1]; u++)
            {
                sum -= _values[plan.Upper[u]] * right[plan.UpperColumn[u]];
            }

            right[plan.PivotColumn[k]] = sum * _inverse[k];
        }

        return true;
    }

    /// <summary>Solves with the last factored matrix for another right side; <paramref name="right"/> becomes the solution.</summary>
    public void Solve(Span<double> right)
    {
        LuPlan plan = _plan ?? throw new InvalidOperationException("nothing factored yet");
        for (int k = 0; k < plan.Size; k++)
        {
            double b = right[plan.PivotRow[k]];
            for (int l = plan.LowerStart[k]; l < plan.LowerStart[k + 1]; l++)
            {
                right[plan.LowerRow[l]] -= _values[plan.Lower[l]] * b;
            }
        }

        right.CopyTo(_scratch);
        for (int k = plan.Size - 1; k >= 0; k--)
        {
            double sum = _scratch[plan.PivotRow[k]];
            for (int u = plan.UpperStart[k]; u < plan.UpperStart[k + 1]; u++)
            {
                sum -= _values[plan.Upper[u]] * right[plan.UpperColumn[u]];
            }

            right[plan.PivotColumn[k]] = sum * _inverse[k];
        }
    }

    private bool TryPlan(ReadOnlySpan<double> sample, out int blamed)
    {
        var entries = new Complex[sample.Length];
        for (int k = 0; k < entries.Length; k++)
        {
            entries[k] = sample[k];
            if (!double.IsFinite(sample[k]))
            {
                blamed = columns[k];
                return false;
            }
        }

        _plan = LuPlan.TryFind(size, rows, columns, entries, out blamed, late);
        if (_plan is null)
        {
            return false;
        }

        (_head, _values) = (new double[_plan.ValueCount], new double[_plan.ValueCount]);
        (_inverse, _forward, _scratch) = (new double[size], new double[size], new double[size]);
        return true;
    }

    private bool RunHead(ReadOnlySpan<double> linear, ReadOnlySpan<double> right)
    {
        LuPlan plan = _plan!;
        linear.CopyTo(_values);
        Array.Clear(_values, linear.Length, _values.Length - linear.Length);
        right.CopyTo(_forward);
        bool good = Eliminate(plan, 0, plan.HeadSteps, 0, _forward, out _tailTarget);
        _values.CopyTo(_head, 0);
        return good;
    }

    private bool Eliminate(LuPlan plan, int from, int to, int firstTarget, Span<double> right, out int nextTarget)
    {
        double[] values = _values;
        int[] lower = plan.Lower, lowerRow = plan.LowerRow, upper = plan.Upper, target = plan.Target;
        double largest = 0;
        int t = firstTarget;
        for (int k = from; k < to; k++)
        {
            double inverse = 1 / values[plan.Diagonal[k]], b = right[plan.PivotRow[k]];
            _inverse[k] = inverse;
            int firstUpper = plan.UpperStart[k], endUpper = plan.UpperStart[k + 1];
            for (int l = plan.LowerStart[k]; l < plan.LowerStart[k + 1]; l++)
            {
                double factor = values[lower[l]] * inverse;
                values[lower[l]] = factor;
                largest = Math.Max(largest, Math.Abs(factor));
                right[lowerRow[l]] -= factor * b;
                for (int u = firstUpper; u < endUpper; u++)
                {
                    values[target[t++]] -= factor * values[upper[u]];
                }
            }
        }

        nextTarget = t;
        return largest < LargestMultiplier && double.IsFinite(_inverse[to - 1 < 0 ? 0 : to - 1]);
    }
}
