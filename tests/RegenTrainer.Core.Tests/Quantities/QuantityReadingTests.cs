using System.Globalization;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Quantities;

public class QuantityReadingTests
{
    // IEC 60062:2016, examples of the letter code for resistance and capacitance.
    [Theory]
    [InlineData("R47", Unit.Ohm, 0.47)]
    [InlineData("4R7", Unit.Ohm, 4.7)]
    [InlineData("470R", Unit.Ohm, 470.0)]
    [InlineData("4K7", Unit.Ohm, 4.7e3)]
    [InlineData("47K", Unit.Ohm, 47e3)]
    [InlineData("47K3", Unit.Ohm, 47.3e3)]
    [InlineData("470K", Unit.Ohm, 470e3)]
    [InlineData("4M7", Unit.Ohm, 4.7e6)]
    [InlineData("1K0", Unit.Ohm, 1e3)]
    [InlineData("2M2", Unit.Ohm, 2.2e6)]
    [InlineData("R10", Unit.Ohm, 0.1)]
    [InlineData("R300", Unit.Ohm, 0.3)]
    [InlineData("4L7", Unit.Ohm, 4.7e-3)]
    [InlineData("10p", Unit.Farad, 10e-12)]
    [InlineData("4n7", Unit.Farad, 4.7e-9)]
    [InlineData("1\u00b50", Unit.Farad, 1e-6)]
    [InlineData("1\u03bc0", Unit.Farad, 1e-6)]
    [InlineData("1u0", Unit.Farad, 1e-6)]
    public void Letter_codes_of_the_standard_read_as_it_says(string text, Unit unit, double expected)
    {
        Assert.Equal(expected, QuantityText.Read(text, unit));
    }

    // SI brochure, 9th edition, table 7: prefixes m, k, M, n, p, f, micro, G and T.
    [Theory]
    [InlineData("0.4 mm", Unit.Metre, 0.0004)]
    [InlineData("0.4mm", Unit.Metre, 0.0004)]
    [InlineData("50 mm", Unit.Metre, 0.05)]
    [InlineData("0.4 m", Unit.Metre, 0.4)]
    [InlineData("0.4m", Unit.Metre, 0.4)]
    [InlineData("20 \u00b5m", Unit.Metre, 20e-6)]
    [InlineData("530k", Unit.Hertz, 530e3)]
    [InlineData("530 kHz", Unit.Hertz, 530e3)]
    [InlineData("1M", Unit.Hertz, 1e6)]
    [InlineData("3 mHz", Unit.Hertz, 3e-3)]
    [InlineData("3 MHz", Unit.Hertz, 3e6)]
    [InlineData("100 nF", Unit.Farad, 100e-9)]
    [InlineData("18f", Unit.Ampere, 18e-15)]
    [InlineData("18 f", Unit.Farad, 18e-15)]
    [InlineData("2 F", Unit.Farad, 2.0)]
    [InlineData("1e-9", Unit.Farad, 1e-9)]
    [InlineData("1.5e3", Unit.Hertz, 1500.0)]
    [InlineData("1.5E+3k", Unit.Hertz, 1.5e6)]
    [InlineData("2.2k", Unit.Ohm, 2200.0)]
    [InlineData("10k ohm", Unit.Ohm, 10e3)]
    [InlineData("220 ohm", Unit.Ohm, 220.0)]
    [InlineData("220 \u2126", Unit.Ohm, 220.0)]
    [InlineData("220 \u03a9", Unit.Ohm, 220.0)]
    [InlineData("4k7 \u03a9", Unit.Ohm, 4700.0)]
    [InlineData("2 m", Unit.Ohm, 2e-3)]
    [InlineData("2 M\u03a9", Unit.Ohm, 2e6)]
    [InlineData("35 \u00b0C", Unit.Celsius, 35.0)]
    [InlineData("-5", Unit.Celsius, -5.0)]
    [InlineData("10 uA", Unit.Ampere, 10e-6)]
    [InlineData("240u", Unit.Henry, 240e-6)]
    [InlineData("5%", Unit.Percent, 5.0)]
    [InlineData("12.5 %", Unit.Percent, 12.5)]
    [InlineData("270\u00b0", Unit.Degree, 270.0)]
    [InlineData("-6 dB", Unit.Decibel, -6.0)]
    [InlineData("40 mS", Unit.Siemens, 0.04)]
    [InlineData("2 Ah", Unit.AmpereHour, 2.0)]
    [InlineData("850 mAh", Unit.AmpereHour, 0.85)]
    [InlineData("20 ms", Unit.Second, 0.02)]
    [InlineData("4V7", Unit.Volt, 4.7)]
    [InlineData("3.0", Unit.Volt, 3.0)]
    [InlineData("500 mW", Unit.Watt, 0.5)]
    [InlineData(" 84 ", Unit.None, 84.0)]
    [InlineData(".5", Unit.None, 0.5)]
    [InlineData("\u22121.5", Unit.None, -1.5)]
    [InlineData("1G5", Unit.Ohm, 1.5e9)]
    [InlineData("2T", Unit.Ohm, 2e12)]
    public void Numbers_with_prefix_and_sign_mean_what_the_SI_says(string text, Unit unit, double expected)
    {
        Assert.Equal(expected, QuantityText.Read(text, unit));
    }

