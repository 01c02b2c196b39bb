using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>Quotes, brackets and places in texts that are legal but unusual. What is legal is said by TOML 1.0, section String.</summary>
public sealed class TextPlaceTests
{
    private static readonly string _preset = Presets.Text(Presets.Default);

    [Theory]
    [InlineData("\"\"\"He said \"hi\"\"\"\"", "He said \"hi\"")]
    [InlineData("\"\"\"Two \"\"\"\"\"", "Two \"\"")]
    [InlineData("'''It''s 'so''''", "It''s 'so'")]
    [InlineData("\"\"\"\"\"\"", "")]
    [InlineData("\"\"\"\\\"\"\"\"", "\"")]
    [InlineData("\"\"\"\nA [ and a { and a #\n\"\"\"", "A [ and a { and a #\n")]
    [InlineData("'C:\\'", "C:\\")]
    [InlineData("\"# [[[[ \\\" ]\"", "# [[[[ \" ]")]
    public void A_title_in_any_legal_quotes_is_read_as_it_is_meant(string written, string title)
    {
        StageReadResult result = StageText.Read(WithTitle(written), "quotes.toml", DeviceShelf.Shipped);
        Assert.Empty(result.Faults);
        Assert.Equal(title, result.Design!.Title);
    }

    [Theory]
    [InlineData("\"Tern Point", 11)]
    [InlineData("'Tern Point", 11)]
    [InlineData("\"Tern Point\\\"", 11)]
    public void A_text_left_open_is_told_at_its_first_quote(string written, int column)
    {
        StageReadResult result = StageText.Read(WithTitle(written), "open.toml", DeviceShelf.Shipped);
        FileFault fault = Assert.Single(result.Faults);
        Assert.Equal((2, column), (fault.Line, fault.Column));
    }

    [Fact]
    public void Columns_count_characters_and_not_their_halves()
    {
        // Columns counted by hand: the face is one character of two halves.
        string open = _preset.Replace(
            "series = { value = \"220\", at = \"device\" }", "series = { at = \"d\U0001F600\", value = \"22 }", StringComparison.Ordinal);
        FileFault quote = Assert.Single(StageText.Read(open, "open.toml", DeviceShelf.Shipped).Faults);
        Assert.Equal((39, 31), (quote.Line, quote.Column));

        string deep = "x = [\"\U0001F600\", " + new string('[', 40) + "\n";
        FileFault bracket = Assert.Single(StageText.Read(deep, "deep.toml", DeviceShelf.Shipped).Faults);
        Assert.Equal((1, 42), (bracket.Line, bracket.Column));

        string value = _preset.Replace(
            "series = { value = \"220\", at = \"device\" }", "series = { at = \"d\U0001F600\", value = \"22x\" }", StringComparison.Ordinal);
        Assert.Contains(StageText.Read(value, "value.toml", DeviceShelf.Shipped).Faults, f => (f.Line, f.Column) == (39, 34));
    }

    private static string WithTitle(string written)
    {
        const string line = "title   = \"Tern Point preselector\"";
        Assert.Contains(line, _preset, StringComparison.Ordinal);
        return _preset.Replace(line, "title   = " + written, StringComparison.Ordinal);
    }
}
