using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Devices;

/// <summary>Which device of its type: the spread of a drawer.</summary>
public enum Grade
{
    /// <summary>Regenerates least: low gain, much capacitance, slow; of a diode the one that loads the tank most.</summary>
    Weak,

    /// <summary>The data sheet's typical device.</summary>
    Typical,

    /// <summary>Regenerates most: high gain, little capacitance, fast; of a diode the one that loads the tank least.</summary>
    Strong,
}

/// <summary>Polarity of a bipolar transistor.</summary>
public enum Polarity
{
    /// <summary>Collector positive.</summary>
    Npn,

    /// <summary>Collector negative.</summary>
    Pnp,
}

/// <summary>How a figure is known.</summary>
public enum KnownBy
{
    /// <summary>Printed in the named data sheet.</summary>
    Print,

    /// <summary>Recalled.</summary>
    Memory,

    /// <summary>Usual for such devices, or derived from other figures.</summary>
    Typical,
}

/// <summary>A figure of a device with its spread, its condition and its origin.</summary>
public sealed record DeviceFigure
{
    /// <summary>States a figure.</summary>
    /// <param name="minimum">Smallest value; null where none is stated.</param>
    /// <param name="typical">Typical value, above 0.</param>
    /// <param name="maximum">Largest value; null where none is stated.</param>
    /// <param name="at">The condition it holds at (a current, a voltage), in SI units; null where none matters.</param>
    /// <param name="known">How it is known.</param>
    /// <param name="source">Where from.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is not above 0, or minimum, typical and maximum are not in order.</exception>
    public DeviceFigure(double? minimum, double typical, double? maximum, double? at, KnownBy known, string source)
    {
        Typical = Guard.Positive(typical, nameof(typical));
        Minimum = minimum is { } low ? Guard.InRange(low, double.Epsilon, typical, nameof(minimum)) : null;
        Maximum = maximum is { } high ? Guard.InRange(high, typical, double.MaxValue, nameof(maximum)) : null;
        At = at is { } condition ? Guard.Positive(condition, nameof(at)) : null;
        (Known, Source) = (known, source);
    }

    /// <summary>Smallest value; null where none is stated.</summary>
    public double? Minimum { get; }

    /// <summary>Typical value.</summary>
    public double Typical { get; }

    /// <summary>Largest value; null where none is stated.</summary>
    public double? Maximum { get; }

    /// <summary>The condition it holds at, in SI units.</summary>
    public double? At { get; }

    /// <summary>How it is known.</summary>
    public KnownBy Known { get; }

    /// <summary>Where from.</summary>
    public string Source { get; }

    /// <summary>The value of a grade whose strong end is the large one.</summary>
    internal double RisingWith(Grade grade) => grade switch
    {
        Grade.Weak => Minimum ?? Typical,
        Grade.Strong => Maximum ?? Typical,
        _ => Typical,
    };

    /// <summary>The value of a grade whose strong end is the small one.</summary>
    internal double FallingWith(Grade grade) => grade switch
    {
        Grade.Weak => Maximum ?? Typical,
        Grade.Strong => Minimum ?? Typical,
        _ => Typical,
    };
}

/// <summary>Limits a device must not exceed.</summary>
/// <param name="CollectorVolt">Largest collector voltage in volt; null where unknown.</param>
/// <param name="CollectorAmpere">Largest collector current in ampere; null where unknown.</param>
/// <param name="DissipationWatt">Largest dissipation in watt; null where unknown.</param>
public sealed record DeviceRating(double? CollectorVolt, double? CollectorAmpere, double? DissipationWatt);
