using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>The opening page: the stage now.</summary>
internal static class StagePage
{
    /// <summary>The smallest screen a page is drawn on.</summary>
    public const int LeastWidth = 80;

    /// <summary>The smallest screen a page is drawn on.</summary>
    public const int LeastHeight = 24;

    /// <summary>Rows at the foot: regime, rule and the strip.</summary>
    private const int FootRows = 2 + RegenerationStrip.Rows;

    private const int Margin = 1;

    /// <summary>Draws a whole screen.</summary>
    /// <param name="stage">What to show.</param>
    /// <param name="width">Columns, 0 or more.</param>
    /// <param name="height">Rows, 0 or more.</param>
    /// <param name="glyphs">The characters to draw with.</param>
    /// <param name="keysOpen">Whether the keys stand in place of the page.</param>
    public static Canvas Draw(StageSnapshot stage, int width, int height, Glyphs glyphs, bool keysOpen)
    {
        var canvas = new Canvas(width, height, glyphs);
        if (width < LeastWidth || height < LeastHeight)
        {
            canvas.Put(0, height / 2, $"needs {LeastWidth}x{LeastHeight}, has {width}x{height}", Ink.Text);
            return canvas;
        }

        PageHead.Title(canvas, stage);
        PageHead.Pages(canvas);
        Region middle = Middle(width, height);
        if (keysOpen)
        {
            KeyList.Draw(canvas, middle);
        }
        else
        {
            ResponsePlot.Draw(canvas, Plot(width, height), stage);
            int readouts = ReadoutWidth(width);
            ReadoutColumn.Draw(canvas, middle with { Left = middle.Right - readouts, Width = readouts }, stage.Reading);
        }

        int foot = height - FootRows;
        RegimeLine.Draw(canvas, foot, stage);
        canvas.RuleAcross(foot + 1);
        RegenerationStrip.Draw(canvas, foot + 2, stage);
        return canvas;
    }

    /// <summary>Points of the response a screen of this size can show.</summary>
    public static int PointsFor(int width, int height, Glyphs glyphs) => ResponsePlot.PointsFor(Plot(width, height), glyphs);

    /// <summary>The first row of the strip.</summary>
    public static int StripTop(int height) => height - RegenerationStrip.Rows;

    private static Region Middle(int width, int height) =>
        new(Margin, PageHead.Rows + 1, width - (2 * Margin), height - PageHead.Rows - 2 - FootRows);

    private static Region Plot(int width, int height)
    {
        Region middle = Middle(width, height);
        int room = middle.Width - ReadoutWidth(width) - Gap(width);
        return middle with { Width = ResponsePlot.EvenWidth(room) };
    }

    private static int ReadoutWidth(int width) => width < 100 ? 28 : 32;

    private static int Gap(int width) => width < 100 ? 2 : 4;
}
