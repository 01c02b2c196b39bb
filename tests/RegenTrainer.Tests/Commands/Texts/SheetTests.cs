using RegenTrainer.Commands.Texts;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Tests.Commands.Texts;

public sealed class SheetTests
{
    [Fact]
    public void No_line_is_wider_than_eighty_columns()
    {
        string lines = new Sheet()
            .Line(new string('t', 300))
            .Row("label", new string('\u4e00', 100))
            .Table(["node", "volt"], [[new string('n', 90), "1 V"]], wordsFirst: true)
            .Cautions([new Caution("long", string.Join(' ', Enumerable.Repeat("caution", 50)))])
            .ToString();
        Assert.All(lines.Split('\n'), line => Assert.InRange(Printable.Width(line), 0, 80));
    }

    [Fact]
    public void A_sentence_wraps_under_its_first_word_and_loses_nothing()
    {
        string text = string.Join(' ', Enumerable.Range(1, 60).Select(k => $"word{k}"));
        string[] lines = new Sheet().Sentence("  ! ", text).ToString().TrimEnd('\n').Split('\n');
        Assert.StartsWith("  ! word1 ", lines[0], StringComparison.Ordinal);
        Assert.All(lines.Skip(1), line => Assert.StartsWith("    word", line, StringComparison.Ordinal));
        Assert.Equal(text, string.Join(' ', lines.Select(line => line[4..])));
    }

    [Fact]
    public void Columns_line_up_by_what_is_seen()
    {
        string table = new Sheet()
            .Table(["name", "value"], [["\u4e00\u4e00\u4e00", "1"], ["a", "22 \u00b5A"]], wordsFirst: true)
            .ToString();
        Assert.Equal("  name    value\n  \u4e00\u4e00\u4e00      1\n  a       22 \u00b5A\n", table);
    }

    [Fact]
    public void Escape_sequences_of_a_title_do_not_get_through() =>
        Assert.Equal("a?[31mb\n", new Sheet().Line("a\u001b[31mb").ToString());
}
