using System.Globalization;
using CsCheck;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Quantities;

public class PrintableTests
{
    private const string Awkward = "\u4e2d\u0301\u200d\ud83d\ude00\ufe0f";

    private static readonly Gen<string> _anything =
        Gen.OneOf(Gen.Char, Gen.Char[' ', '~'], Gen.Int[0, Awkward.Length - 1].Select(at => Awkward[at]))
            .Array[0, 20].Select(characters => new string(characters));

    // Code points after the Unicode character database: general categories Cc, Cf, Zl, Zp and the bidirectional controls of UAX #9.
    [Theory]
    [InlineData("plain 4k7 \u03a9 \u00b5F \u00b0C", "plain 4k7 \u03a9 \u00b5F \u00b0C")]
    [InlineData("\u001b[31mred\u001b[0m", "?[31mred?[0m")]
    [InlineData("\u009b31m", "?31m")]
    [InlineData("a\r\nb\tc\0d\u007fe", "a??b?c?d?e")]
    [InlineData("\u001b]0;title\u0007", "?]0;title?")]
    [InlineData("\u202eabc\u202c\u2066x\u2069\u200e\u200f\u061c", "?abc??x????")]
    [InlineData("a\u200bb\u200cc\u200dd\u2060e\ufefff\u00adg", "a?b?c?d?e?f?g")]
    [InlineData("a\u2028b\u2029c\u0085d", "a?b?c?d")]
    [InlineData("\u3164\u115f\u1160\uffa0\u180e", "?????")]
    [InlineData("tag \U000e0041\U000e007f", "tag ??")]
    [InlineData("\u4e2d\u6587 e\u0301 \U0001f600", "\u4e2d\u6587 e\u0301 \U0001f600")]
    public void What_could_steer_or_hide_becomes_a_question_mark(string text, string expected)
    {
        Assert.Equal(expected, Printable.Text(text));
    }

    [Fact]
    public void Halves_of_surrogate_pairs_become_a_question_mark()
    {
        Assert.Equal("a?b", Printable.Text("a" + '\ud83d' + "b"));
        Assert.Equal("a?b", Printable.Text("a" + '\ude00' + "b"));
        Assert.Equal("??", Printable.Text(new string(['\ude00', '\ud83d'])));
    }

    // Unicode UAX #11: W and F take two columns; combining marks none.
    [Theory]
    [InlineData("", 0)]
    [InlineData("4k7", 3)]
    [InlineData("e\u0301", 1)]
    [InlineData("\u4e2d\u6587", 4)]
    [InlineData("\uff21", 2)]
    [InlineData("\uff71", 1)]
    [InlineData("\ud55c", 2)]
    [InlineData("\u1112\u1161\u11ab", 2)]
    [InlineData("\U0001f600", 2)]
    [InlineData("\u2764\ufe0f", 2)]
    [InlineData("\u2503\u25b2\u2026", 3)]
    [InlineData("a\u001bb", 3)]
    [InlineData("\u200b", 1)]
    public void Width_counts_terminal_columns(string text, int expected)
    {
        Assert.Equal(expected, Printable.Width(text));
    }

    [Theory]
    [InlineData("emitter", 7, "emitter")]
    [InlineData("emitter", 6, "emitt\u2026")]
    [InlineData("emitter", 1, "\u2026")]
    [InlineData("emitter", 0, "")]
    [InlineData("", 0, "")]
    [InlineData("\u4e2d\u6587\u5b57", 5, "\u4e2d\u6587\u2026")]
    [InlineData("\u4e2d\u6587\u5b57", 4, "\u4e2d\u2026")]
    [InlineData("e\u0301e\u0301e\u0301", 2, "e\u0301\u2026")]
    [InlineData("a\nb", 3, "a?b")]
    public void Fit_cuts_between_graphemes(string text, int columns, string expected)
    {
        Assert.Equal(expected, Printable.Fit(text, columns));
    }

    [Fact]
    public void Columns_below_zero_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Printable.Fit("a", -1));
    }

    [Fact]
    public void Nothing_unfit_is_left_and_a_second_pass_changes_nothing()
    {
        _anything.Sample(
            text =>
            {
                string shown = Printable.Text(text);
                Assert.Equal(shown, Printable.Text(shown));
                Assert.DoesNotContain(shown.EnumerateRunes(), rune =>
                    rune.Value == 0xFFFD && !text.Contains('\ufffd', StringComparison.Ordinal));
                Assert.DoesNotContain(shown, character =>
                    char.IsControl(character) || char.GetUnicodeCategory(character) == UnicodeCategory.Format);
            },
            iter: 20000);
    }

    [Fact]
    public void What_was_fitted_is_never_wider_than_the_columns()
    {
        Gen.Select(_anything, Gen.Int[0, 25]).Sample(
            (text, columns) => Assert.InRange(Printable.Width(Printable.Fit(text, columns)), 0, columns),
            iter: 20000);
    }
}
