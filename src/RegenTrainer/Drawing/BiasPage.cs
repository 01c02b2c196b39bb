using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>What page 8 shows.</summary>
/// <param name="Answer">The operating point; null while the first is on its way.</param>
/// <param name="Working">Whether a newer one is on its way.</param>
/// <param name="Pinned">That of what is pinned; null where nothing is.</param>
/// <param name="Nodes">Whether the voltages of the nodes stand in place of supply and drift.</param>
internal sealed record BiasPicture(BiasAnswer? Answer, bool Working, BiasAnswer? Pinned, bool Nodes);

/// <summary>Page 8: the operating point, how far it can be driven, what the battery gives, and what changes by itself.</summary>
internal static class BiasPage
{
    private const int RightWidth = 37;
    private const int Gap = 2;
    private const int LabelWidth = 11;
    private const int ColumnWidth = 9;

    private static readonly string[] _labels = ["type", "collector", "base", "V C-E", "V B-E", "slope", "gain", "power", "cut off at", "saturated"];

    /// <summary>Draws the page.</summary>
    public static void Draw(Canvas canvas, Region region, BiasPicture picture)
    {
        string more = picture.Working && picture.Answer is not null ? " ..." : "";
        canvas.Put(region.Left, region.Top, "operating point" + more, Ink.Label, region.Right);
        if (picture.Answer is not { } answer)
        {
            canvas.Put(region.Left, region.Top + 2, "working it out ...", Ink.Label, region.Right);
            return;
        }

        var left = new Region(region.Left, region.Top + 1, region.Width - RightWidth - Gap, region.Height - 1);
        var right = new Region(region.Right - RightWidth, region.Top, RightWidth, region.Height);
        if (answer.Bias.Devices.Count == 0)
        {
            string why = string.Join("; ", answer.Bias.Cautions.Select(c => c.Text));
            canvas.PutWrapped(left, why.Length > 0 ? why : "this stage has no device", Ink.Text);
        }
        else
        {
            Devices(canvas, left, answer, picture.Pinned);
        }

        if (picture.Nodes)
        {
            Nodes(canvas, right, answer.Bias);
        }
        else
        {
            Rest(canvas, right, answer, picture.Pinned);
        }
    }

    private static void Devices(Canvas canvas, Region region, BiasAnswer answer, BiasAnswer? pinned)
    {
        IReadOnlyList<DeviceBias> devices = answer.Bias.Devices;
        int column = region.Left + LabelWidth;
        bool first = true;
        Labels(canvas, region);
        Diodes(canvas, region, answer.Bias.Diodes);
        foreach (DeviceBias device in devices)
        {
            if (column + ColumnWidth > region.Right + 1)
            {
                canvas.Put(region.Right - 1, region.Top, "\u2026", Ink.Label);
                return;
            }

            Column(canvas, region, column, device.Name, Values(device, answer.Headroom), Ink.Text);
            column += ColumnWidth;
            bool room = first || column + (ColumnWidth * devices.Count) <= region.Right + 1;
            if (room && pinned?.Bias.Devices.FirstOrDefault(d => d.Name == device.Name) is { } then)
            {
                Column(canvas, region, column, "\u00b1 pinned", Differences(device, then), Ink.Pinned);
                column += ColumnWidth;
            }

            first = false;
        }
    }

    private static void Labels(Canvas canvas, Region region)
    {
        for (int k = 0; k < _labels.Length; k++)
        {
            canvas.Put(region.Left, region.Top + 1 + k, _labels[k], Ink.Label, region.Left + LabelWidth);
        }

        canvas.Put(region.Left, region.Top + 1 + _labels.Length, "(peak antenna EMF at the station)", Ink.Label, region.Right);
    }

    private static void Diodes(Canvas canvas, Region region, IReadOnlyList<DiodeBias> diodes)
    {
        int row = region.Top + _labels.Length + 2;
        foreach (DiodeBias diode in diodes.Take(Math.Max(0, region.Bottom - row)))
        {
            string figures = $"{Figures.Quantity(diode.JunctionOhm, Unit.Ohm)}, {Figures.Quantity(diode.JunctionFarad, Unit.Farad)}";
            canvas.Put(region.Left, row, Printable.Fit($"{diode.Name} {diode.Type}", 20), Ink.Label, region.Right);
            canvas.PutBefore(region.Right - 1, row++, figures, Ink.Text);
        }
    }

    private static void Column(Canvas canvas, Region region, int column, string head, string[] cells, Ink ink)
    {
        int end = column + ColumnWidth - 1;
        canvas.PutBefore(end, region.Top, Printable.Fit(head, ColumnWidth - 1), Ink.Label);
        for (int k = 0; k < cells.Length; k++)
        {
            canvas.PutBefore(end, region.Top + 1 + k, Printable.Fit(cells[k], ColumnWidth - 1), ink);
        }
    }

