using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Session;

/// <summary>One run along the dial.</summary>
/// <param name="Grade">The grade of the regenerating device.</param>
/// <param name="Points">Its points, upward in frequency; the same frequencies for every grade.</param>
public sealed record DialCurve(Grade Grade, IReadOnlyList<DialPoint> Points);

/// <summary>The runs along the dial for every grade there is; immutable.</summary>
/// <param name="Curves">Weak, typical and strong; the typical alone where the stage has no device that comes in grades.</param>
public sealed record DialCurves(IReadOnlyList<DialCurve> Curves);
