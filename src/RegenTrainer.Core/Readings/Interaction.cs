using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Readings;

/// <summary>How regeneration, dial and station act on each other at one setting. A figure is null where it does not exist there.</summary>
public sealed record Interaction
{
    /// <summary>The stretch of travel that leads up to tip-over; null where the stage does not tip over.</summary>
    public ApproachToTipOver? Approach { get; init; }

    /// <summary>The bandwidth in degrees of the tuning capacitor's shaft; null above tip-over.</summary>
    public double? BandwidthDialDegrees { get; init; }

    /// <summary>
    /// The reduction wanted between knob and shaft so that the half degree a hand sets (common practice) moves the tank by no
    /// more than its bandwidth; 1 where none is wanted, null above tip-over.
    /// </summary>
    public double? VernierRatio { get; init; }

    /// <summary>Shift of the tank in Hz by a hand that adds 0.1 pF across the tuning capacitor.</summary>
    public double? HandShiftHz { get; init; }

    /// <summary>What the station meets, on the dial or off it; null above tip-over.</summary>
    public StationFit? Station { get; init; }

    /// <summary>What could not be computed.</summary>
    public required IReadOnlyList<Caution> Cautions { get; init; }
}

/// <summary>The last tenth of the travel below tip-over, with the capacitor as it stands at tip-over.</summary>
/// <param name="FromPercent">Where it begins, in % of travel.</param>
/// <param name="ToPercent">The tip-over, in % of travel.</param>
/// <param name="FromStop">Whether the control has less than a tenth of its travel below tip-over, so that it begins at the idle stop.</param>
/// <param name="PullHz">Tank at tip-over minus tank at the beginning, in Hz.</param>
/// <param name="RepeakFarad">The capacitor at tip-over minus the one that puts the tank on the same frequency at the beginning, in farad.</param>
/// <param name="RepeakDegrees">The same in degrees of the shaft, positive towards the closed stop; null out of the capacitor's reach.</param>
public readonly record struct ApproachToTipOver(
    double FromPercent, double ToPercent, bool FromStop, double PullHz, double RepeakFarad, double? RepeakDegrees);

/// <summary>How a station sits in the response.</summary>
/// <param name="OffsetHz">Station minus tank, in Hz.</param>
/// <param name="CarrierLossDb">Response at the station against that at the tank's frequency, in dB; negative where the carrier is weakened.</param>
/// <param name="Audio">What it does to each audio frequency.</param>
public sealed record StationFit(double OffsetHz, double CarrierLossDb, IReadOnlyList<OffTuneAudio> Audio);

/// <summary>What a station's place in the response does to one audio frequency.</summary>
/// <param name="AudioHz">Audio frequency in Hz.</param>
/// <param name="AsymmetryDb">Upper against lower sideband, in dB.</param>
/// <param name="SecondHarmonicPercent">Second harmonic out of an ideal envelope detector at 30 % depth, in % of the fundamental.</param>
public readonly record struct OffTuneAudio(double AudioHz, double AsymmetryDb, double SecondHarmonicPercent);