    [Theory]
    [InlineData("", Unit.Ohm, 0, "nothing", "a resistance such as 4k7")]
    [InlineData("   ", Unit.Hertz, 3, "nothing", "a frequency such as 530k")]
    [InlineData("10 pF", Unit.Ohm, 4, "farad", "ohm")]
    [InlineData("10 mm", Unit.Ohm, 4, "metre", "ohm")]
    [InlineData("10 V", Unit.Ampere, 3, "volt", "ampere")]
    [InlineData("10 mA", Unit.Metre, 4, "ampere", "metre")]
    [InlineData("10 kHz", Unit.Percent, 4, "hertz", "percent")]
    [InlineData("5%", Unit.None, 1, "percent", "a plain number")]
    [InlineData("35\u00b0", Unit.Celsius, 2, "degree", "degree Celsius")]
    [InlineData("10k", Unit.Percent, 2, "`k`", "percent or the end of the value")]
    [InlineData("4k7x", Unit.Ohm, 3, "`x`", "ohm or the end of the value")]
    [InlineData("4k7k", Unit.Ohm, 3, "`k`", "ohm or the end of the value")]
    [InlineData("10 kHzz", Unit.Hertz, 6, "`z`", "the end of the value")]
    [InlineData("5 k ohm", Unit.Ohm, 3, "a blank", "ohm or the end of the value")]
    [InlineData("4.7.1", Unit.Ohm, 3, "`.`", "ohm or the end of the value")]
    [InlineData("4.7k3", Unit.Ohm, 4, "`3`", "ohm or the end of the value")]
    [InlineData("--4", Unit.Ohm, 1, "`-`", "a resistance such as 4k7")]
    [InlineData("5.", Unit.Volt, 2, "the end", "a digit after the point")]
    [InlineData("5.k", Unit.Volt, 2, "`k`", "a digit after the point")]
    [InlineData("1e", Unit.Volt, 2, "the end", "the digits of a power of ten")]
    [InlineData("1e+x", Unit.Volt, 3, "`x`", "the digits of a power of ten")]
    [InlineData("NaN", Unit.Volt, 0, "`N`", "a voltage such as 4.5 V")]
    [InlineData("Infinity", Unit.Volt, 0, "`I`", "a voltage such as 4.5 V")]
    [InlineData("-inf", Unit.Volt, 1, "`i`", "a voltage such as 4.5 V")]
    [InlineData("\u221e", Unit.Volt, 0, "`\u221e`", "a voltage such as 4.5 V")]
    [InlineData("1e999", Unit.Volt, 0, "a number too large to hold", "a number below 1e308")]
    [InlineData("1e99999999999", Unit.Volt, 0, "a number too large to hold", "a number below 1e308")]
    [InlineData("1e-999", Unit.Volt, 0, "a number too small to tell from 0", "0 or a number above 1e-300")]
    [InlineData("\u0664k7", Unit.Ohm, 0, "`\u0664`", "a resistance such as 4k7")]
    [InlineData("10 P", Unit.Farad, 3, "`P`", "p for pico")]
    [InlineData("10 UA", Unit.Ampere, 3, "`U`", "u for micro")]
    [InlineData("4\u202ek7", Unit.Ohm, 1, "the character U+202E", "ohm or the end of the value")]
    [InlineData("4\u001b[2J", Unit.Ohm, 1, "the character U+001B", "ohm or the end of the value")]
    [InlineData("0m4", Unit.Metre, 1, "`m` in the place of the point", "0.4 mm or 0.4 m")]
    [InlineData("AWG 26", Unit.Ohm, 0, "`A`", "a resistance such as 4k7")]
    public void A_fault_stands_at_the_first_wrong_character(string text, Unit unit, int offset, string found, string expected)
    {
        Assert.False(QuantityText.TryRead(text, unit, out double value, out QuantityFault fault));
        Assert.Equal(new QuantityFault(offset, found, expected), fault);
        Assert.Equal(0.0, value);
    }

