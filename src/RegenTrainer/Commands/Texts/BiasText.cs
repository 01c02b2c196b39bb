using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Commands.Texts;

/// <summary>The operating point for the eye.</summary>
internal static class BiasText
{
    public static string Of(string title, BiasReading bias)
    {
        var sheet = new Sheet();
        sheet.Line(title);
        sheet.Row("travel", $"{Say.Quantity(bias.Setting.TravelPercent, Unit.None)} %");
        ReadingText.Socket(sheet, bias.Setting);
        foreach (DeviceBias device in bias.Devices)
        {
            sheet.Gap();
            sheet.Line($"{device.Name}: {device.Type}{(device.Saturated ? ", saturated" : "")}");
            sheet.Row("collector current", Say.Quantity(device.CollectorAmpere, Unit.Ampere));
            sheet.Row("base current", Say.Quantity(device.BaseAmpere, Unit.Ampere));
            sheet.Row("base to emitter", Say.Quantity(device.BaseEmitterVolt, Unit.Volt));
            sheet.Row("collector to emitter", Say.Quantity(device.CollectorEmitterVolt, Unit.Volt));
            sheet.Row("transconductance", Say.Quantity(device.TransconductanceSiemens, Unit.Siemens));
            sheet.Row("current gain", Say.Quantity(device.CurrentGain, Unit.None));
            sheet.Row("dissipation", Say.Quantity(device.DissipationWatt, Unit.Watt));
        }

        foreach (DiodeBias diode in bias.Diodes)
        {
            sheet.Gap();
            sheet.Line($"{diode.Name}: {diode.Type}");
            sheet.Row("forward current", Say.Quantity(diode.ForwardAmpere, Unit.Ampere));
            sheet.Row("anode to cathode", Say.Quantity(diode.ForwardVolt, Unit.Volt));
            sheet.Row("junction resistance", Say.Quantity(diode.JunctionOhm, Unit.Ohm));
            sheet.Row("junction capacitance", Say.Quantity(diode.JunctionFarad, Unit.Farad));
        }

        if (bias.NodeVolts.Count > 0)
        {
            sheet.Gap();
            sheet.Table(
                ["node", "to earth"],
                [.. bias.NodeVolts.Select(n => new[] { Printable.Fit(n.Node, 40), Say.Quantity(n.Volt, Unit.Volt) })],
                wordsFirst: true);
        }

        sheet.Gap();
        sheet.RowIf("from the supply", bias.SupplyAmpere is { } ampere ? Say.Quantity(ampere, Unit.Ampere) : null);
        sheet.Row("left over at a node", Say.Quantity(bias.ResidualAmpere, Unit.Ampere, 2));
        return sheet.Cautions(bias.Cautions).ToString();
    }
}
