using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>
/// What a step of temperature or supply does to a stage that nobody touches: solved half a step on either side, with the tuning
/// capacitor where it stands.
/// </summary>
internal static class DriftReader
{
    private const double KelvinStep = 1;

    private const double VoltStep = 0.1;

    /// <summary>The change per kelvin and per tenth of a volt; null where the stage cannot be solved there or has no supply.</summary>
    public static (BiasDrift? PerKelvin, BiasDrift? PerTenthVolt) Read(StageWorkspace ws, Setting setting)
    {
        Position position = Position.Solve(ws, setting, TankHint.None);
        if (!position.State.Found || !position.Reachable)
        {
            return (null, null);
        }

        Setting held = setting with { DialMode = DialMode.Locked, LockedFarad = position.State.Mode.TuningFarad };
        double celsius = held.TemperatureCelsius;
        BiasDrift? kelvin = Between(
            At(ws, held with { TemperatureCelsius = celsius - (KelvinStep / 2) }), At(ws, held with { TemperatureCelsius = celsius + (KelvinStep / 2) }));
        if ((setting.SupplyVolt ?? ws.Model.Circuit.SupplyVolt) is not { } volt || volt <= VoltStep / 2)
        {
            return (kelvin, null);
        }

        return (kelvin, Between(
            At(ws, held with { SupplyVolt = volt - (VoltStep / 2) }), At(ws, held with { SupplyVolt = volt + (VoltStep / 2) })));
    }

    private static BiasDrift? Between(BiasDrift? below, BiasDrift? above) => below is null || above is null ? null : new BiasDrift(
        above.CollectorAmpere - below.CollectorAmpere,
        above.TipOverPercent - below.TipOverPercent,
        above.EffectiveQ - below.EffectiveQ,
        above.TankHz - below.TankHz);

    /// <summary>The figures themselves at a setting.</summary>
    private static BiasDrift? At(StageWorkspace ws, Setting setting)
    {
        Position position = Position.Solve(ws, setting, TankHint.None);
        if (!position.State.Found)
        {
            return null;
        }

        double? collector = null;
        for (int d = 0; d < ws.Model.Network.Devices.Count; d++)
        {
            collector = ws.Model.Network.Devices[d].Regenerating ? Math.Abs(ws.Circuit.Points[d].I2) : collector;
        }

        TankState state = position.State;
        bool decays = state.Mode.S.Real < 0 && TankFamily.FastestGrowing(ws, position.Query.DialHz, state).Real <= 0;
        TipOver? tipOver = ws.Model.ControlLaw is { } law ? TipOverSolver.TryFind(ws, position.Query, law, TankHint.None, out _) : null;
        return new BiasDrift(collector, tipOver?.First?.TravelPercent, decays ? state.Mode.Q : null, state.Mode.Hz);
    }
}
