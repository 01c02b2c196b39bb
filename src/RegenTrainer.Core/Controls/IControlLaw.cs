namespace RegenTrainer.Core.Controls;

/// <summary>Travel of a control, 0 to 100 % from stop to stop, to the value of the element it turns; monotone in either direction.</summary>
public interface IControlLaw
{
    /// <summary>Value at travel 0.</summary>
    double ValueAtStart { get; }

    /// <summary>Value at travel 100 %.</summary>
    double ValueAtEnd { get; }

    /// <summary>Travels in % at which the law bends; its slope jumps there.</summary>
    IReadOnlyList<double> KinkTravels { get; }

    /// <summary>The element's value.</summary>
    /// <param name="travelPercent">Travel, 0 to 100 %.</param>
    /// <exception cref="ArgumentOutOfRangeException">The travel is outside its range.</exception>
    double ValueAt(double travelPercent);

    /// <summary>The travel in % at which the element has a value; null out of the control's reach.</summary>
    double? TravelAt(double value);

    /// <summary>Mechanical angle from the idle stop in degrees.</summary>
    /// <param name="travelPercent">Travel, 0 to 100 %.</param>
    double DegreesAt(double travelPercent);
}
