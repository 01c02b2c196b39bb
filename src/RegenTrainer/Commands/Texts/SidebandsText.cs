using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;

namespace RegenTrainer.Commands.Texts;

/// <summary>What the selectivity leaves of a programme, for the eye.</summary>
internal static class SidebandsText
{
    public static string Of(
        string title, Reading reading, IReadOnlyList<Neighbour> neighbours, IReadOnlyList<ResponsePoint> response)
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
