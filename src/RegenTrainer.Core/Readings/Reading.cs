using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Readings;

/// <summary>Everything computed for one setting. A figure is null where it does not exist there; a caution says why.</summary>
public sealed record Reading
{
    /// <summary>The setting, with the values in force.</summary>
    public required SettingInForce Setting { get; init; }

    /// <summary>Everything outside a method's range or worth a warning.</summary>
    public required IReadOnlyList<Caution> Cautions { get; init; }

    /// <summary>Whether the dial point is within the capacitor's reach; with false all figures of the tank are null.</summary>
    public required bool Reachable { get; init; }

    /// <summary>Tuning capacitor in farad; null out of reach.</summary>
    public double? TuningFarad { get; init; }

    /// <summary>The capacitor's reach in farad.</summary>
    public required (double Minimum, double Maximum) TuningReachFarad { get; init; }

    /// <summary>The control element's value in its own unit; null for a stage without a control.</summary>
    public double? ControlValue { get; init; }

    /// <summary>Unit of the control element: ohm, or none for a factor.</summary>
    public required Unit ControlUnit { get; init; }

    /// <summary>Mechanical angle of the control in degrees from the idle stop; null without a control.</summary>
    public double? ControlDegrees { get; init; }

    /// <summary>Where the tank tips over; null out of reach.</summary>
    public TipOver? TipOver { get; init; }

    /// <summary>|s|/(-2 Re s) of the tank mode; null above tip-over.</summary>
    public double? EffectiveQ { get; init; }

    /// <summary>The same with the regenerating device out of its socket, retuned to the same frequency.</summary>
    public double? QRegenerationOff { get; init; }

    /// <summary>Effective Q at travel 0; null where the stage oscillates there.</summary>
    public double? QAtIdleStop { get; init; }

    /// <summary>Between the two -3 dB points of the response in Hz; null above tip-over or where one side has none.</summary>
    public double? BandwidthHz { get; init; }

    /// <summary>The two -3 dB points in Hz.</summary>
    public (double Lower, double Upper)? BandEdgesHz { get; init; }

    /// <summary>Frequency of the tank mode in Hz.</summary>
    public double? TankHz { get; init; }

    /// <summary>Real part of the tank mode in 1/s: negative decays, positive grows; of another tuned circuit where that one oscillates.</summary>
    public double? GrowthPerSecond { get; init; }

    /// <summary>Antenna electromotive force to output at the station, in dB; null above tip-over.</summary>
    public double? StageGainDb { get; init; }

    /// <summary>Time in which a struck tank decays to 1/e, in s; null above tip-over.</summary>
    public double? RingTimeSeconds { get; init; }

    /// <summary>Classical loop gain still missing, in dB; null where the effective Q does not exceed the Q with regeneration off.</summary>
    public double? MarginDb { get; init; }

    /// <summary>Travel from here to the next upward crossing, in %.</summary>
    public double? MarginPercent { get; init; }

    /// <summary>Rotation from here to the next upward crossing, in degrees.</summary>
    public double? MarginDegrees { get; init; }

    /// <summary>How much stronger the regenerating device would have to be to tip the stage here, in dB; null where none would.</summary>
    public double? DeviceMarginDb { get; init; }

    /// <summary>What the stage does; null out of reach.</summary>
    public Regime? Regime { get; init; }

    /// <summary>Tank frequency now minus with the device removed, same capacitor, in Hz.</summary>
    public double? PulledHz { get; init; }

    /// <summary>Share of speech intelligibility the selectivity leaves, 0 to 1.</summary>
    public double? SpeechIndex { get; init; }

    /// <summary>Audio frequencies in Hz at which the audio is 3, 6 and 10 dB down; null where it never is.</summary>
    public (double? Db3, double? Db6, double? Db10) AudioDownHz { get; init; }

    /// <summary>The bandwidth in degrees of the tuning capacitor's shaft.</summary>
    public double? BandwidthDialDegrees { get; init; }

    /// <summary>Shift of the tank in Hz by a hand that adds 0.1 pF across the tuning capacitor.</summary>
    public double? HandShiftHz { get; init; }

    /// <summary>The audio frequencies asked for.</summary>
    public IReadOnlyList<Sideband> Sidebands { get; init; } = [];

    /// <summary>Natural frequencies that do not belong to the tuned circuit.</summary>
    public IReadOnlyList<StrayMode> StrayModes { get; init; } = [];

    /// <summary>Whether a stray mode grows.</summary>
    public bool Parasitic { get; init; }
}

/// <summary>A setting with every value in force.</summary>
/// <param name="DialHz">Dial in Hz; for a locked dial the tank's frequency at the idle stop.</param>
/// <param name="StationHz">Station in Hz.</param>
/// <param name="TravelPercent">Travel of the control in %.</param>
/// <param name="SupplyVolt">Supply in volt; null where the stage has none.</param>
/// <param name="TemperatureCelsius">Temperature in °C.</param>
/// <param name="Grade">Grade of the regenerating device.</param>
/// <param name="Device">Type of the regenerating device; null where it is no device of the shelf.</param>
/// <param name="DialMode">Follows or locked.</param>
public sealed record SettingInForce(
    double DialHz,
    double StationHz,
    double TravelPercent,
    double? SupplyVolt,
    double TemperatureCelsius,
    Devices.Grade Grade,
    string? Device,
    DialMode DialMode);
