using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Stages.Fields;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>What a stage draws from its supply, and how long a battery lasts.</summary>
internal static class BatteryReader
{
    private const double SecondsPerHour = 3600;

    /// <summary>Current and life between the fresh and the tired supply; null where the stage has no supply or no operating point there.</summary>
    public static BatteryLife? TryRead(StageWorkspace ws, Setting setting)
    {
        StageDesign design = ws.Model.Design;
        if (ws.Model.Circuit.SupplyVolt is not { } nominal)
        {
            return null;
        }

        double fresh = design.NumberOrNull(RangeFields.SupplyFresh) ?? nominal, tired = design.NumberOrNull(RangeFields.SupplyTired) ?? nominal;
        if (AmpereAt(ws, setting, fresh) is not { } first
            || AmpereAt(ws, setting, 0.5 * (fresh + tired)) is not { } middle
            || AmpereAt(ws, setting, tired) is not { } last)
        {
            return null;
        }

        // The voltage falls evenly with the charge drawn, so that the life is the mean of capacity over current (Simpson's rule).
        double perAmpere = ((1 / first) + (4 / middle) + (1 / last)) / 6;
        double? seconds = design.NumberOrNull(BiasFields.BatteryCapacity) * SecondsPerHour * perAmpere;
        return new BatteryLife(fresh, tired, first, last, first > 0 && middle > 0 && last > 0 ? seconds : null);
    }

    /// <summary>Solves the operating point of a setting, which then stands in the workspace.</summary>
    public static OperatingPoint Solve(StageWorkspace ws, Setting setting, out TankQuery query)
    {
        Workspace w = ws.Circuit;
        query = Position.QueryOf(setting, ws.Model.ControlLaw?.ValueAt(setting.TravelPercent) ?? 0);
        w.Values.SetConditions(query.ConditionsAt(setting.DialHz));
        w.Values.SetDirect(query.ControlValue, regeneratingRemoved: false);
        return OperatingPointSolver.Solve(w, regeneratingRemoved: false, fromVoltages: false);
    }

    /// <summary>Current out of the supplies of the operating point in the workspace, in ampere; null where there are none.</summary>
    public static double? Ampere(Workspace w)
    {
        double? sum = null;
        foreach (BranchStamp branch in w.Network.Branches)
        {
            if (branch.Kind == BranchKind.Supply)
            {
                double drawn = -w.Voltages[branch.Unknown] / Network.CurrentScaleOhm;
                sum = (sum ?? 0) + (branch.Volt < 0 ? -drawn : drawn);
            }
        }

        return sum;
    }

    private static double? AmpereAt(StageWorkspace ws, Setting setting, double volt) =>
        Solve(ws, setting with { SupplyVolt = volt }, out _).Found ? Ampere(ws.Circuit) : null;
}
