using RegenTrainer.Session;

namespace RegenTrainer.Drawing;

/// <summary>What stands on every page: the head with the bar of pages, the regime in words, the strip.</summary>
internal static class BenchFrame
{
    /// <summary>The smallest screen a page is drawn on.</summary>
    public const int LeastWidth = 80;

    /// <summary>The smallest screen a page is drawn on.</summary>
    public const int LeastHeight = 24;

    /// <summary>Rows at the foot: regime, rule and the strip.</summary>
    private const int FootRows = 2 + RegenerationStrip.Rows;

    private const int Margin = 1;

    /// <summary>Whether a screen is large enough.</summary>
    public static bool Fits(int width, int height) => width >= LeastWidth && height >= LeastHeight;

    /// <summary>The region between head and foot, which belongs to the open page.</summary>
    public static Region Middle(int width, int height) =>
        new(Margin, PageHead.Rows + 1, width - (2 * Margin), height - PageHead.Rows - 2 - FootRows);

    /// <summary>The first row of the strip.</summary>
    public static int StripTop(int height) => height - RegenerationStrip.Rows;

    /// <summary>Says that the screen is too small.</summary>
    public static void DrawTooSmall(Canvas canvas) =>
        canvas.Put(0, canvas.Height / 2, $"needs {LeastWidth}x{LeastHeight}, has {canvas.Width}x{canvas.Height}", Ink.Text);

    /// <summary>Draws head and foot.</summary>
    public static void Draw(Canvas canvas, StageSnapshot stage, IReadOnlyList<PageTab> pages, BenchWords words)
    {
        PageHead.Title(canvas, stage, words.Changed);
        PageHead.Pages(canvas, pages, words.Pinned);
        int foot = canvas.Height - FootRows;
        RegimeLine.Draw(canvas, foot, stage, words.Notice);
        canvas.RuleAcross(foot + 1);
        RegenerationStrip.Draw(canvas, foot + 2, stage);
    }
}

/// <summary>A page in the bar.</summary>
/// <param name="Digit">The digit that opens it.</param>
/// <param name="Name">Its name.</param>
/// <param name="Open">Whether it is open.</param>
internal readonly record struct PageTab(char Digit, string Name, bool Open)
{
    /// <summary>The tab as it stands in the bar, its mark aside.</summary>
    public string Text => $"{Digit} {Name}";
}

/// <summary>What the bench has to say beside the stage.</summary>
/// <param name="Changed">Whether there are unsaved edits.</param>
/// <param name="Pinned">What is pinned, in words; empty where nothing is.</param>
/// <param name="Notice">The last thing worth telling; empty where there is none.</param>
internal readonly record struct BenchWords(bool Changed, string Pinned, string Notice);