    private static string[] Values(DeviceBias device, HeadroomReading headroom)
    {
        DeviceHeadroom? room = headroom.Devices.FirstOrDefault(d => d.Name == device.Name);
        return
        [
            device.Type,
            Figures.Quantity(device.CollectorAmpere, Unit.Ampere),
            Figures.Quantity(device.BaseAmpere, Unit.Ampere),
            Figures.Quantity(device.CollectorEmitterVolt, Unit.Volt),
            Figures.Quantity(device.BaseEmitterVolt, Unit.Volt),
            Figures.Quantity(device.TransconductanceSiemens, Unit.Siemens),
            Figures.Fixed(device.CurrentGain, "0"),
            Figures.Quantity(device.DissipationWatt, Unit.Watt),
            Figures.Quantity(room?.CutOff?.AntennaVolt, Unit.Volt),
            device.Saturated ? "at rest" : Figures.Quantity(room?.Saturation?.AntennaVolt, Unit.Volt),
        ];
    }

    private static string[] Differences(DeviceBias now, DeviceBias then) =>
    [
        now.Type == then.Type ? "" : then.Type,
        Figures.Difference(now.CollectorAmpere - then.CollectorAmpere, Unit.Ampere),
        Figures.Difference(now.BaseAmpere - then.BaseAmpere, Unit.Ampere),
        Figures.Difference(now.CollectorEmitterVolt - then.CollectorEmitterVolt, Unit.Volt),
        Figures.Difference(now.BaseEmitterVolt - then.BaseEmitterVolt, Unit.Volt),
        Figures.Difference(now.TransconductanceSiemens - then.TransconductanceSiemens, Unit.Siemens),
        Figures.Signed(now.CurrentGain - then.CurrentGain, "0"),
        Figures.Difference(now.DissipationWatt - then.DissipationWatt, Unit.Watt),
    ];

    private static void Nodes(Canvas canvas, Region region, BiasReading bias)
    {
        canvas.Put(region.Left, region.Top, "nodes to earth (Tab: back)", Ink.Label, region.Right);
        int row = region.Top + 1;
        foreach ((string node, double volt) in bias.NodeVolts)
        {
            if (row == region.Bottom - 1 && bias.NodeVolts.Count > region.Height - 1)
            {
                canvas.Put(region.Left, row, $"and {bias.NodeVolts.Count - (row - region.Top - 1)} more: see the command bias", Ink.Label, region.Right);
                return;
            }

            canvas.Put(region.Left, row, Printable.Fit(node, region.Width - ColumnWidth), Ink.Label, region.Right);
            canvas.PutBefore(region.Right, row++, Figures.Quantity(volt, Unit.Volt), Ink.Text);
        }
    }

    private static void Rest(Canvas canvas, Region region, BiasAnswer answer, BiasAnswer? pinned)
    {
        int row = region.Top;
        if (answer.Headroom.First is { } first)
        {
            string limit = first.Limit == DeviceLimit.CutOff ? "cut off" : "saturated";
            Head($"first limit: {Printable.Fit(first.Device, 14)} {limit}");
            string levels = $"tank {Figures.Quantity(first.Level.TankVolt, Unit.Volt)}, output {Figures.Quantity(first.Level.OutputVolt, Unit.Volt)}";
            Line("  peak", levels);
        }
        else
        {
            Head("no limit known here");
            row++;
        }

        Line("supply current", Figures.Quantity(answer.Bias.SupplyAmpere, Unit.Ampere) + Against(answer.Bias.SupplyAmpere, pinned?.Bias.SupplyAmpere));
        if (answer.Bias.Battery is { } battery)
        {
            Line("  fresh " + Figures.Quantity(battery.FreshVolt, Unit.Volt), Figures.Quantity(battery.FreshAmpere, Unit.Ampere));
            Line("  tired " + Figures.Quantity(battery.TiredVolt, Unit.Volt), Figures.Quantity(battery.TiredAmpere, Unit.Ampere));
            Line("  lasts", battery.LifeSeconds is { } life ? Figures.Fixed(life / 3600, "0") + " h" : "set its capacity in Parts");
        }

        Head("nothing touched      1 K     0.1 V");
        Drift("  collector", d => d.CollectorAmpere, v => Figures.Difference(v, Unit.Ampere));
        Drift("  tips over", d => d.TipOverPercent, v => Figures.Signed(v, "0.000") + " %");
        Drift("  effective Q", d => d.EffectiveQ, v => Figures.Difference(v, Unit.None));
        Drift("  tank", d => d.TankHz, Figures.ShiftShort);
        foreach (Caution hint in answer.Bias.Cautions.Concat(answer.Headroom.Cautions).Concat(answer.Hints))
        {
            row = row < region.Bottom ? canvas.PutWrapped(region with { Top = row, Height = region.Bottom - row }, hint.Text, Ink.Caution) : row;
        }

        void Head(string text) => canvas.Put(region.Left, row++, text, Ink.Label, region.Right);
        void Line(string label, string figure)
        {
            canvas.Put(region.Left, row, label, Ink.Label, region.Right);
            canvas.PutBefore(region.Right, row++, figure, Ink.Text);
        }

        void Drift(string label, Func<BiasDrift, double?> value, Func<double, string> write)
        {
            canvas.Put(region.Left, row, label, Ink.Label, region.Right);
            Cell(region.Right - 11, answer.Bias.PerKelvin);
            Cell(region.Right, answer.Bias.PerTenthVolt);
            row++;
            void Cell(int end, BiasDrift? drift) =>
                canvas.PutBefore(end, row, drift is not null && value(drift) is { } v ? write(v) : Figures.None, Ink.Text);
        }
    }

    private static string Against(double? now, double? then) =>
        now is { } a && then is { } b ? $" ({Figures.Difference(a - b, Unit.Ampere)})" : "";
}
