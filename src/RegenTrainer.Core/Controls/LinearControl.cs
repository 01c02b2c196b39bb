using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Controls;

/// <summary>A control whose element goes evenly from one value to another.</summary>
public sealed record LinearControl : IControlLaw
{
    /// <summary>States an even control.</summary>
    /// <param name="minimum">Value at travel 0.</param>
    /// <param name="maximum">Value at travel 100 %, another than <paramref name="minimum"/>.</param>
    /// <param name="mechanicalDegrees">Angle from stop to stop in degrees, above 0 to 3600.</param>
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
    public double ValueAt(double travelPercent) =>
        ValueAtStart + ((ValueAtEnd - ValueAtStart) * Guard.InRange(travelPercent, 0, 100, nameof(travelPercent)) / 100);

    /// <inheritdoc/>
    public double? TravelAt(double value)
    {
        double travel = 100 * (value - ValueAtStart) / (ValueAtEnd - ValueAtStart);
        return travel is >= 0 and <= 100 ? travel : null;
    }

    /// <inheritdoc/>
    public double DegreesAt(double travelPercent) => MechanicalDegrees * travelPercent / 100;
}
