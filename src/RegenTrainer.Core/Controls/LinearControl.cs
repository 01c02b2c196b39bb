using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Controls;

/// <summary>A control whose element goes evenly from one value to another.</summary>
public sealed record LinearControl : IControlLaw
{
    /// <summary>States an even control.</summary>
    /// <param name="minimum">Value at travel 0.</param>
    /// <param name="maximum">Value at travel 100 %, another than <paramref name="minimum"/>.</param>
    /// <param name="mechanicalDegrees">Angle from stop to stop in degrees, 1 to 3600.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is not finite, both are equal, or the angle is outside its range.</exception>
    public LinearControl(double minimum, double maximum, double mechanicalDegrees = 300)
    {
        ValueAtStart = Guard.Finite(minimum, nameof(minimum));
        ValueAtEnd = Guard.Finite(maximum, nameof(maximum));
        MechanicalDegrees = Guard.InRange(mechanicalDegrees, 1, 3600, nameof(mechanicalDegrees));
        if (minimum == maximum)
        {
            throw new ArgumentOutOfRangeException(nameof(maximum), maximum, "both ends have the same value");
        }
    }

    /// <inheritdoc/>
    public double ValueAtStart { get; }

    /// <inheritdoc/>
    public double ValueAtEnd { get; }

    /// <summary>Angle from stop to stop in degrees.</summary>
    public double MechanicalDegrees { get; }

    /// <inheritdoc/>
    public IReadOnlyList<double> KinkTravels => [];

    /// <inheritdoc/>
    public double ValueAt(double travelPercent)
    {
        double value = ValueAtStart + ((ValueAtEnd - ValueAtStart) * Guard.InRange(travelPercent, 0, 100, nameof(travelPercent)) / 100);

        // Rounding must not carry the value past its end, where it would have no travel.
        return Math.Clamp(value, Least, Largest);
    }

    /// <inheritdoc/>
    public double? TravelAt(double value)
    {
        if (!(value >= Least && value <= Largest))
        {
            return null;
        }

        return Math.Clamp(100 * (value - ValueAtStart) / (ValueAtEnd - ValueAtStart), 0, 100);
    }

    /// <inheritdoc/>
    public double DegreesAt(double travelPercent) => MechanicalDegrees * travelPercent / 100;

    private double Least => Math.Min(ValueAtStart, ValueAtEnd);

    private double Largest => Math.Max(ValueAtStart, ValueAtEnd);
}
