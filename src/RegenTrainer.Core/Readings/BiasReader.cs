using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>Reads the operating point in the builder's terms.</summary>
public static class BiasReader
{
    /// <summary>The operating point at a setting, what it draws and how it drifts; how far it can be driven is <see cref="HeadroomReader"/>'s.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    public static BiasReading Read(StageWorkspace ws, Setting setting)
    {
        Workspace w = ws.Circuit;
        StageModel model = ws.Model;
        OperatingPoint bias = BatteryReader.Solve(ws, setting, out TankQuery query);
        var cautions = new List<Caution>();
        var position = new Position(query, new TankState(bias, default), setting.DialHz, Reachable: true);
        SettingInForce inForce = StageReader.InForce(model, setting, position);
        if (!bias.Found)
        {
            cautions.Add(Failure.Describe(model, position.State));
            return new BiasReading(inForce, cautions, [], [], null, double.NaN);
        }

        DeviceBias[] devices = [.. Enumerable.Range(0, model.Network.Devices.Count)
            .Where(d => model.Network.Devices[d].Model is BipolarModel).Select(d => Device(w, d, setting, cautions))];
        (string, double)[] nodes = [.. model.Network.NodeNames.Select(n => (n, w.Voltages[model.Network.NodeIndex(n)]))];
        IReadOnlyList<DiodeBias> diodes = DiodeBias.ReadAll(w, cautions);
        double? supply = BatteryReader.Ampere(w);

        // These solve the stage elsewhere: nothing of this operating point is left in the workspace after them.
        (BiasDrift? perKelvin, BiasDrift? perTenthVolt) = DriftReader.Read(ws, setting);
        return new BiasReading(inForce, cautions, devices, nodes, supply, bias.ResidualAmpere)
        {
            Battery = BatteryReader.TryRead(ws, setting),
            PerKelvin = perKelvin,
            PerTenthVolt = perTenthVolt,
            Diodes = diodes,
        };
    }

    private static DeviceBias Device(Workspace w, int d, Setting setting, List<Caution> cautions)
    {
        DeviceStamp stamp = w.Network.Devices[d];
        BipolarModel model = stamp.Regenerating && setting.Device is { } replacement ? replacement : (BipolarModel)stamp.Model;
        TwoPortPoint p = w.Points[d];
        double sign = model.Polarity == Polarity.Npn ? 1 : -1;
        double At(int unknown) => unknown < 0 ? 0 : w.Voltages[unknown];
        double baseEmitter = sign * (At(stamp.Control) - At(stamp.Common)), collectorEmitter = sign * (At(stamp.Output) - At(stamp.Common));
        double collector = sign * p.I2, basis = sign * p.I1;
        double dissipation = (collector * collectorEmitter) + (basis * baseEmitter);
        bool saturated = collectorEmitter < HeadroomReader.SaturatedBelowVolt;
        if (saturated)
        {
            cautions.Add(new Caution("saturated", $"{stamp.Part.Name} is saturated: its collector stands {QuantityText.Write(collectorEmitter, Unit.Volt)} above its emitter"));
        }

        AddRatings(model, stamp.Part.Name, collector, collectorEmitter, dissipation, cautions);
        return new DeviceBias(
            stamp.Part.Name, model.Name, collector, basis, baseEmitter, collectorEmitter, p.G21, collector / basis, dissipation, saturated);
    }

    private static void AddRatings(BipolarModel model, string name, double collector, double volt, double watt, List<Caution> cautions)
    {
        if (model.Rating is not { } rating)
        {
            return;
        }

        void Check(double value, double? limit, Unit unit, string what)
        {
            if (limit is { } most && value > most)
            {
                cautions.Add(new Caution(
                    "rating", $"{name}: {what} {QuantityText.Write(value, unit)} is above the rated {QuantityText.Write(most, unit)}"));
            }
        }

        Check(volt, rating.CollectorVolt, Unit.Volt, "collector voltage");
        Check(collector, rating.CollectorAmpere, Unit.Ampere, "collector current");
        Check(watt, rating.DissipationWatt, Unit.Watt, "dissipation");
    }
}
