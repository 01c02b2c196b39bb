using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Antennas;

/// <summary>
/// A coil that is itself the antenna: the field's electromotive force arises in every turn, so that each section between taps
/// has its share of it. Its effective height is 2 pi N A mu/lambda [Terman 1943].
/// </summary>
public sealed record CoilPickUp
{
    /// <summary>Describes the pick-up.</summary>
    /// <param name="shares">Share of the electromotive force in each section, positive towards the section's end; each -1 to 1.</param>
    /// <param name="areaSquareMetre">Turns times area times effective permeability in m^2, above 0; null where it is not known.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    public CoilPickUp(IReadOnlyList<double> shares, double? areaSquareMetre)
    {
        ArgumentNullException.ThrowIfNull(shares);
        Shares = [.. shares.Select(share => Guard.InRange(share, -1.0, 1.0, nameof(shares)))];
        AreaSquareMetre = areaSquareMetre is { } area ? Guard.Positive(area, nameof(areaSquareMetre)) : null;
    }

    /// <summary>Share of the electromotive force in each section.</summary>
    public IReadOnlyList<double> Shares { get; }

    /// <summary>Turns times area times effective permeability in m^2; null where it is not known.</summary>
    public double? AreaSquareMetre { get; }

    /// <summary>The pick-up of one winding, by its turns.</summary>
    /// <param name="sectionTurns">Turns of each section, at least one section.</param>
    /// <param name="turnSquareMetre">Area of a turn in m^2, above 0.</param>
    /// <param name="permeability">Effective permeability of the core, 1 for air.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    public static CoilPickUp OfTurns(IReadOnlyList<int> sectionTurns, double turnSquareMetre, double permeability = 1.0)
    {
        ArgumentNullException.ThrowIfNull(sectionTurns);
        double turns = sectionTurns.Sum();
        return new CoilPickUp([.. sectionTurns.Select(count => count / turns)], turns * turnSquareMetre * permeability);
    }

    /// <summary>Effective height in m: electromotive force over field; null where the area is not known.</summary>
    /// <param name="hz">Frequency in Hz, above 0.</param>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is not above 0.</exception>
    public double? EffectiveHeightMetre(double hz) =>
        2.0 * Math.PI * AreaSquareMetre * Guard.Positive(hz, nameof(hz)) / PhysicalConstants.SpeedOfLight;
}
