using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Controls;

/// <summary>How the capacitance of a tuning capacitor goes with the angle of its shaft.</summary>
public enum CapacitorLaw
{
    /// <summary>Capacitance linear in angle.</summary>
    StraightLineCapacitance,

    /// <summary>Wavelength linear in angle: the root of the capacitance.</summary>
    StraightLineWavelength,

    /// <summary>Frequency linear in angle: one over the root of the capacitance.</summary>
    StraightLineFrequency,

    /// <summary>Measured points.</summary>
    Table,
}

/// <summary>A tuning capacitor. The angle counts from the open stop (least capacitance).</summary>
public sealed record VariableCapacitor
{
    private readonly (double Degrees, double Farad)[] _table;

    /// <summary>States a tuning capacitor.</summary>
    /// <param name="minimumFarad">Capacitance at the open stop in farad, above 0.</param>
    /// <param name="maximumFarad">Capacitance at the closed stop in farad, above <paramref name="minimumFarad"/>.</param>
    /// <param name="law">How the capacitance goes with the angle.</param>
    /// <param name="q">One over its loss tangent, above 0; null for none.</param>
    /// <param name="table">Of a measured capacitor: degrees and farad, both rising, from 0 degrees and the least to the largest capacitance.</param>
    /// <param name="rotationDegrees">Angle from stop to stop in degrees, 1 to 3600; of a measured capacitor its last point states it.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its range.</exception>
    /// <exception cref="ArgumentException">The table does not rise between the stated ends.</exception>
    public VariableCapacitor(
        double minimumFarad,
        double maximumFarad,
        CapacitorLaw law = CapacitorLaw.StraightLineCapacitance,
        double? q = null,
        IReadOnlyList<(double Degrees, double Farad)>? table = null,
        double rotationDegrees = 180)
    {
        MinimumFarad = Guard.Positive(minimumFarad, nameof(minimumFarad));
        MaximumFarad = Guard.InRange(maximumFarad, Math.BitIncrement(minimumFarad), double.MaxValue, nameof(maximumFarad));
        Law = law;
        Q = q is { } value ? Guard.Positive(value, nameof(q)) : null;
        _table = law == CapacitorLaw.Table ? Measured(table, minimumFarad, maximumFarad) : [];
        RotationDegrees = Guard.InRange(law == CapacitorLaw.Table ? _table[^1].Degrees : rotationDegrees, 1, 3600, nameof(rotationDegrees));
    }

    /// <summary>Capacitance at the open stop in farad.</summary>
    public double MinimumFarad { get; }

    /// <summary>Capacitance at the closed stop in farad.</summary>
    public double MaximumFarad { get; }

    /// <summary>How the capacitance goes with the angle.</summary>
    public CapacitorLaw Law { get; }

    /// <summary>One over its loss tangent; null for none.</summary>
    public double? Q { get; }

    /// <summary>Angle from stop to stop in degrees.</summary>
    public double RotationDegrees { get; }

    /// <summary>Capacitance in farad at an angle.</summary>
    /// <param name="degrees">Angle from the open stop, 0 to <see cref="RotationDegrees"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">The angle is outside its range.</exception>
    public double FaradAt(double degrees)
    {
        Guard.InRange(degrees, 0, RotationDegrees, nameof(degrees));
        if (Law == CapacitorLaw.Table)
        {
            int piece = Piece(p => p.Degrees < degrees);
            ((double d0, double c0), (double d1, double c1)) = (_table[piece - 1], _table[piece]);
            return Math.Clamp(c0 + ((c1 - c0) * (degrees - d0) / (d1 - d0)), c0, c1);
        }

        double start = Straight(MinimumFarad), end = Straight(MaximumFarad);

        // Rounding must not carry the value past its ends, where it would have no angle.
        return Math.Clamp(FromStraight(start + ((end - start) * degrees / RotationDegrees)), MinimumFarad, MaximumFarad);
    }

    /// <summary>The angle in degrees at which the capacitor has a value; null out of its reach.</summary>
    public double? DegreesAt(double farad)
    {
        if (!(farad >= MinimumFarad && farad <= MaximumFarad))
        {
            return null;
        }

        if (Law == CapacitorLaw.Table)
        {
            int piece = Piece(p => p.Farad < farad);
            ((double d0, double c0), (double d1, double c1)) = (_table[piece - 1], _table[piece]);
            return Math.Clamp(d0 + ((d1 - d0) * (farad - c0) / (c1 - c0)), d0, d1);
        }

        double start = Straight(MinimumFarad), end = Straight(MaximumFarad);
        return Math.Clamp(RotationDegrees * (Straight(farad) - start) / (end - start), 0, RotationDegrees);
    }

    /// <summary>Slope in farad per degree at an angle; at a measured point that of the piece below it.</summary>
    /// <param name="degrees">Angle from the open stop, 0 to <see cref="RotationDegrees"/>.</param>
    public double FaradPerDegreeAt(double degrees)
    {
        double farad = FaradAt(degrees);
        if (Law == CapacitorLaw.Table)
        {
            int piece = Piece(p => p.Degrees < degrees);
            return (_table[piece].Farad - _table[piece - 1].Farad) / (_table[piece].Degrees - _table[piece - 1].Degrees);
        }

        double even = (Straight(MaximumFarad) - Straight(MinimumFarad)) / RotationDegrees;
        return Law switch
        {
            CapacitorLaw.StraightLineWavelength => 2 * Math.Sqrt(farad) * even,
            CapacitorLaw.StraightLineFrequency => -2 * farad * Math.Sqrt(farad) * even,
            _ => even,
        };
    }

    /// <inheritdoc/>
    public bool Equals(VariableCapacitor? other) =>
        other is not null && MinimumFarad == other.MinimumFarad && MaximumFarad == other.MaximumFarad && Law == other.Law && Q == other.Q
        && RotationDegrees == other.RotationDegrees && _table.AsSpan().SequenceEqual(other._table);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(MinimumFarad, MaximumFarad, Law, Q, RotationDegrees);

    /// <summary>The quantity that is linear in angle.</summary>
    private double Straight(double farad) => Law switch
    {
        CapacitorLaw.StraightLineWavelength => Math.Sqrt(farad),
        CapacitorLaw.StraightLineFrequency => 1 / Math.Sqrt(farad),
        _ => farad,
    };

    private double FromStraight(double value) => Law switch
    {
        CapacitorLaw.StraightLineWavelength => value * value,
        CapacitorLaw.StraightLineFrequency => 1 / (value * value),
        _ => value,
    };

    private int Piece(Func<(double Degrees, double Farad), bool> below)
    {
        int piece = 1;
        while (piece < _table.Length - 1 && below(_table[piece]))
        {
            piece++;
        }

        return piece;
    }

    private static (double Degrees, double Farad)[] Measured(IReadOnlyList<(double Degrees, double Farad)>? table, double minimum, double maximum)
    {
        if (table is not { Count: >= 2 } || table[0] != (0, minimum) || table[^1].Farad != maximum)
        {
            throw new ArgumentException("a measured capacitor needs points from 0 degrees and its least to its largest capacitance", nameof(table));
        }

        for (int k = 1; k < table.Count; k++)
        {
            if (!(table[k].Degrees > table[k - 1].Degrees && table[k].Farad > table[k - 1].Farad))
            {
                throw new ArgumentException($"a measured capacitor rises in both columns; point {k + 1} does not rise above the one before", nameof(table));
            }
        }

        return [.. table];
    }
}
