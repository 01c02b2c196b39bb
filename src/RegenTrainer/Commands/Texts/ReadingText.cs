using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Commands.Texts;

/// <summary>A reading for the eye.</summary>
internal static class ReadingText
{
    /// <summary>Stray modes that ring less than this Q are not listed; those that grow always are.</summary>
    private const double RingingQ = 1;

    public static string Of(string title, Reading reading)
    {
        var sheet = new Sheet();
        Head(sheet, title, reading.Setting);
        sheet.Row("travel", Say.Place(reading.Setting.TravelPercent, reading.ControlDegrees, reading.ControlValue, reading.ControlUnit));
        sheet.Gap();
        Regeneration(sheet, reading);
        sheet.Gap();
        sheet.Row("tuning capacitor", Say.Quantity(reading.TuningFarad, Unit.Farad));
        sheet.Row("tank", Say.Quantity(reading.TankHz, Unit.Hertz, 7));
        sheet.Row("pulled", Say.SignedHertz(reading.PulledHz));
        sheet.Row("stage gain", Say.Level(reading.StageGainDb));
        sheet.Row("bandwidth -3 dB", Width(reading));
        sheet.Row("ring time", Say.Quantity(reading.RingTimeSeconds, Unit.Second));
        sheet.Row("hand, 0.1 pF, shifts", Say.SignedHertz(reading.HandShiftHz));
        Selectivity(sheet, reading);
        Strays(sheet, reading);
        return sheet.Cautions(reading.Cautions).ToString();
    }

    public static void Head(Sheet sheet, string title, SettingInForce setting)
    {
        sheet.Line(title);
        sheet.Row("dial", $"{Say.Quantity(setting.DialHz, Unit.Hertz, 7)}, {(setting.DialMode == DialMode.Locked ? "locked" : "follows")}");
        sheet.Row("station", Say.Quantity(setting.StationHz, Unit.Hertz, 7));
        Socket(sheet, setting);
    }

    public static void Socket(Sheet sheet, SettingInForce setting)
    {
        sheet.RowIf("device", setting.Device is { } device ? $"{device}, {setting.Grade.ToString().ToLowerInvariant()}" : null);
        sheet.RowIf("supply", setting.SupplyVolt is { } volt ? Say.Quantity(volt, Unit.Volt) : null);
        sheet.Row("temperature", Say.Quantity(setting.TemperatureCelsius, Unit.Celsius));
    }

    public static void Selectivity(Sheet sheet, Reading reading)
    {
        if (reading.Sidebands.Count > 0)
        {
            sheet.Gap();
            sheet.Table(["audio", "lower", "upper", "heard"], [.. reading.Sidebands.Select(Band)], wordsFirst: false);
        }

        if (reading.SpeechIndex is { } index)
        {
            sheet.Gap();
            sheet.Row("speech index", Say.Fixed(index, 3));
            sheet.Row("audio 3, 6, 10 dB down", string.Join(", ", Down(reading.AudioDownHz)));
        }
    }

    private static void Regeneration(Sheet sheet, Reading reading)
    {
        sheet.Row("regime", reading.Regime is { } regime ? Say.Regime(regime) : Say.None);
        sheet.Row("effective Q", Say.Quantity(reading.EffectiveQ, Unit.None));
        sheet.Row("regeneration off", Say.Quantity(reading.QRegenerationOff, Unit.None));
        sheet.Row("at the idle stop", Say.Quantity(reading.QAtIdleStop, Unit.None));
        TipsOver(sheet, reading);
        string left = reading.MarginPercent is { } percent
            ? $"{Say.Quantity(percent, Unit.Percent, 3)}, {Say.Quantity(reading.MarginDegrees, Unit.Degree, 3)}, "
            : "";
        sheet.RowIf("left", left.Length > 0 || reading.MarginDb is not null ? left + Gap(reading.MarginDb) : null);
        sheet.RowIf("device margin", reading.DeviceMarginDb is { } db ? DeviceMargin(db) : null);
    }

    private static string Gap(double? db) => db is { } v ? Say.Quantity(v, Unit.Decibel, 3) : "no loop gain yet";

    private static string DeviceMargin(double db) =>
        db >= 0 ? $"a device {Say.Fixed(db, 2)} dB stronger tips it over here" : $"a device {Say.Fixed(-db, 2)} dB weaker stops it here";

    private static void TipsOver(Sheet sheet, Reading reading)
    {
        switch (reading.TipOver?.State)
        {
            case null:
                break;
            case TipOverState.Never:
                sheet.Row("tips over", "never along the travel");
                break;
            case TipOverState.Always:
                sheet.Row("tips over", "oscillates along the whole travel");
                break;
            default:
                foreach (Crossing crossing in reading.TipOver.Crossings)
                {
                    sheet.Row(
                        crossing.Upward ? "tips over at" : "falls back at",
                        Say.Place(crossing.TravelPercent, crossing.Degrees, crossing.Value, reading.ControlUnit));
                }

                break;
        }
    }

    private static string Width(Reading reading)
    {
        string width = Say.Quantity(reading.BandwidthHz, Unit.Hertz);
        return reading.BandwidthDialDegrees is { } degrees ? $"{width}, {Say.Quantity(degrees, Unit.Degree, 3)} of the dial" : width;
    }

    private static string[] Band(Sideband band) =>
        [Say.Quantity(band.AudioHz, Unit.Hertz), Say.Level(band.LowerDb), Say.Level(band.UpperDb), Say.Level(band.AudioDb)];

    private static string[] Down((double? Db3, double? Db6, double? Db10) down) =>
        [Say.Quantity(down.Db3, Unit.Hertz), Say.Quantity(down.Db6, Unit.Hertz), Say.Quantity(down.Db10, Unit.Hertz)];

    private static void Strays(Sheet sheet, Reading reading)
    {
        StrayMode[] ringing = [.. reading.StrayModes.Where(Rings)];
        if (ringing.Length == 0)
        {
            return;
        }

        sheet.Gap();
        sheet.Table(
            ["stray mode", "decays to 1/e in", ""],
            [.. ringing.Select(m => new[]
            {
                Say.Quantity(m.FrequencyHz, Unit.Hertz),
                m.Grows ? Say.None : Say.Quantity(1 / m.DecayPerSecond, Unit.Second),
                m.Grows ? "grows: a parasitic oscillation" : "",
            })],
            wordsFirst: false);
    }

    private static bool Rings(StrayMode mode) => mode.Grows || Math.PI * mode.FrequencyHz > RingingQ * mode.DecayPerSecond;
}
