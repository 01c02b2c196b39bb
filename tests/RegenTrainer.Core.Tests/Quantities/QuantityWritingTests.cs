using CsCheck;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Quantities;

public class QuantityWritingTests
{
    private static readonly Gen<Unit> _units = Gen.Enum<Unit>();

    private static readonly Gen<double> _values = Gen.Select(
        Gen.Double[-1.0, 1.0], Gen.Int[-20, 18], (mantissa, power) => mantissa * Math.Pow(10.0, power));

    // Letter codes after IEC 60062:2016; the choice of prefix is common practice.
    [Theory]
    [InlineData(1220.0, Unit.Ohm, "1k22")]
    [InlineData(4700.0, Unit.Ohm, "4k7")]
    [InlineData(1000.0, Unit.Ohm, "1k")]
    [InlineData(999.6, Unit.Ohm, "1k")]
    [InlineData(2.2, Unit.Ohm, "2R2")]
    [InlineData(470.0, Unit.Ohm, "470R")]
    [InlineData(0.47, Unit.Ohm, "R47")]
    [InlineData(0.047, Unit.Ohm, "R047")]
    [InlineData(0.0047, Unit.Ohm, "4m7")]
    [InlineData(0.0, Unit.Ohm, "0")]
    [InlineData(-4700.0, Unit.Ohm, "-4k7")]
    [InlineData(-0.47, Unit.Ohm, "-R47")]
    [InlineData(143e-12, Unit.Farad, "143p")]
    [InlineData(365e-12, Unit.Farad, "365p")]
    [InlineData(100e-9, Unit.Farad, "100n")]
    [InlineData(0.5e-12, Unit.Farad, "0p5")]
    [InlineData(4700e-6, Unit.Farad, "4700u")]
    [InlineData(240e-6, Unit.Henry, "240u")]
    [InlineData(530e3, Unit.Hertz, "530k")]
    [InlineData(1.7e6, Unit.Hertz, "1M7")]
    [InlineData(2.5, Unit.Hertz, "2.5")]
    [InlineData(4.5, Unit.Volt, "4V5")]
    [InlineData(10e-6, Unit.Ampere, "10u")]
    [InlineData(0.0004, Unit.Metre, "0.4 mm")]
    [InlineData(5.0, Unit.Percent, "5%")]
    [InlineData(0.12, Unit.None, "0.12")]
    [InlineData(84.0, Unit.None, "84")]
    public void Codes_are_written_as_the_standard_writes_them(double value, Unit unit, string expected)
    {
        Assert.Equal(expected, QuantityText.WriteCode(value, unit));
    }

    // SI brochure, 9th edition: a blank before the unit, none before the degree of angle.
    [Theory]
    [InlineData(1220.0, Unit.Ohm, 3, "1.22 k\u03a9")]
    [InlineData(1220.0, Unit.Ohm, 2, "1.2 k\u03a9")]
    [InlineData(143.4e-12, Unit.Farad, 3, "143 pF")]
    [InlineData(10e-6, Unit.Ampere, 3, "10 \u00b5A")]
    [InlineData(0.05, Unit.Metre, 3, "50 mm")]
    [InlineData(300.0, Unit.Metre, 3, "300 m")]
    [InlineData(61.9, Unit.Percent, 3, "61.9 %")]
    [InlineData(186.0, Unit.Degree, 3, "186\u00b0")]
    [InlineData(35.0, Unit.Celsius, 3, "35 \u00b0C")]
    [InlineData(-0.67, Unit.Decibel, 3, "-0.67 dB")]
    [InlineData(1e-18, Unit.Ampere, 3, "1e-18 A")]
    [InlineData(0.0, Unit.Volt, 3, "0 V")]
    [InlineData(-1e-30, Unit.None, 3, "-1e-30")]
    [InlineData(double.PositiveInfinity, Unit.Ohm, 3, "\u221e \u03a9")]
    [InlineData(double.NegativeInfinity, Unit.Decibel, 3, "-\u221e dB")]
    [InlineData(double.NaN, Unit.Ohm, 3, "\u2014")]
    public void Screens_show_prefix_and_sign(double value, Unit unit, int figures, string expected)
    {
        Assert.Equal(expected, QuantityText.Write(value, unit, figures));
    }

