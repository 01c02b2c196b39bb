using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;

namespace RegenTrainer.Commands.Texts;

/// <summary>The operating point for the eye.</summary>
internal static class BiasText
{
    public static string Of(string title, BiasReading bias, HeadroomReading headroom)
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

        Headroom(sheet, headroom);

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
        if (bias.Battery is { } battery)
        {
            sheet.Row("fresh and tired supply", $"{Drawn(battery.FreshVolt, battery.FreshAmpere)}, {Drawn(battery.TiredVolt, battery.TiredAmpere)}");
            sheet.RowIf("the battery lasts", battery.LifeSeconds is { } life ? $"{Say.Fixed(life / 3600, 0)} h" : null);
        }

        sheet.Row("left over at a node", Say.Quantity(bias.ResidualAmpere, Unit.Ampere, 2));
        Drift(sheet, bias);
        return sheet.Cautions([.. bias.Cautions, .. headroom.Cautions]).ToString();
    }

    private static string Drawn(double volt, double ampere) => $"{Say.Quantity(ampere, Unit.Ampere)} at {Say.Quantity(volt, Unit.Volt)}";

    /// <summary>The drive at each limit that is reached, the first one marked by its word.</summary>
    private static void Headroom(Sheet sheet, HeadroomReading headroom)
    {
        var rows = new List<string[]>();
        foreach (DeviceHeadroom device in headroom.Devices)
        {
            Add(device.Name, DeviceLimit.CutOff, "cut off", device.CutOff);
            Add(device.Name, DeviceLimit.Saturation, "saturated", device.Saturation);
        }

        if (rows.Count > 0)
        {
            sheet.Gap();
            sheet.Table(["peak drive until", "antenna EMF", "tank", "output", ""], rows, wordsFirst: true);
        }

        void Add(string name, DeviceLimit limit, string word, LimitLevel? level)
        {
            if (level is { } l)
            {
                bool first = headroom.First is { } f && f.Device == name && f.Limit == limit;
                rows.Add(
                [
                    $"{Printable.Fit(name, 16)} {word}",
                    Say.Quantity(l.AntennaVolt, Unit.Volt, 3),
                    Say.Quantity(l.TankVolt, Unit.Volt, 3),
                    Say.Quantity(l.OutputVolt, Unit.Volt, 3),
                    first ? "first" : "",
                ]);
            }
        }
    }

    private static void Drift(Sheet sheet, BiasReading bias)
    {
        if (bias.PerKelvin is null && bias.PerTenthVolt is null)
        {
            return;
        }

        sheet.Gap();
        sheet.Table(
            ["nothing touched", "collector", "tip-over", "effective Q", "tank"],
            [Row("1 K warmer", bias.PerKelvin), Row("0.1 V more supply", bias.PerTenthVolt)],
            wordsFirst: true);
    }

    private static string[] Row(string step, BiasDrift? drift) =>
    [
        step,
        drift?.CollectorAmpere is { } ampere ? Signed(ampere, Unit.Ampere) : Say.None,
        drift?.TipOverPercent is { } percent ? Say.Signed(percent, "0.000") + " %" : Say.None,
        drift?.EffectiveQ is { } q ? Signed(q, Unit.None) : Say.None,
        drift?.TankHz is { } hz ? Signed(hz, Unit.Hertz) : Say.None,
    ];

    private static string Signed(double value, Unit unit) => (value > 0 ? "+" : "") + Say.Quantity(value, unit, 3);
}