    [Theory]
    [InlineData("4,7k", Unit.Ohm, 1, "a point (write 4.7k or 4k7)")]
    [InlineData(" 4,7 k\u03a9", Unit.Ohm, 2, "a point (write 4.7 k\u03a9 or 4k7)")]
    [InlineData("-2,2", Unit.Ohm, 2, "a point (write -2.2 or -2R2)")]
    [InlineData("0,4 mm", Unit.Metre, 1, "a point (write 0.4 mm)")]
    [InlineData("2,5n", Unit.Farad, 1, "a point (write 2.5n or 2n5)")]
    [InlineData("1,000", Unit.Hertz, 1, "a point (write 1.000), or no mark between thousands (write 1000)")]
    [InlineData("1,000,000", Unit.Hertz, 1, "a point as decimal sign")]
    [InlineData("4,", Unit.Ohm, 1, "a point as decimal sign")]
    public void A_decimal_comma_is_answered_with_what_to_write(string text, Unit unit, int offset, string expected)
    {
        Assert.False(QuantityText.TryRead(text, unit, out _, out QuantityFault fault));
        Assert.Equal(new QuantityFault(offset, "a comma", expected), fault);
    }

    [Theory]
    [InlineData("2meg", 1, "`meg`")]
    [InlineData("2 MEG", 2, "`MEG`")]
    [InlineData("2.2Meg", 3, "`Meg`")]
    [InlineData("2meg2", 1, "`meg`")]
    [InlineData("1 megohm", 2, "`megohm`")]
    public void Mega_is_spelt_with_its_letter_alone(string text, int offset, string found)
    {
        Assert.False(QuantityText.TryRead(text, Unit.Ohm, out _, out QuantityFault fault));
        Assert.Equal(new QuantityFault(offset, found, "M for mega"), fault);
    }

    [Fact]
    public void Half_a_surrogate_pair_is_named_by_its_number()
    {
        Assert.False(QuantityText.TryRead("4\ud800", Unit.Ohm, out _, out QuantityFault fault));
        Assert.Equal(new QuantityFault(1, "the character U+D800", "ohm or the end of the value"), fault);
    }

    [Fact]
    public void Reading_or_throwing_says_where_and_why()
    {
        FormatException thrown = Assert.Throws<FormatException>(() => QuantityText.Read("10 pF", Unit.Ohm));
        Assert.Equal("At character 5: found farad, expected ohm.", thrown.Message);
        Assert.Throws<ArgumentNullException>(() => QuantityText.Read(null!, Unit.Ohm));
    }

    [Fact]
    public void The_culture_of_the_thread_changes_nothing()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo comma = (CultureInfo)CultureInfo.InvariantCulture.Clone();
            comma.NumberFormat.NumberDecimalSeparator = ",";
            comma.NumberFormat.NegativeSign = "~";
            CultureInfo.CurrentCulture = comma;
            Assert.Equal(-4.7e-12, QuantityText.Read("-4.7e-12", Unit.Farad));
            Assert.Equal("-4p7", QuantityText.WriteCode(-4.7e-12, Unit.Farad));
            Assert.Equal("-4.7 pF", QuantityText.Write(-4.7e-12, Unit.Farad));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