    [Fact]
    public void What_is_written_with_all_figures_reads_back_the_same()
    {
        Gen.Select(_values, _units).Sample(
            (value, unit) =>
            {
                Assert.Equal(value, QuantityText.Read(QuantityText.WriteCode(value, unit, 17), unit));
                Assert.Equal(value, QuantityText.Read(QuantityText.Write(value, unit, 17), unit));
            },
            iter: 20000);
    }

    [Fact]
    public void What_is_written_with_few_figures_reads_back_within_half_of_the_last()
    {
        Gen.Select(_values, _units, Gen.Int[1, 12]).Sample(
            (value, unit, figures) =>
            {
                double allowed = Math.Abs(value) * 0.5000001 * Math.Pow(10.0, 1 - figures);
                double code = QuantityText.Read(QuantityText.WriteCode(value, unit, figures), unit);
                double shown = QuantityText.Read(QuantityText.Write(value, unit, figures), unit);
                Assert.InRange(Math.Abs(code - value), 0.0, allowed);
                Assert.Equal(code, shown);
            },
            iter: 20000);
    }

    [Fact]
    public void Any_text_is_read_or_refused_at_a_place_within_it()
    {
        const string Alphabet = "0123456789.,eE+-kKMmunpfRLFHzVAW%\u03a9\u00b5\u00b0 CdBgG\u001b\u202e\ud83d\ude00\0";
        Gen<string> texts = Gen.Int[0, Alphabet.Length - 1].Array[0, 8].Select(at => string.Concat(at.Select(i => Alphabet[i])));
        Gen.Select(texts, _units).Sample(
            (text, unit) =>
            {
                if (QuantityText.TryRead(text, unit, out double value, out QuantityFault fault))
                {
                    Assert.True(double.IsFinite(value));
                    return;
                }

                Assert.InRange(fault.Offset, 0, text.Length);
                Assert.NotEmpty(fault.Expected);
                Assert.Equal(Printable.Text(fault.Message), fault.Message);
            },
            iter: 50000);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void A_code_is_written_of_finite_values_alone(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => QuantityText.WriteCode(value, Unit.Ohm));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(18)]
    public void Figures_outside_one_to_seventeen_are_refused(int figures)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => QuantityText.Write(1.0, Unit.Ohm, figures));
    }

    // IEC 60062, tolerance letters: F and K from its published tables, the others from memory.
    [Theory]
    [InlineData("B", 0.1)]
    [InlineData("C", 0.25)]
    [InlineData("D", 0.5)]
    [InlineData("F", 1.0)]
    [InlineData("G", 2.0)]
    [InlineData("J", 5.0)]
    [InlineData("K", 10.0)]
    [InlineData(" M ", 20.0)]
    [InlineData("N", 30.0)]
    [InlineData("5%", 5.0)]
    [InlineData("\u00b1 0.5 %", 0.5)]
    [InlineData("20", 20.0)]
    public void Tolerances_are_read_as_letter_or_percent(string text, double expected)
    {
        Assert.True(QuantityText.TryReadTolerance(text, out double percent, out _));
        Assert.Equal(expected, percent);
    }

    [Theory]
    [InlineData("Q", 0, "`Q`", "a share such as 5%")]
    [InlineData("\u00b15x", 2, "`x`", "percent or the end of the value")]
    [InlineData("-5%", 0, "-5%", "a tolerance from 0% to 100%")]
    [InlineData("101", 0, "101%", "a tolerance from 0% to 100%")]
    [InlineData("5 ohm", 2, "ohm", "percent")]
    public void Tolerances_that_are_none_are_refused_in_place(string text, int offset, string found, string expected)
    {
        Assert.False(QuantityText.TryReadTolerance(text, out double percent, out QuantityFault fault));
        Assert.Equal(new QuantityFault(offset, found, expected), fault);
        Assert.Equal(0.0, percent);
    }
}
