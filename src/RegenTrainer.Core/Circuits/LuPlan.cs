using System.Numerics;

namespace RegenTrainer.Core.Circuits;

/// <summary>
/// The order of elimination of a sparse square matrix and the places it touches: found once for a network and then run for
/// every set of values. Pivots are chosen by Markowitz' count among entries that are not small in their column
/// [Markowitz 1957; Duff, Erisman and Reid 1986, threshold pivoting].
/// </summary>
/// <remarks>
/// The first <see cref="EntryCount"/> places of a value array are the entries of the matrix in the caller's order, the
/// places behind them are filled in by the elimination.
/// </remarks>
public sealed class LuPlan
{
    /// <summary>An entry below this fraction of the largest in its column is no candidate for a pivot.</summary>
    private const double PivotThreshold = 0.05;

    /// <summary>The same while late unknowns are still held back: a little less choosy, since they may not help out.</summary>
    private const double HeadThreshold = 0.001;

    private LuPlan(int size, int entryCount, int valueCount, int headSteps, int[] pivotRow, int[] pivotColumn, int[] diagonal,
        int[] lowerStart, int[] lower, int[] lowerRow, int[] upperStart, int[] upper, int[] upperColumn, int[] target)
    {
        (Size, EntryCount, ValueCount, HeadSteps) = (size, entryCount, valueCount, headSteps);
        (PivotRow, PivotColumn, Diagonal) = (pivotRow, pivotColumn, diagonal);
        (LowerStart, Lower, LowerRow) = (lowerStart, lower, lowerRow);
        (UpperStart, Upper, UpperColumn, Target) = (upperStart, upper, upperColumn, target);
    }

    /// <summary>Number of unknowns.</summary>
    public int Size { get; }

    /// <summary>Number of entries of the matrix itself.</summary>
    public int EntryCount { get; }

    /// <summary>Number of places a value array needs: entries and fill-in.</summary>
    public int ValueCount { get; }

    /// <summary>Number of first steps that touch no entry between two late unknowns other than by their result.</summary>
    public int HeadSteps { get; }

    internal int[] PivotRow { get; }

    internal int[] PivotColumn { get; }

    internal int[] Diagonal { get; }

    internal int[] LowerStart { get; }

    internal int[] Lower { get; }

    internal int[] LowerRow { get; }

    internal int[] UpperStart { get; }

    internal int[] Upper { get; }

    internal int[] UpperColumn { get; }

    internal int[] Target { get; }

