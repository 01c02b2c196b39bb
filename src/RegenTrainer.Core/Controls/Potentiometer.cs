using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Controls;

/// <summary>The law of a resistance track.</summary>
public enum Taper
{
    /// <summary>Even.</summary>
    Linear,

    /// <summary>Little resistance in the first half turned clockwise.</summary>
    Logarithmic,

    /// <summary>Much resistance in the first half turned clockwise.</summary>
    ReverseLogarithmic,

    /// <summary>Measured points.</summary>
    Table,
}

/// <summary>
/// A potentiometer wired as a rheostat whose resistance falls clockwise: it uses the track from the wiper to the clockwise
/// end, with the spare end tied to the wiper.
/// </summary>
public sealed record Potentiometer : IControlLaw
{
    private readonly (double Rotation, double Fraction)[] _track;

    /// <summary>States a potentiometer.</summary>
    /// <param name="totalOhm">Resistance from end to end in ohm, above 0.</param>
    /// <param name="taper">Law of the track.</param>
    /// <param name="midPercent">Of a logarithmic track: the share of the resistance at mid rotation, in %, 1 to 49 (the trade's 10 or 15).</param>
    /// <param name="endOhm">Resistance left at a stop in ohm, from 0, below the total.</param>
    /// <param name="mechanicalDegrees">Angle from stop to stop in degrees, 1 to 3600.</param>
    /// <param name="electricalDegrees">Angle over which the resistance changes, in degrees, 1 to <paramref name="mechanicalDegrees"/>; the rest is dead, half at each stop.</param>
    /// <param name="shuntOhm">Resistor across the rheostat in ohm, above 0; null for none.</param>
    /// <param name="table">Of a measured track: rotation in % of the electrical angle and share of the resistance from the counter-clockwise end in %, both rising from 0 to 100.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is outside its range.</exception>
    /// <exception cref="ArgumentException">The table does not rise from 0 to 100.</exception>
    public Potentiometer(
        double totalOhm,
        Taper taper = Taper.Linear,
        double midPercent = 15,
        double endOhm = 0,
        double mechanicalDegrees = 300,
        double electricalDegrees = 270,
        double? shuntOhm = null,
        IReadOnlyList<(double RotationPercent, double FractionPercent)>? table = null)
    {
        TotalOhm = Guard.Positive(totalOhm, nameof(totalOhm));
        Taper = taper;
        MidPercent = Guard.InRange(midPercent, 1, 49, nameof(midPercent));
        EndOhm = Guard.InRange(endOhm, 0, Math.BitDecrement(totalOhm), nameof(endOhm));
        MechanicalDegrees = Guard.InRange(mechanicalDegrees, 1, 3600, nameof(mechanicalDegrees));
        ElectricalDegrees = Guard.InRange(electricalDegrees, 1, mechanicalDegrees, nameof(electricalDegrees));
        ShuntOhm = shuntOhm is { } shunt ? Guard.Positive(shunt, nameof(shuntOhm)) : null;
        double mid = MidPercent / 100;
        _track = taper switch
        {
            Taper.Linear => [(0, 0), (1, 1)],
            Taper.Logarithmic => [(0, 0), (0.5, mid), (1, 1)],
            Taper.ReverseLogarithmic => [(0, 0), (0.5, 1 - mid), (1, 1)],
            _ => Measured(table),
        };
    }

    /// <summary>Resistance from end to end in ohm.</summary>
    public double TotalOhm { get; }

    /// <summary>Law of the track.</summary>
    public Taper Taper { get; }

    /// <summary>Of a logarithmic track: the share of the resistance at mid rotation, in %.</summary>
    public double MidPercent { get; }

    /// <summary>Resistance left at a stop in ohm.</summary>
    public double EndOhm { get; }

    /// <summary>Angle from stop to stop in degrees.</summary>
    public double MechanicalDegrees { get; }

    /// <summary>Angle over which the resistance changes, in degrees.</summary>
    public double ElectricalDegrees { get; }

    /// <summary>Resistor across the rheostat in ohm; null for none.</summary>
    public double? ShuntOhm { get; }

