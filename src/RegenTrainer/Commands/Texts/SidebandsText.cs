using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;

namespace RegenTrainer.Commands.Texts;

/// <summary>What the selectivity leaves of a programme, for the eye.</summary>
internal static class SidebandsText
{
    /// <summary>A station nearer to the tank than this many hertz stands on tune.</summary>
    private const double OnTuneHz = 0.5;

    public static string Of(
        string title,
        Reading reading,
        Interaction interaction,
        IReadOnlyList<Neighbour> neighbours,
        IReadOnlyList<ResponsePoint> response)
    {
        var sheet = new Sheet();
        ReadingText.Head(sheet, title, reading.Setting);
        sheet.Row("travel", Say.Place(reading.Setting.TravelPercent, reading.ControlDegrees, reading.ControlValue, reading.ControlUnit));
        sheet.Gap();
        sheet.Row("regime", reading.Regime is { } regime ? Say.Regime(regime) : Say.None);
        sheet.Row("effective Q", Say.Quantity(reading.EffectiveQ, Unit.None));
        sheet.Row("bandwidth -3 dB", Say.Quantity(reading.BandwidthHz, Unit.Hertz));
        sheet.Row("stage gain", Say.Level(reading.StageGainDb));
        ReadingText.Selectivity(sheet, reading);
        Station(sheet, interaction.Station);
        Tuning(sheet, interaction);
        if (neighbours.Count > 0)
        {
            sheet.Gap();
            sheet.Table(
                ["neighbour", "heard"],
                [.. neighbours.Select(n => new[] { Say.SignedHertz(n.OffsetHz), Say.Level(n.RelativeDb) })],
                wordsFirst: false);
        }

        Response(sheet, reading.Setting.StationHz, response);
        return sheet.Cautions(reading.Cautions).ToString();
    }

    /// <summary>What the station's place in the response does; nothing where it stands on tune.</summary>
    private static void Station(Sheet sheet, StationFit? station)
    {
        if (station is null || Math.Abs(station.OffsetHz) < OnTuneHz)
        {
            return;
        }

        sheet.Gap();
        sheet.Row("station off tune by", Say.SignedHertz(station.OffsetHz));
        sheet.Row("its carrier", Say.Level(station.CarrierLossDb));
        sheet.Table(
            ["audio", "upper against lower", "second harmonic"],
            [.. station.Audio.Select(a => new[]
            {
                Say.Quantity(a.AudioHz, Unit.Hertz), Say.Level(a.AsymmetryDb), Say.Fixed(a.SecondHarmonicPercent, 1) + " %",
            })],
            wordsFirst: false);
    }

    private static void Tuning(Sheet sheet, Interaction interaction)
    {
        sheet.Gap();
        if (interaction.Approach is { } approach)
        {
            string from = approach.FromStop ? "the idle stop" : Say.Fixed(approach.FromPercent, 2) + " %";
            string shaft = approach.RepeakDegrees is { } degrees ? $", {Say.Quantity(degrees, Unit.Degree, 3)} of the dial" : "";
            sheet.Row("travel up to tip-over", $"{from} to {Say.Fixed(approach.ToPercent, 2)} %");
            sheet.Row("pulls the tank by", Say.SignedHertz(approach.PullHz));
            sheet.Row("peaking again takes", $"{Say.Quantity(approach.RepeakFarad, Unit.Farad, 3)}{shaft}");
        }

        sheet.RowIf("bandwidth on the dial", interaction.BandwidthDialDegrees is { } b ? Say.Quantity(b, Unit.Degree, 3) : null);
        sheet.RowIf("vernier wanted", interaction.VernierRatio is { } ratio ? ratio > 1 ? $"{Say.Quantity(ratio, Unit.None, 3)} : 1" : "none" : null);
        sheet.RowIf("hand, 0.1 pF, shifts", interaction.HandShiftHz is { } shift ? Say.SignedHertz(shift) : null);
    }

    /// <summary>Every tenth point of the response: what fits a screen.</summary>
    private static void Response(Sheet sheet, double stationHz, IReadOnlyList<ResponsePoint> response)
    {
        if (response.Count == 0)
        {
            return;
        }

        sheet.Gap();
        sheet.Table(
            ["from station", "gain", "phase"],
            [.. response.Where((_, k) => k % 10 == 0).Select(p => new[]
            {
                Say.SignedHertz(p.FrequencyHz - stationHz), Say.Level(p.GainDb), Say.Fixed(p.PhaseDegrees, 1) + "°",
            })],
            wordsFirst: false);
    }
}
