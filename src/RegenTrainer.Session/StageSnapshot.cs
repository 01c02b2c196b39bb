using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>Everything a page shows, as it stood at one moment; immutable.</summary>
/// <param name="Title">The stage's title as its builder wrote it.</param>
/// <param name="Dial">The dial.</param>
/// <param name="Control">The regeneration control; null where the stage has none.</param>
/// <param name="Setting">Where the hands are.</param>
/// <param name="Reading">What was read there.</param>
/// <param name="Curve">The response over <see cref="LiveStage.HalfSpanHz"/> to either side of the station, upward in frequency; empty where there is none.</param>
/// <param name="Neighbours">The neighbours on the raster; empty where there is no response.</param>
/// <param name="Regimes">What the stage does along the travel, in order; empty where that cannot be said.</param>
/// <param name="Notice">What the last key could not do, in words; empty where it did.</param>
public sealed record StageSnapshot(
    string Title,
    Dial Dial,
    RegenerationControl? Control,
    Setting Setting,
    Reading Reading,
    IReadOnlyList<ResponsePoint> Curve,
    IReadOnlyList<Neighbour> Neighbours,
    IReadOnlyList<RegimeSpan> Regimes,
    string Notice);
