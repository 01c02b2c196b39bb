using System.Globalization;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Drawing;

/// <summary>A screen of cells that drawing functions write on. Nothing can be written outside of it.</summary>
internal sealed class Canvas
{
    private static readonly DrawnCell _blank = new(" ", Ink.Text);
    private readonly DrawnCell[] _cells;

    public Canvas(int width, int height, Glyphs glyphs)
    {
        (Width, Height, Glyphs) = (width, height, glyphs);
        _cells = new DrawnCell[width * height];
        Array.Fill(_cells, _blank);
    }

    public int Width { get; }

    public int Height { get; }

    public Glyphs Glyphs { get; }

    public DrawnCell this[int column, int row] => _cells[(row * Width) + column];

    /// <summary>Columns a text takes as it will be spelled.</summary>
    public int WidthOf(string text) => Printable.Width(Glyphs.Spell(text));

    /// <summary>Writes one cell with a glyph of width one; outside of the screen nothing happens.</summary>
    public void Set(int column, int row, string glyph, Ink ink)
    {
        if ((uint)column < (uint)Width && (uint)row < (uint)Height)
        {
            _cells[(row * Width) + column] = new DrawnCell(glyph, ink);
        }
    }

    /// <summary>Writes a text made printable, cut to the columns up to <paramref name="end"/>.</summary>
    /// <returns>The column after it.</returns>
    public int Put(int column, int row, string text, Ink ink, int end = int.MaxValue)
    {
        int room = Math.Min(end, Width) - column;
        if (room <= 0 || (uint)row >= (uint)Height || column < 0)
        {
            return column;
        }

        string shown = Glyphs.Spell(Printable.Fit(Glyphs.Spell(text), room));
        for (int at = 0, length; at < shown.Length; at += length)
        {
            length = StringInfo.GetNextTextElementLength(shown, at);
            string grapheme = shown.Substring(at, length);
            int columns = length == 1 && char.IsAscii(grapheme[0]) ? 1 : Printable.Width(grapheme);
            if (columns == 0)
            {
                continue;
            }

            Set(column, row, grapheme, ink);
            for (int k = 1; k < columns; k++)
            {
                Set(column + k, row, "", ink);
            }

            column += columns;
        }

        return column;
    }

    /// <summary>Writes a text that ends before a column.</summary>
    public void PutBefore(int end, int row, string text, Ink ink) => Put(Math.Max(0, end - WidthOf(text)), row, text, ink, end);

    /// <summary>Draws a rule along a row.</summary>
    public void RuleAcross(int row)
    {
        for (int column = 0; column < Width; column++)
        {
            Set(column, row, Glyphs.Rule, Ink.Label);
        }
    }

    /// <summary>Writes a text in lines of whole words; where the rows do not suffice the last ends in an ellipsis.</summary>
    /// <returns>The row after the last.</returns>
    public int PutWrapped(Region region, string text, Ink ink)
    {
        int row = region.Top;
        string line = "";
        foreach (string word in Printable.Text(text).Split(' '))
        {
            string longer = line.Length == 0 ? word : line + " " + word;
            if (line.Length > 0 && WidthOf(longer) > region.Width && row + 1 < region.Bottom)
            {
                Put(region.Left, row++, line, ink, region.Right);
                longer = word;
            }

            line = longer;
        }

        if (row < region.Bottom)
        {
            Put(region.Left, row++, line, ink, region.Right);
        }

        return row;
    }

    /// <summary>The rows as text, without blanks at their ends.</summary>
    public IReadOnlyList<string> Rows()
    {
        string[] rows = new string[Height];
        for (int row = 0; row < Height; row++)
        {
            rows[row] = string.Concat(_cells.Skip(row * Width).Take(Width).Select(cell => cell.Grapheme)).TrimEnd();
        }

        return rows;
    }
}
