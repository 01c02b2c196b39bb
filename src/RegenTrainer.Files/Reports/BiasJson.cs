using RegenTrainer.Core.Readings;

namespace RegenTrainer.Files.Reports;

/// <summary>The operating point as JSON, schema <c>regentrainer.bias/1</c>.</summary>
public static class BiasJson
{
    /// <summary>Writes an operating point as UTF-8 text.</summary>
    /// <param name="stage">The stage's title.</param>
    /// <param name="bias">The operating point.</param>
    public static byte[] Write(string stage, BiasReading bias) =>
        Report.Write("bias", stage, SettingKeys.Of(bias.Setting), bias.Cautions, writer =>
        {
            writer.List("devices", bias.Devices, Device);
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
        });

    private static void Device(FigureWriter writer, DeviceBias device)
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
    }
}
