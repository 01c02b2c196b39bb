using RegenTrainer.Core.Regeneration;

namespace RegenTrainer.Core.Readings;

/// <summary>One row of the run along the dial; the figures equal those of a <see cref="Reading"/> there.</summary>
/// <param name="DialHz">Dial in Hz.</param>
/// <param name="Reachable">Whether the capacitor reaches it.</param>
public sealed record DialPoint(double DialHz, bool Reachable)
{
    /// <summary>Tuning capacitor in farad.</summary>
    public double? TuningFarad { get; init; }

    /// <summary>Where the tank tips over.</summary>
    public TipOver? TipOver { get; init; }

    /// <summary>Effective Q at the travel set; null above tip-over.</summary>
    public double? EffectiveQ { get; init; }

    /// <summary>Bandwidth at the travel set, in Hz.</summary>
    public double? BandwidthHz { get; init; }

    /// <summary>Stage gain at the travel set, in dB.</summary>
    public double? StageGainDb { get; init; }

    /// <summary>Pull against the device removed, in Hz.</summary>
    public double? PulledHz { get; init; }

    /// <summary>Why regeneration is of no use here; null where the stage tips over within the travel, and for a stage without a control.</summary>
    public DeadSpotReason? Dead { get; init; }
}
