using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Stages;

/// <summary>How the tuning capacitor behaves when the control moves.</summary>
public enum DialMode
{
    /// <summary>The capacitor is solved so that the tank stays at the dial's frequency.</summary>
    Follows,

    /// <summary>The capacitor stays and regeneration pulls the tank.</summary>
    Locked,
}

/// <summary>Where the builder's hands are.</summary>
/// <param name="DialHz">Dial in Hz, above 0.</param>
/// <param name="TravelPercent">Travel of the regeneration control, 0 to 100 %.</param>
public sealed record Setting(double DialHz, double TravelPercent)
{
    /// <summary>The station on the air in Hz; null means at the dial.</summary>
    public double? StationHz { get; init; }

    /// <summary>Supply in volt; null means the design's own.</summary>
    public double? SupplyVolt { get; init; }

    /// <summary>Temperature of everything in °C, -40 to 85.</summary>
    public double TemperatureCelsius { get; init; } = 20;

    /// <summary>Which device of its type is in the regenerating socket.</summary>
    public Grade Grade { get; init; } = Grade.Typical;

    /// <summary>Whether the tuning follows the dial or is locked.</summary>
    public DialMode DialMode { get; init; }

    /// <summary>
    /// The capacitor a locked dial holds, in farad. Null while locked: the value that tunes the tank to the dial with the
    /// control at its idle stop.
    /// </summary>
    public double? LockedFarad { get; init; }

    /// <summary>The device that replaces the one in the regenerating socket; null for the design's own.</summary>
    public BipolarModel? Device { get; init; }

    /// <summary>The station's frequency in force, in Hz.</summary>
    public double StationInForceHz => StationHz ?? DialHz;
}