    /// <inheritdoc/>
    public double ValueAtStart => WithShunt(TotalOhm);

    /// <inheritdoc/>
    public double ValueAtEnd => WithShunt(EndOhm);

    /// <inheritdoc/>
    public IReadOnlyList<double> KinkTravels => [.. _track.Select(p => TravelOf(p.Rotation))];

    /// <summary>How to wire it, in words.</summary>
    public static string WiringText => "wiper and clockwise end, the counter-clockwise end tied to the wiper";

    /// <inheritdoc/>
    public double ValueAt(double travelPercent)
    {
        double dead = (MechanicalDegrees - ElectricalDegrees) / 2;
        double turned = (Guard.InRange(travelPercent, 0, 100, nameof(travelPercent)) / 100 * MechanicalDegrees) - dead;
        double rotation = Math.Clamp(turned / ElectricalDegrees, 0, 1);
        int piece = 1;
        while (piece < _track.Length - 1 && rotation > _track[piece].Rotation)
        {
            piece++;
        }

        ((double x0, double y0), (double x1, double y1)) = (_track[piece - 1], _track[piece]);
        double fraction = y0 + ((y1 - y0) * (rotation - x0) / (x1 - x0));

        // Rounding must not carry the value past its ends, where it would have no travel.
        return Math.Clamp(WithShunt(EndOhm + ((TotalOhm - EndOhm) * (1 - fraction))), ValueAtEnd, ValueAtStart);
    }

    /// <inheritdoc/>
    public double? TravelAt(double value)
    {
        if (!(value >= ValueAtEnd && value <= ValueAtStart))
        {
            return null;
        }

        double own = ShuntOhm is { } shunt ? value * shunt / (shunt - value) : value;
        double fraction = Math.Clamp(1 - ((own - EndOhm) / (TotalOhm - EndOhm)), 0, 1);
        int piece = 1;
        while (piece < _track.Length - 1 && fraction > _track[piece].Fraction)
        {
            piece++;
        }

        ((double x0, double y0), (double x1, double y1)) = (_track[piece - 1], _track[piece]);
        return TravelOf(x0 + ((x1 - x0) * (fraction - y0) / (y1 - y0)));
    }

    /// <inheritdoc/>
    public double DegreesAt(double travelPercent) => MechanicalDegrees * travelPercent / 100;

    /// <inheritdoc/>
    public bool Equals(Potentiometer? other) =>
        other is not null && TotalOhm == other.TotalOhm && Taper == other.Taper && MidPercent == other.MidPercent && EndOhm == other.EndOhm
        && MechanicalDegrees == other.MechanicalDegrees && ElectricalDegrees == other.ElectricalDegrees && ShuntOhm == other.ShuntOhm
        && _track.AsSpan().SequenceEqual(other._track);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(TotalOhm, Taper, MidPercent, EndOhm, MechanicalDegrees, ElectricalDegrees, ShuntOhm);

    private double TravelOf(double rotation) =>
        Math.Min(100, 100 * (((MechanicalDegrees - ElectricalDegrees) / 2) + (rotation * ElectricalDegrees)) / MechanicalDegrees);

    private double WithShunt(double ohm) => ShuntOhm is { } shunt ? ohm * shunt / (ohm + shunt) : ohm;

    private static (double Rotation, double Fraction)[] Measured(IReadOnlyList<(double RotationPercent, double FractionPercent)>? table)
    {
        if (table is not { Count: >= 2 } || table[0] != (0, 0) || table[^1] != (100, 100))
        {
            throw new ArgumentException("a measured track needs points from 0 %, 0 % to 100 %, 100 %", nameof(table));
        }

        for (int k = 1; k < table.Count; k++)
        {
            if (!(table[k].RotationPercent > table[k - 1].RotationPercent && table[k].FractionPercent > table[k - 1].FractionPercent))
            {
                throw new ArgumentException($"a measured track rises in both columns; point {k + 1} does not rise above the one before", nameof(table));
            }
        }

        return [.. table.Select(p => (p.RotationPercent / 100, p.FractionPercent / 100))];
    }
}
