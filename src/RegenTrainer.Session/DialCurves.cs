using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Session;

/// <summary>One run along the dial.</summary>
/// <param name="Grade">The grade of the regenerating device.</param>
/// <param name="Points">Its points, upward in frequency; the same frequencies for every grade.</param>
/// <param name="DeadSpots">The stretches where regeneration is of no use.</param>
public sealed record DialCurve(Grade Grade, IReadOnlyList<DialPoint> Points, IReadOnlyList<DeadSpot> DeadSpots);

/// <summary>The runs along the dial for every grade there is; immutable.</summary>
/// <param name="Curves">Weak, typical and strong; the typical alone where the stage has no device that comes in grades.</param>
public sealed record DialCurves(IReadOnlyList<DialCurve> Curves);
