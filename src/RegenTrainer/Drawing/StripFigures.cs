using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>The line under the strip: where the control stands, where the stage tips over, what is left.</summary>
internal static class StripFigures
{
    private const string Percent = "0.00";
    private const int LeastGap = 2;

    /// <summary>Narrower screens have the short form, whatever the figures, so that it does not change to and fro.</summary>
    private const int FullFrom = 100;

    /// <summary>Columns kept for the outer figures at their longest, so that what stands between them stays in place.</summary>
    private const int AtRoom = 27;

    /// <inheritdoc cref="AtRoom"/>
    private const int LeftRoom = 33;

    public static void Draw(Canvas canvas, int row, StageSnapshot stage)
    {
        (string at, string tips, string left) = (At(stage, full: true), Tips(stage, full: true), Left(stage, full: true));
        int middle = AtRoom + ((canvas.Width - AtRoom - LeftRoom - canvas.WidthOf(tips)) / 2);
        int afterAt = 1 + canvas.WidthOf(at) + LeastGap, beforeLeft = canvas.Width - 1 - canvas.WidthOf(left) - LeastGap;
        if (canvas.Width >= FullFrom && middle >= afterAt && middle + canvas.WidthOf(tips) <= beforeLeft)
        {
            canvas.Put(1, row, at, Ink.Text);
            canvas.Put(middle, row, tips, Ink.Text);
            canvas.PutBefore(canvas.Width - 1, row, left, Ink.Text);
            return;
        }

        string[] parts = [At(stage, full: false), Tips(stage, full: false), Left(stage, full: false)];
        int column = 1;
        foreach (string part in parts.Where(part => part.Length > 0))
        {
            column = column == 1 ? column : canvas.Put(column, row, " | ", Ink.Label, canvas.Width);
            column = canvas.Put(column, row, part, Ink.Text, canvas.Width);
        }
    }

    private static string At(StageSnapshot stage, bool full) =>
        Place(full ? "at " : "", stage.Setting.TravelPercent, stage.Reading.ControlDegrees, stage.Reading.ControlValue, stage, full);

    private static string Tips(StageSnapshot stage, bool full)
    {
        if (stage.Reading.TipOver is not { } tipOver)
        {
            return stage.Reading.Reachable ? "tip-over not known here" : "dial out of the capacitor's reach";
        }

        switch (tipOver.State)
        {
            case TipOverState.Never:
                return full ? "never tips over along the travel" : "never tips over";
            case TipOverState.Always:
                return full ? "oscillates along the whole travel" : "always oscillates";
            case TipOverState.Once when tipOver.First is { } first:
                return Place(full ? "tips over at " : "tips ", first.TravelPercent, first.Degrees, first.Value, stage, full);
            default:
                string[] places =
                [
                    .. tipOver.Crossings.Select(c => (c.Upward ? full ? "tips over at " : "tips " : full ? "stops at " : "stops ")
                        + Figures.Fixed(c.TravelPercent, full ? Percent : "0.0") + " %"),
                ];
                return string.Join(full ? ", " : " ", places);
        }
    }

    private static string Left(StageSnapshot stage, bool full)
    {
        Reading reading = stage.Reading;
        string db = reading.MarginDb is { } margin ? Figures.Fixed(margin, "0.00") + " dB" : "";
        if (reading.MarginPercent is { } percent && reading.GrowthPerSecond is not > 0)
        {
            string degrees = reading.MarginDegrees is { } angle ? Figures.Fixed(angle, "0.0") + "\u00b0" : "";
            string[] parts = full ? [Figures.Fixed(percent, Percent) + " %", degrees, db] : [Figures.Fixed(percent, Percent) + " %", db];
            return "left " + string.Join(full ? " \u00b7 " : " ", parts.Where(part => part.Length > 0));
        }

        if (reading.GrowthPerSecond is > 0)
        {
            // How far the control must come back is what a builder wants to know here.
            double? tipped = reading.TipOver?.Crossings.LastOrDefault(c => c.Upward && c.TravelPercent <= stage.Setting.TravelPercent).TravelPercent;
            return tipped is > 0 and var there ? $"past by {Figures.Fixed(stage.Setting.TravelPercent - there, Percent)} %" : "";
        }

        return db.Length > 0 ? "left " + db : "";
    }

    private static string Place(string lead, double percent, double? degrees, double? value, StageSnapshot stage, bool full)
    {
        string?[] parts =
        [
            Figures.Fixed(percent, Percent) + " %",
            full && degrees is { } angle ? Figures.Fixed(angle, "0") + "\u00b0" : null,
            value is { } v ? Figures.ControlValue(v, stage.Reading.ControlUnit) : null,
        ];
        return lead + string.Join(full ? " \u00b7 " : " ", parts.Where(part => part is not null));
    }
}
