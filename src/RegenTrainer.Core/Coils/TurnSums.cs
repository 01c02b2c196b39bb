namespace RegenTrainer.Core.Coils;

/// <summary>
/// Inductance between the sections of windings on one axis, turn by turn: each turn a circular loop [Maxwell 1873, art. 701].
/// Within a winding, and between windings of one pitch, an element depends on the distance of the turns alone, so that N
/// turns take N evaluations; windings of different pitch take one for each pair of turns.
/// </summary>
internal static class TurnSums
{
    private const double TouchSlack = 1e-9;

    /// <summary>Writes the inductances in H between the sections of one winding and those of itself or another into a matrix, by rows.</summary>
    /// <param name="rows">Winding of the rows.</param>
    /// <param name="columns">Winding of the columns; the same object for the winding itself.</param>
    /// <param name="distribution">How the current fills the wire.</param>
    /// <param name="matrix">The whole matrix.</param>
    /// <param name="stride">Its number of columns.</param>
    /// <param name="firstRow">Where the block begins.</param>
    /// <param name="firstColumn">Where the block begins.</param>
    /// <exception cref="ArgumentException">Turns of the two windings lie in the same place.</exception>
    public static void Fill(
        Winding rows, Winding columns, CurrentDistribution distribution, double[] matrix, int stride, int firstRow, int firstColumn)
    {
        if (!ReferenceEquals(rows, columns) && rows.PitchMetre != columns.PitchMetre)
        {
            FillByPairs(rows, columns, matrix, stride, firstRow, firstColumn);
            return;
        }

        double[] byLag = ReferenceEquals(rows, columns) ? WithinWinding(rows, distribution) : BetweenWindings(rows, columns);
        int zeroLag = rows.Turns - 1;
        for (int row = 0; row < rows.SectionCount; row++)
        {
            for (int column = 0; column < columns.SectionCount; column++)
            {
                matrix[((firstRow + row) * stride) + firstColumn + column] = ByLag(
                    byLag, zeroLag, rows.FirstTurn(row), rows.FirstTurn(row + 1), columns.FirstTurn(column), columns.FirstTurn(column + 1));
            }
        }
    }

    private static double[] WithinWinding(Winding winding, CurrentDistribution distribution)
    {
        int last = winding.Turns - 1;
        double[] byLag = new double[(2 * last) + 1];
        byLag[last] = CoaxialLoops.SelfHenry(winding.RadiusMetre, 0.5 * winding.Wire.BareDiameterMetre, distribution);
        for (int lag = 1; lag <= last; lag++)
        {
            double mutual = CoaxialLoops.MutualHenry(winding.RadiusMetre, winding.RadiusMetre, lag * winding.PitchMetre);
            byLag[last + lag] = mutual;
            byLag[last - lag] = mutual;
        }

        return byLag;
    }

    private static double[] BetweenWindings(Winding rows, Winding columns)
    {
        double[] byLag = new double[rows.Turns + columns.Turns - 1];
        for (int place = 0; place < byLag.Length; place++)
        {
            double distance = columns.StartMetre - rows.StartMetre + ((place - (rows.Turns - 1)) * rows.PitchMetre);
            byLag[place] = Mutual(rows, columns, distance);
        }

        return byLag;
    }

    /// <summary>Sum over the turns of two sections; each lag counts as often as a pair of turns has it.</summary>
    private static double ByLag(double[] byLag, int zeroLag, int rowBegin, int rowEnd, int columnBegin, int columnEnd)
    {
        double sum = 0.0;
        for (int lag = columnBegin - rowEnd + 1; lag < columnEnd - rowBegin; lag++)
        {
            int pairs = Math.Min(rowEnd, columnEnd - lag) - Math.Max(rowBegin, columnBegin - lag);
            sum += pairs * byLag[zeroLag + lag];
        }

        return sum;
    }

    private static void FillByPairs(Winding rows, Winding columns, double[] matrix, int stride, int firstRow, int firstColumn)
    {
        for (int row = 0; row < rows.SectionCount; row++)
        {
            for (int column = 0; column < columns.SectionCount; column++)
            {
                double sum = 0.0;
                for (int turn = rows.FirstTurn(row); turn < rows.FirstTurn(row + 1); turn++)
                {
                    double place = rows.StartMetre + (turn * rows.PitchMetre);
                    for (int other = columns.FirstTurn(column); other < columns.FirstTurn(column + 1); other++)
                    {
                        sum += Mutual(rows, columns, columns.StartMetre + (other * columns.PitchMetre) - place);
                    }
                }

                matrix[((firstRow + row) * stride) + firstColumn + column] = sum;
            }
        }
    }

    private static double Mutual(Winding rows, Winding columns, double distance)
    {
        double apart = 0.5 * (rows.Wire.OverInsulationMetre + columns.Wire.OverInsulationMetre);
        double difference = rows.RadiusMetre - columns.RadiusMetre;
        if ((difference * difference) + (distance * distance) < apart * apart * (1.0 - TouchSlack))
        {
            throw new ArgumentException(
                $"Turns of two windings lie in the same place: their wires need {1000.0 * apart:0.###} mm from centre to centre. "
                + "Start the second winding further along, or wind it over the first on a larger diameter.",
                nameof(columns));
        }

        return CoaxialLoops.MutualHenry(rows.RadiusMetre, columns.RadiusMetre, distance);
    }
}
