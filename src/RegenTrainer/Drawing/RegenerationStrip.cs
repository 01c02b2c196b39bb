using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>The control's travel from stop to stop, to scale: what the stage does where, where it tips over, where the control stands.</summary>
internal static class RegenerationStrip
{
    /// <summary>Rows of the strip: bar, marker, figures.</summary>
    public const int Rows = 3;

    /// <summary>A word stands in its stretch when so many columns beside it are left.</summary>
    private const int FillBesideWord = 2;

    public static void Draw(Canvas canvas, int top, StageSnapshot stage)
    {
        if (stage.Control is null)
        {
            canvas.Put(1, top, "this stage has no regeneration control", Ink.Text);
            return;
        }

        Bar(canvas, top, stage);
        canvas.Set(ColumnOf(stage.Setting.TravelPercent, canvas.Width), top + 1, canvas.Glyphs.Marker, Ink.Marker);
        StripFigures.Draw(canvas, top + 2, stage);
    }

    /// <summary>The column of a travel; the stops are the first and the last.</summary>
    public static int ColumnOf(double travelPercent, int width) =>
        (int)Math.Round(travelPercent / 100 * (width - 1), MidpointRounding.AwayFromZero);

    /// <summary>The travel a column stands for, in %.</summary>
    public static double TravelAt(int column, int width) => width > 1 ? Math.Clamp(100.0 * column / (width - 1), 0, 100) : 0;

    private static void Bar(Canvas canvas, int row, StageSnapshot stage)
    {
        if (stage.Regimes.Count == 0)
        {
            for (int column = 0; column < canvas.Width; column++)
            {
                canvas.Set(column, row, canvas.Glyphs.Rule, Ink.Label);
            }
        }

        foreach (RegimeSpan span in stage.Regimes)
        {
            (int from, int to) = (ColumnOf(span.FromPercent, canvas.Width), ColumnOf(span.ToPercent, canvas.Width));
            for (int column = from; column <= to; column++)
            {
                canvas.Set(column, row, canvas.Glyphs.Of(span.Regime), Figures.InkOf(span.Regime));
            }
        }

        foreach (RegimeSpan span in stage.Regimes)
        {
            string word = " " + Figures.Word(span.Regime) + " ";
            (int from, int to) = (ColumnOf(span.FromPercent, canvas.Width), ColumnOf(span.ToPercent, canvas.Width));
            int start = from == 0 ? 0 : from + 1;
            if (to - start >= word.Length + FillBesideWord)
            {
                canvas.Put(start, row, word, Figures.InkOf(span.Regime) is var ink && ink == Ink.Idle ? Ink.Text : ink);
            }
        }

        foreach (Crossing crossing in stage.Reading.TipOver?.Crossings ?? [])
        {
            canvas.Set(ColumnOf(crossing.TravelPercent, canvas.Width), row, canvas.Glyphs.TipOver, Ink.Oscillating);
        }
    }
}
