using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>What the tuning capacitor and its shaft do to the tank in the workspace, by the slope at its present place.</summary>
internal static class TuningScale
{
    /// <summary>What a hand near the coil adds across the tuning capacitor, in farad: common practice.</summary>
    private const double HandFarad = 0.1e-12;

    /// <summary>Shift of the tank in Hz by a hand near the coil.</summary>
    public static double HandShiftHz(StageWorkspace ws, in ModeResult mode) => HzPerFarad(ws, mode) * HandFarad;

    /// <summary>A span of frequency in degrees of the tuning capacitor's shaft; null out of the capacitor's reach.</summary>
    public static double? DialDegrees(StageWorkspace ws, in ModeResult mode, double spanHz)
    {
        VariableCapacitor capacitor = ws.Model.Circuit.Dial.Capacitor;
        if (capacitor.DegreesAt(mode.TuningFarad) is not { } degrees)
        {
            return null;
        }

        double hzPerDegree = HzPerFarad(ws, mode) * capacitor.FaradPerDegreeAt(degrees);
        return hzPerDegree == 0 ? null : spanHz / Math.Abs(hzPerDegree);
    }

    private static double HzPerFarad(StageWorkspace ws, in ModeResult mode) =>
        ModeSolver.ByTuning(ws.Circuit, mode.S).Imaginary / (2 * Math.PI);
}
