using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>The one line that says in words what the stage does and what to beware of.</summary>
internal static class RegimeLine
{
    /// <summary>The caution that the words of the regime say themselves.</summary>
    private const string OscillatingCode = "oscillating";

    /// <summary>Draws it; what a key could not do or the bench has to tell goes before the cautions of the stage.</summary>
    public static void Draw(Canvas canvas, int row, StageSnapshot stage, string notice)
    {
        Reading reading = stage.Reading;
        Ink ink = reading.Regime is { } regime ? Figures.InkOf(regime) : Ink.Caution;
        int column = canvas.Put(1, row, Words(reading), ink == Ink.Idle ? Ink.Text : ink);
        string more = stage.Notice.Length > 0 ? stage.Notice : notice.Length > 0 ? notice : Cautions(reading);
        if (more.Length > 0)
        {
            column = canvas.Put(column, row, ". ", Ink.Label);
            canvas.Put(column, row, more, Ink.Caution, canvas.Width - 1);
        }
    }

    private static string Words(Reading reading) => reading switch
    {
        { Reachable: false } => "out of reach",
        { Regime: null, TankHz: null } => "no figures",
        { Regime: Regime.Damped } => "damped: the device takes more than it gives",
        { Regime: Regime.Idle } => "idle: the device hardly helps yet",
        { Regime: Regime.Working } => "working",
        { Regime: Regime.Edge } => "edge: less than 1 dB to tip-over",
        { Regime: Regime.Oscillating } => "oscillating: it radiates; turn the control back",
        _ => "regime not known",
    };

    /// <summary>The most urgent caution, and how many more there are.</summary>
    private static string Cautions(Reading reading)
    {
        Caution[] cautions =
        [
            .. reading.Cautions.Where(c => c.Code != OscillatingCode).OrderBy(c => c.Code.StartsWith("parasitic", StringComparison.Ordinal) ? 0 : 1),
        ];
        return cautions.Length switch
        {
            0 => "",
            1 => cautions[0].Text,
            _ => $"(1 of {cautions.Length}) {cautions[0].Text}",
        };
    }
}
