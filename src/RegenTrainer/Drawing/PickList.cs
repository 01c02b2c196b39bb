namespace RegenTrainer.Drawing;

/// <summary>A list to pick from, longer perhaps than what is seen of it.</summary>
internal static class PickList
{
    /// <summary>Columns before the text of an entry: the mark of the selected one.</summary>
    public const int MarkWidth = 2;

    /// <summary>The first entry to be seen, so that the selected one is.</summary>
    public static int Top(int top, int selected, int count, int rows) =>
        Math.Clamp(Math.Clamp(top, selected - rows + 1, selected), 0, Math.Max(0, count - rows));

    /// <summary>The entry in a row of the list; null where there is none.</summary>
    public static int? At(Region region, int top, int count, int column, int row)
    {
        int index = top + row - region.Top;
        return column >= region.Left && column < region.Right && row >= region.Top && row < region.Bottom && index < count ? index : null;
    }

    /// <summary>Draws the entries from <paramref name="top"/> on.</summary>
    public static void Draw(Canvas canvas, Region region, IReadOnlyList<string> entries, int selected, int top)
    {
        for (int k = 0; k < region.Height && top + k < entries.Count; k++)
        {
            bool chosen = top + k == selected;
            Mark(canvas, region, k, chosen);
            canvas.Put(region.Left + MarkWidth, region.Top + k, entries[top + k], chosen ? Ink.Heading : Ink.Text, region.Right);
        }
    }

    /// <summary>Marks the selected row.</summary>
    public static void Mark(Canvas canvas, Region region, int row, bool chosen)
    {
        if (chosen)
        {
            canvas.Set(region.Left, region.Top + row, canvas.Glyphs.OpenPage, Ink.Marker);
        }
    }
}