    /// <summary>Finds an order of elimination.</summary>
    /// <param name="size">Number of unknowns, from 1.</param>
    /// <param name="rows">Row of each entry.</param>
    /// <param name="columns">Column of each entry.</param>
    /// <param name="entries">A typical set of values: cancellations in them are the network's own.</param>
    /// <param name="blamed">The unknown whose column has no entry left where the matrix is structurally singular; -1 otherwise.</param>
    /// <param name="late">Unknowns whose rows and columns are eliminated last; empty for none.</param>
    /// <returns>The plan, or null where the matrix is singular.</returns>
    public static LuPlan? TryFind(
        int size, ReadOnlySpan<int> rows, ReadOnlySpan<int> columns, ReadOnlySpan<Complex> entries, out int blamed,
        ReadOnlySpan<int> late = default)
    {
        // A dense trial elimination steers: networks have tens of unknowns, and plans are found once.
        int[,] place = new int[size, size];
        var value = new Complex[size, size];
        for (int i = 0; i < size; i++)
        {
            for (int j = 0; j < size; j++)
            {
                place[i, j] = -1;
            }
        }

        for (int k = 0; k < rows.Length; k++)
        {
            place[rows[k], columns[k]] = k;
            value[rows[k], columns[k]] = entries[k];
        }

        int next = rows.Length;
        bool[] rowDone = new bool[size], columnDone = new bool[size], heldBack = new bool[size];
        foreach (int unknown in late)
        {
            heldBack[unknown] = true;
        }

        int headSteps = late.IsEmpty ? size : 0;
        bool head = !late.IsEmpty;
        int[] pivotRow = new int[size], pivotColumn = new int[size], diagonal = new int[size];
        int[] lowerStart = new int[size + 1], upperStart = new int[size + 1];
        List<int> lower = [], lowerRow = [], upper = [], upperColumn = [], target = [];
        for (int step = 0; step < size; step++)
        {
            (int pr, int pc) = head ? ChoosePivot(size, place, value, rowDone, columnDone, heldBack, HeadThreshold, out blamed) : (-1, -1);
            if (pr < 0)
            {
                (headSteps, head) = (head ? step : headSteps, false);
                (pr, pc) = ChoosePivot(size, place, value, rowDone, columnDone, new bool[size], PivotThreshold, out blamed);
                if (pr < 0)
                {
                    return null;
                }
            }

            (pivotRow[step], pivotColumn[step], diagonal[step]) = (pr, pc, place[pr, pc]);
            (rowDone[pr], columnDone[pc]) = (true, true);
            int firstUpper = upper.Count;
            for (int j = 0; j < size; j++)
            {
                if (!columnDone[j] && place[pr, j] >= 0)
                {
                    upper.Add(place[pr, j]);
                    upperColumn.Add(j);
                }
            }

            for (int i = 0; i < size; i++)
            {
                if (rowDone[i] || place[i, pc] < 0)
                {
                    continue;
                }

                lower.Add(place[i, pc]);
                lowerRow.Add(i);
                Complex factor = value[i, pc] / value[pr, pc];
                for (int u = firstUpper; u < upper.Count; u++)
                {
                    int j = upperColumn[u];
                    if (place[i, j] < 0)
                    {
                        place[i, j] = next++;
                    }

                    target.Add(place[i, j]);
                    value[i, j] -= factor * value[pr, j];
                }
            }

            lowerStart[step + 1] = lower.Count;
            upperStart[step + 1] = upper.Count;
        }

        blamed = -1;
        return new LuPlan(size, rows.Length, next, headSteps, pivotRow, pivotColumn, diagonal, lowerStart, [.. lower], [.. lowerRow],
            upperStart, [.. upper], [.. upperColumn], [.. target]);
    }

    private static (int Row, int Column) ChoosePivot(
        int size, int[,] place, Complex[,] value, bool[] rowDone, bool[] columnDone, bool[] heldBack, double threshold, out int blamed)
    {
        blamed = -1;
        int[] rowCount = new int[size], columnCount = new int[size];
        for (int i = 0; i < size; i++)
        {
            for (int j = 0; j < size; j++)
            {
                if (!rowDone[i] && !columnDone[j] && place[i, j] >= 0)
                {
                    rowCount[i]++;
                    columnCount[j]++;
                }
            }
        }

        (int bestRow, int bestColumn, long bestCost, double bestWeight) = (-1, -1, long.MaxValue, 0);
        for (int j = 0; j < size; j++)
        {
            if (columnDone[j] || heldBack[j])
            {
                continue;
            }

            double largest = 0;
            for (int i = 0; i < size; i++)
            {
                if (!rowDone[i] && place[i, j] >= 0)
                {
                    largest = Math.Max(largest, Complex.Abs(value[i, j]));
                }
            }

            if (largest <= 0)
            {
                blamed = j;
                return (-1, -1);
            }

            for (int i = 0; i < size; i++)
            {
                double weight = rowDone[i] || heldBack[i] || place[i, j] < 0 ? 0 : Complex.Abs(value[i, j]);
                if (weight == 0 || weight < threshold * largest)
                {
                    continue;
                }

                long cost = (long)(rowCount[i] - 1) * (columnCount[j] - 1);
                if (cost < bestCost || (cost == bestCost && weight > bestWeight))
                {
                    (bestRow, bestColumn, bestCost, bestWeight) = (i, j, cost, weight);
                }
            }
        }

        return (bestRow, bestColumn);
    }
}
