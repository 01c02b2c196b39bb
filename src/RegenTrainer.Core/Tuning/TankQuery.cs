using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tuning;

/// <summary>Where the tank is asked for: a setting with the control already turned into its element's value.</summary>
/// <param name="DialHz">Dial in Hz, above 0: held by a dial that follows, a first guess for a locked one.</param>
/// <param name="Mode">Follows or locked.</param>
/// <param name="LockedFarad">The capacitor of a locked dial in farad; ignored while it follows.</param>
/// <param name="ControlValue">Value of the controlled element in its own unit.</param>
/// <param name="TemperatureCelsius">Temperature in °C.</param>
/// <param name="Grade">Grade of the regenerating device.</param>
/// <param name="SupplyVolt">Supply in volt; null for the design's own.</param>
/// <param name="Device">Type in the regenerating socket; null for the design's own.</param>
/// <param name="Removed">Whether the regenerating device is out of its socket.</param>
public readonly record struct TankQuery(
    double DialHz,
    DialMode Mode,
    double LockedFarad,
    double ControlValue,
    double TemperatureCelsius,
    Grade Grade,
    double? SupplyVolt,
    BipolarModel? Device,
    bool Removed = false)
{
    internal double? FollowRadians => Mode == DialMode.Follows ? 2 * Math.PI * DialHz : null;

    internal NetworkConditions ConditionsAt(double lossHz) => new(lossHz, TemperatureCelsius, Grade, SupplyVolt, Device);
}
