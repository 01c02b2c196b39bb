using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>A single-layer winding of evenly spaced turns with taps.</summary>
public sealed record Winding
{
    /// <summary>Most turns a winding may have.</summary>
    public const int MostTurns = 5000;

    /// <summary>Most taps a winding may have.</summary>
    public const int MostTaps = 64;

    // Close-wound pitch is computed from the same diameter it is compared with; rounding must not reject it.
    private const double PitchSlack = 1e-9;

    private readonly int[] _tapTurns;

    /// <summary>Describes a winding.</summary>
    /// <param name="radiusMetre">Radius to the wire's centre in m, from half the diameter over insulation to 10.</param>
    /// <param name="turns">Number of turns, 1 to 5000.</param>
    /// <param name="pitchMetre">Distance of neighbouring turns in m, from the diameter over insulation to 1.</param>
    /// <param name="wire">The wire.</param>
    /// <param name="tapTurns">Taps as turns from the start, strictly increasing, each 1 to <paramref name="turns"/> - 1; at most 64.</param>
    /// <param name="startMetre">Place of the first turn along the axis in m, -100 to 100.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value or a tap lies outside its range.</exception>
    /// <exception cref="ArgumentException">There are too many taps or they do not increase.</exception>
    public Winding(double radiusMetre, int turns, double pitchMetre, Wire wire, IReadOnlyList<int> tapTurns, double startMetre = 0.0)
    {
        ArgumentNullException.ThrowIfNull(wire);
        ArgumentNullException.ThrowIfNull(tapTurns);
        Wire = wire;
        RadiusMetre = Guard.InRange(radiusMetre, 0.5 * wire.OverInsulationMetre, 10.0, nameof(radiusMetre));
        Turns = Guard.InRange(turns, 1, MostTurns, nameof(turns));
        PitchMetre = Guard.InRange(pitchMetre, wire.OverInsulationMetre * (1.0 - PitchSlack), 1.0, nameof(pitchMetre));
        StartMetre = Guard.InRange(startMetre, -100.0, 100.0, nameof(startMetre));
        _tapTurns = CheckedTaps(tapTurns, turns);
    }

    /// <summary>Radius to the wire's centre in m.</summary>
    public double RadiusMetre { get; }

    /// <summary>Number of turns.</summary>
    public int Turns { get; }

    /// <summary>Distance of neighbouring turns along the axis in m.</summary>
    public double PitchMetre { get; }

    /// <summary>The wire.</summary>
    public Wire Wire { get; }

    /// <summary>Taps as turns from the start, increasing; neither end is among them.</summary>
    public IReadOnlyList<int> TapTurns => _tapTurns;

    /// <summary>Place of the first turn along the axis in m.</summary>
    public double StartMetre { get; }

    /// <summary>Sections between the ends and the taps: one more than there are taps.</summary>
    public int SectionCount => _tapTurns.Length + 1;

    /// <summary>Winding length in m: turns times pitch.</summary>
    public double LengthMetre => Turns * PitchMetre;

    /// <summary>Winding length over mean diameter.</summary>
    public double LengthOverDiameter => LengthMetre / (2.0 * RadiusMetre);

    /// <summary>Bare wire diameter over pitch.</summary>
    public double WireOverPitch => Wire.BareDiameterMetre / PitchMetre;

    /// <summary>Length of wire in one turn of the helix in m.</summary>
    public double TurnLengthMetre => double.Hypot(2.0 * Math.PI * RadiusMetre, PitchMetre);

    /// <summary>Length of wire in the winding in m.</summary>
    public double WireLengthMetre => Turns * TurnLengthMetre;

    /// <summary>A winding laid on a form.</summary>
    /// <param name="formDiameterMetre">Outside diameter of the form in m, above 0.</param>
    /// <param name="wire">The wire.</param>
    /// <param name="turns">Number of turns, 1 to 5000.</param>
    /// <param name="pitchMetre">Distance of neighbouring turns in m, not below the diameter over insulation; close wound when left out.</param>
    /// <param name="tapTurns">Taps as turns from the start, as for the constructor; none when left out.</param>
    /// <param name="startMetre">Place of the first turn along the axis in m.</param>
    /// <exception cref="ArgumentException">A value lies outside its range or the taps do not increase.</exception>
    public static Winding OnForm(
        double formDiameterMetre,
        Wire wire,
        int turns,
        double? pitchMetre = null,
        IReadOnlyList<int>? tapTurns = null,
        double startMetre = 0.0)
    {
        ArgumentNullException.ThrowIfNull(wire);
        double form = Guard.Positive(formDiameterMetre, nameof(formDiameterMetre));
        double radius = 0.5 * (form + wire.OverInsulationMetre);
        return new Winding(radius, turns, pitchMetre ?? wire.OverInsulationMetre, wire, tapTurns ?? [], startMetre);
    }

    /// <summary>First turn of a section, counted from 0; for <c>SectionCount</c> itself the number of turns.</summary>
    /// <param name="section">0 to <see cref="SectionCount"/>.</param>
    /// <exception cref="ArgumentOutOfRangeException">There is no such section.</exception>
    public int FirstTurn(int section)
    {
        int index = Guard.InRange(section, 0, SectionCount, nameof(section));
        if (index == 0)
        {
            return 0;
        }

        return index == SectionCount ? Turns : _tapTurns[index - 1];
    }

    /// <summary>Two windings are equal when all their measures and taps are.</summary>
    /// <param name="other">The winding to compare with.</param>
    public bool Equals(Winding? other) =>
        other is not null
        && RadiusMetre.Equals(other.RadiusMetre)
        && Turns == other.Turns
        && PitchMetre.Equals(other.PitchMetre)
        && StartMetre.Equals(other.StartMetre)
        && Wire.Equals(other.Wire)
        && _tapTurns.AsSpan().SequenceEqual(other._tapTurns);

    /// <inheritdoc/>
    public override int GetHashCode() =>
        HashCode.Combine(RadiusMetre, Turns, PitchMetre, StartMetre, Wire, _tapTurns.Length, _tapTurns.Sum());

    /// <summary>A copy of taps that are in order.</summary>
    internal static int[] CheckedTaps(IReadOnlyList<int> tapTurns, int turns)
    {
        if (tapTurns.Count > MostTaps)
        {
            throw new ArgumentException($"A winding takes at most {MostTaps} taps, not {tapTurns.Count}.", nameof(tapTurns));
        }

        int previous = 0;
        foreach (int tap in tapTurns)
        {
            if (tap < 1 || tap > turns - 1)
            {
                throw new ArgumentOutOfRangeException(
                    nameof(tapTurns), $"Tap {tap} of a winding of {turns} turns; a tap lies between its ends, from 1 to {turns - 1}.");
            }

            if (tap <= previous)
            {
                throw new ArgumentException($"Tap {tap} follows tap {previous}; taps are given in increasing order, each once.", nameof(tapTurns));
            }

            previous = tap;
        }

        return [.. tapTurns];
    }
}
