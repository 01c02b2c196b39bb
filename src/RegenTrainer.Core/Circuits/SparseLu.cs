using System.Numerics;
using System.Runtime.CompilerServices;
using System.Runtime.InteropServices;
using System.Runtime.Intrinsics;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// Gaussian elimination along a fixed plan, for real and complex matrices, without allocation once the plan exists. A set of
/// values for which the plan's pivots are poor gets a plan of its own.
/// </summary>
/// <typeparam name="T"><see cref="double"/> or <see cref="Complex"/>.</typeparam>
public sealed class SparseLu<T>
    where T : struct, INumberBase<T>
{
    /// <summary>A multiplier above this says that the plan does not suit the values (it would cost that many digits).</summary>
    private const double LargestMultiplier = 1e5;

    private readonly int[] _rows;
    private readonly int[] _columns;
    private LuPlan? _plan;
    private T[] _values = [];
    private T[] _inverse = [];
    private T[] _scratch = [];
    private T[] _transposedScratch = [];

    /// <summary>Prepares for matrices of one pattern.</summary>
    /// <param name="size">Number of unknowns, from 1.</param>
    /// <param name="rows">Row of each entry; each place at most once.</param>
    /// <param name="columns">Column of each entry.</param>
    public SparseLu(int size, int[] rows, int[] columns)
    {
        if (typeof(T) != typeof(double) && typeof(T) != typeof(Complex))
        {
            throw new NotSupportedException($"no elimination over {typeof(T).Name}");
        }

        (Size, _rows, _columns) = (size, rows, columns);
    }

    /// <summary>Number of unknowns.</summary>
    public int Size { get; }

    /// <summary>Factors the matrix with the given entries.</summary>
    /// <param name="entries">A value for each entry of the pattern.</param>
    /// <param name="blamed">The unknown at which a singular matrix fails; -1 otherwise.</param>
    /// <returns>Whether the matrix could be factored.</returns>
    public bool TryFactor(ReadOnlySpan<T> entries, out int blamed)
    {
        blamed = -1;
        if (_plan is not null && Eliminate(entries, out _) < LargestMultiplier)
        {
            return true;
        }

        var sample = new Complex[entries.Length];
        for (int k = 0; k < sample.Length; k++)
        {
            sample[k] = ToComplex(entries[k]);
            if (!Complex.IsFinite(sample[k]))
            {
                blamed = _columns[k];
                return false;
            }
        }

        LuPlan? plan = LuPlan.TryFind(Size, _rows, _columns, sample, out blamed);
        if (plan is null)
        {
            return false;
        }

        _plan = plan;
        _values = new T[plan.ValueCount];
        _inverse = new T[Size];
        _scratch = new T[Size];
        _transposedScratch = new T[Size];
        return double.IsFinite(Eliminate(entries, out blamed));
    }

    /// <summary>Solves A x = b for the factored A; <paramref name="rightSide"/> becomes x.</summary>
    public void Solve(Span<T> rightSide)
    {
        LuPlan plan = _plan ?? throw new InvalidOperationException("nothing factored yet");
        CheckLength(rightSide.Length);
        ref T x = ref MemoryMarshal.GetReference(rightSide);
        ref T y = ref MemoryMarshal.GetArrayDataReference(_scratch);
        ref T values = ref MemoryMarshal.GetArrayDataReference(_values);
        int[] pivotRow = plan.PivotRow, pivotColumn = plan.PivotColumn;
        int[] lower = plan.Lower, lowerRow = plan.LowerRow, upper = plan.Upper, upperColumn = plan.UpperColumn;
        int l = 0;
        for (int k = 0; k < pivotRow.Length; k++)
        {
            T b = Unsafe.Add(ref x, pivotRow[k]);
            Unsafe.Add(ref y, k) = b;
            for (int end = plan.LowerStart[k + 1]; l < end; l++)
            {
                SubtractProduct(ref Unsafe.Add(ref x, lowerRow[l]), b, Unsafe.Add(ref values, lower[l]));
            }
        }

        int u = upper.Length - 1;
        for (int k = pivotRow.Length - 1; k >= 0; k--)
        {
            T sum = Unsafe.Add(ref y, k);
            for (int start = plan.UpperStart[k]; u >= start; u--)
            {
                SubtractProduct(ref sum, Unsafe.Add(ref values, upper[u]), Unsafe.Add(ref x, upperColumn[u]));
            }

            Unsafe.Add(ref x, pivotColumn[k]) = sum * _inverse[k];
        }
    }

    /// <summary>
    /// Solves A x = b and the transposed system A' z = c (no conjugation) in one pass: two chains of dependent operations
    /// side by side take hardly longer than one.
    /// </summary>
    /// <param name="rightSide">b on entry, x on return.</param>
    /// <param name="transposedRightSide">c on entry, z on return.</param>
    public void SolveBoth(Span<T> rightSide, Span<T> transposedRightSide)
    {
        LuPlan plan = _plan ?? throw new InvalidOperationException("nothing factored yet");
        CheckLength(rightSide.Length);
        CheckLength(transposedRightSide.Length);
        ref T x = ref MemoryMarshal.GetReference(rightSide);
        ref T z = ref MemoryMarshal.GetReference(transposedRightSide);
        ref T kept = ref MemoryMarshal.GetArrayDataReference(_scratch);
        ref T keptTransposed = ref MemoryMarshal.GetArrayDataReference(_transposedScratch);
        ref T inverse = ref MemoryMarshal.GetArrayDataReference(_inverse);
        ref T values = ref MemoryMarshal.GetArrayDataReference(_values);
        ref int pivotRow = ref MemoryMarshal.GetArrayDataReference(plan.PivotRow);
        ref int pivotColumn = ref MemoryMarshal.GetArrayDataReference(plan.PivotColumn);
        ref int lower = ref MemoryMarshal.GetArrayDataReference(plan.Lower);
        ref int lowerRow = ref MemoryMarshal.GetArrayDataReference(plan.LowerRow);
        ref int upper = ref MemoryMarshal.GetArrayDataReference(plan.Upper);
        ref int upperColumn = ref MemoryMarshal.GetArrayDataReference(plan.UpperColumn);
        int[] lowerStart = plan.LowerStart, upperStart = plan.UpperStart;
        (int l, int u) = (0, 0);
        for (int k = 0; k < plan.Size; k++)
        {
            T b = Unsafe.Add(ref x, Unsafe.Add(ref pivotRow, k));
            T v = Unsafe.Add(ref z, Unsafe.Add(ref pivotColumn, k)) * Unsafe.Add(ref inverse, k);
            Unsafe.Add(ref kept, k) = b;
            Unsafe.Add(ref keptTransposed, k) = v;
            for (int end = lowerStart[k + 1]; l < end; l++)
            {
                SubtractProduct(ref Unsafe.Add(ref x, Unsafe.Add(ref lowerRow, l)), b, Unsafe.Add(ref values, Unsafe.Add(ref lower, l)));
            }

            for (int end = upperStart[k + 1]; u < end; u++)
            {
                SubtractProduct(ref Unsafe.Add(ref z, Unsafe.Add(ref upperColumn, u)), v, Unsafe.Add(ref values, Unsafe.Add(ref upper, u)));
            }
        }

        (l, u) = (l - 1, u - 1);
        for (int k = plan.Size - 1; k >= 0; k--)
        {
            T sum = Unsafe.Add(ref kept, k), transposedSum = Unsafe.Add(ref keptTransposed, k);
            for (int start = upperStart[k]; u >= start; u--)
            {
                SubtractProduct(ref sum, Unsafe.Add(ref values, Unsafe.Add(ref upper, u)), Unsafe.Add(ref x, Unsafe.Add(ref upperColumn, u)));
            }

            for (int start = lowerStart[k]; l >= start; l--)
            {
                SubtractProduct(
                    ref transposedSum, Unsafe.Add(ref values, Unsafe.Add(ref lower, l)), Unsafe.Add(ref z, Unsafe.Add(ref lowerRow, l)));
            }

            Unsafe.Add(ref x, Unsafe.Add(ref pivotColumn, k)) = sum * Unsafe.Add(ref inverse, k);
            Unsafe.Add(ref z, Unsafe.Add(ref pivotRow, k)) = transposedSum;
        }
    }

    private void CheckLength(int length)
    {
        if (length != Size)
        {
            throw new ArgumentException($"the right side has {length} entries for {Size} unknowns", nameof(length));
        }
    }

    /// <summary>Runs the plan; returns the largest multiplier, or infinity at a zero pivot.</summary>
    private double Eliminate(ReadOnlySpan<T> entries, out int blamed)
    {
        // The plan's places were checked when it was made, so the inner loop goes without bounds checks.
        LuPlan plan = _plan!;
        entries.CopyTo(_values);
        Array.Clear(_values, entries.Length, _values.Length - entries.Length);
        ref T values = ref MemoryMarshal.GetArrayDataReference(_values);
        ref int target = ref MemoryMarshal.GetArrayDataReference(plan.Target);
        ref int upper = ref MemoryMarshal.GetArrayDataReference(plan.Upper);
        int[] lower = plan.Lower, lowerStart = plan.LowerStart, upperStart = plan.UpperStart;
        double largest = 0;
        int t = 0, l = 0;
        blamed = -1;
        for (int k = 0; k < plan.Size; k++)
        {
            T pivot = Unsafe.Add(ref values, plan.Diagonal[k]);
            if (pivot == T.Zero)
            {
                blamed = plan.PivotColumn[k];
                return double.PositiveInfinity;
            }

            T inverse = Reciprocal(pivot);
            _inverse[k] = inverse;
            int firstUpper = upperStart[k], endUpper = upperStart[k + 1];
            for (int endLower = lowerStart[k + 1]; l < endLower; l++)
            {
                ref T place = ref Unsafe.Add(ref values, lower[l]);
                T factor = place * inverse;
                place = factor;
                largest = Math.Max(largest, Magnitude(factor));
                for (int u = firstUpper; u < endUpper; u++, t++)
                {
                    SubtractProduct(
                        ref Unsafe.Add(ref values, Unsafe.Add(ref target, t)), factor, Unsafe.Add(ref values, Unsafe.Add(ref upper, u)));
                }
            }
        }

        return double.IsNaN(largest) ? double.PositiveInfinity : largest;
    }

    /// <summary>target -= a b, the complex product as two vector operations: (ar b + ai (-bi, br)).</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void SubtractProduct(ref T target, T a, T b)
    {
        if (typeof(T) == typeof(double))
        {
            target -= a * b;
            return;
        }

        Vector128<double> va = Unsafe.BitCast<T, Vector128<double>>(a), vb = Unsafe.BitCast<T, Vector128<double>>(b);
        Vector128<double> real = -Vector128.Shuffle(va, Vector128.Create(0L, 0L));
        Vector128<double> imaginary = Vector128.Shuffle(va, Vector128.Create(1L, 1L)) * Vector128.Create(1.0, -1.0);
        Vector128<double> turned = Vector128.Shuffle(vb, Vector128.Create(1L, 0L));
        ref Vector128<double> sum = ref Unsafe.As<T, Vector128<double>>(ref target);
        sum = Vector128.FusedMultiplyAdd(real, vb, Vector128.FusedMultiplyAdd(imaginary, turned, sum));
    }

    private static Complex ToComplex(T value) =>
        typeof(T) == typeof(double) ? Unsafe.BitCast<T, double>(value) : Unsafe.BitCast<T, Complex>(value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static double Magnitude(T value)
    {
        if (typeof(T) == typeof(double))
        {
            return Math.Abs(Unsafe.BitCast<T, double>(value));
        }

        Complex z = Unsafe.BitCast<T, Complex>(value);
        return Math.Abs(z.Real) + Math.Abs(z.Imaginary);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static T Reciprocal(T value)
    {
        if (typeof(T) == typeof(double))
        {
            return Unsafe.BitCast<double, T>(1 / Unsafe.BitCast<T, double>(value));
        }

        // Entries are scaled conductances far from overflow, so the plain quotient is exact enough and twice as fast.
        Complex z = Unsafe.BitCast<T, Complex>(value);
        double inverse = 1 / ((z.Real * z.Real) + (z.Imaginary * z.Imaginary));
        return Unsafe.BitCast<Complex, T>(new Complex(z.Real * inverse, -z.Imaginary * inverse));
    }
}
