using RegenTrainer.Core.Readings;

namespace RegenTrainer.Files.Reports;

/// <summary>The operating point as JSON, schema <c>regentrainer.bias/1</c>.</summary>
public static class BiasJson
{
    /// <summary>Writes an operating point as UTF-8 text.</summary>
    /// <param name="stage">The stage's title.</param>
    /// <param name="bias">The operating point.</param>
    /// <param name="headroom">How far the stage can be driven.</param>
    public static byte[] Write(string stage, BiasReading bias, HeadroomReading headroom) =>
        Report.Write("bias", stage, SettingKeys.Of(bias.Setting), [.. bias.Cautions, .. headroom.Cautions], writer =>
        {
            writer.List("devices", bias.Devices, (w, device) => Device(w, device, headroom.Devices.FirstOrDefault(h => h.Name == device.Name)));
            writer.List("diodes", bias.Diodes, (w, diode) =>
            {
                w.Word("name", diode.Name);
                w.Word("type", diode.Type);
                w.Number("forward_ampere", diode.ForwardAmpere);
                w.Number("forward_volt", diode.ForwardVolt);
                w.Number("junction_ohm", diode.JunctionOhm);
                w.Number("junction_farad", diode.JunctionFarad);
            });
            writer.List("nodes", bias.NodeVolts, (w, node) =>
            {
                w.Word("node", node.Node);
                w.Number("volt", node.Volt);
            });
            writer.Number("supply_ampere", bias.SupplyAmpere);
            writer.Number("residual_ampere", bias.ResidualAmpere);
            writer.Word("first_limit_device", headroom.First?.Device);
            writer.Word("first_limit", headroom.First?.Limit switch
            {
                DeviceLimit.CutOff => "cut-off",
                DeviceLimit.Saturation => "saturation",
                _ => null,
            });
            Level(writer, "first_limit", headroom.First?.Level);
            writer.Number("supply_fresh_ampere", bias.Battery?.FreshAmpere);
            writer.Number("supply_tired_ampere", bias.Battery?.TiredAmpere);
            writer.Number("battery_life_s", bias.Battery?.LifeSeconds);
            writer.Group("per_kelvin", w => Drift(w, bias.PerKelvin));
            writer.Group("per_tenth_volt", w => Drift(w, bias.PerTenthVolt));
        });

    private static void Level(FigureWriter writer, string limit, LimitLevel? level)
    {
        writer.Number(limit + "_antenna_volt", level?.AntennaVolt);
        writer.Number(limit + "_tank_volt", level?.TankVolt);
        writer.Number(limit + "_output_volt", level?.OutputVolt);
    }

    private static void Drift(FigureWriter writer, BiasDrift? drift)
    {
        writer.Number("collector_ampere", drift?.CollectorAmpere);
        writer.Number("tip_over_percent", drift?.TipOverPercent);
        writer.Number("effective_q", drift?.EffectiveQ);
        writer.Number("tank_hz", drift?.TankHz);
    }

    private static void Device(FigureWriter writer, DeviceBias device, DeviceHeadroom? headroom)
    {
        writer.Word("name", device.Name);
        writer.Word("type", device.Type);
        writer.Number("collector_ampere", device.CollectorAmpere);
        writer.Number("base_ampere", device.BaseAmpere);
        writer.Number("base_emitter_volt", device.BaseEmitterVolt);
        writer.Number("collector_emitter_volt", device.CollectorEmitterVolt);
        writer.Number("transconductance_siemens", device.TransconductanceSiemens);
        writer.Number("current_gain", device.CurrentGain);
        writer.Number("dissipation_watt", device.DissipationWatt);
        writer.Flag("saturated", device.Saturated);
        Level(writer, "cut_off", headroom?.CutOff);
        Level(writer, "saturation", headroom?.Saturation);
    }
}
