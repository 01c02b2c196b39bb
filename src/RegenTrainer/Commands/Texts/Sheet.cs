using System.Text;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Commands.Texts;

/// <summary>Lays out an answer for reading: lines of label and value, tables and wrapped sentences, never wider than 80 columns.</summary>
internal sealed class Sheet
{
    /// <summary>Widest line.</summary>
    public const int Columns = 80;

    private const int LabelColumns = 26;

    private readonly StringBuilder _text = new();

    /// <summary>A line by itself.</summary>
    public Sheet Line(string text)
    {
        _text.Append(Printable.Fit(text, Columns)).Append('\n');
        return this;
    }

    /// <summary>An empty line.</summary>
    public Sheet Gap()
    {
        _text.Append('\n');
        return this;
    }

    /// <summary>A value beside its label.</summary>
    public Sheet Row(string label, string value) => Line("  " + Padded(label, LabelColumns) + value);

    /// <summary>A value beside its label; nothing where there is no value.</summary>
    public Sheet RowIf(string label, string? value) => value is null ? this : Row(label, value);

    /// <summary>A table with its numbers under the right edge of their heads; the first column is flush left where it holds words.</summary>
    public Sheet Table(IReadOnlyList<string> heads, IReadOnlyList<string[]> rows, bool wordsFirst)
    {
        int[] widths = [.. heads.Select((head, k) => rows.Select(r => Printable.Width(r[k])).Append(Printable.Width(head)).Max())];
        TableLine([.. heads], widths, wordsFirst);
        foreach (string[] row in rows)
        {
            TableLine(row, widths, wordsFirst);
        }

        return this;
    }

    /// <summary>A sentence, wrapped between words; further lines stand under its first word.</summary>
    public Sheet Sentence(string mark, string text)
    {
        string indent = new(' ', mark.Length);
        string line = mark;
        bool fresh = true;
        foreach (string word in Printable.Text(text).Split(' '))
        {
            if (!fresh && Printable.Width(line) + 1 + Printable.Width(word) > Columns)
            {
                Line(line);
                (line, fresh) = (indent, true);
            }

            line += (fresh ? "" : " ") + word;
            fresh = false;
        }

        return Line(line);
    }

    /// <summary>The cautions, each a sentence; nothing where there are none.</summary>
    public Sheet Cautions(IReadOnlyList<Caution> cautions)
    {
        if (cautions.Count > 0)
        {
            Gap();
        }

        foreach (Caution caution in cautions)
        {
            Sentence("  ! ", caution.Text);
        }

        return this;
    }

    /// <inheritdoc/>
    public override string ToString() => _text.ToString();

    private void TableLine(string[] cells, int[] widths, bool wordsFirst)
    {
        var line = new StringBuilder();
        for (int k = 0; k < cells.Length; k++)
        {
            line.Append("  ");
            string blank = new(' ', widths[k] - Printable.Width(cells[k]));
            line.Append(k == 0 && wordsFirst ? cells[k] + blank : blank + cells[k]);
        }

        Line(line.ToString().TrimEnd());
    }

    private static string Padded(string text, int columns) => text + new string(' ', Math.Max(1, columns - Printable.Width(text)));
}
