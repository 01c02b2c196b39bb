using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Coils;

/// <summary>Round copper wire of a winding whose turns all have one length.</summary>
public sealed record TurnWire
{
    /// <summary>Describes the wire.</summary>
    /// <param name="bareDiameterMetre">Diameter of the copper in m, 1 um to 20 mm.</param>
    /// <param name="turnLengthMetre">Length of one turn in m, 0.1 mm to 100 m.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    public TurnWire(double bareDiameterMetre, double turnLengthMetre)
    {
        BareDiameterMetre = Guard.InRange(bareDiameterMetre, 1e-6, 0.02, nameof(bareDiameterMetre));
        TurnLengthMetre = Guard.InRange(turnLengthMetre, 1e-4, 100.0, nameof(turnLengthMetre));
    }

    /// <summary>Diameter of the copper in m.</summary>
    public double BareDiameterMetre { get; }

    /// <summary>Length of one turn in m.</summary>
    public double TurnLengthMetre { get; }

    /// <summary>Resistance of one turn to direct current in ohm.</summary>
    /// <param name="temperatureCelsius">Temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature lies outside that range.</exception>
    public double OhmPerTurn(double temperatureCelsius) =>
        4.0 * TurnLengthMetre
        / (PhysicalConstants.CopperConductivityAt(temperatureCelsius) * Math.PI * BareDiameterMetre * BareDiameterMetre);
}
