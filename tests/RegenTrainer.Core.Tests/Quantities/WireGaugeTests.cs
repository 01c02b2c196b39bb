using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Quantities;

public class WireGaugeTests
{
    // ASTM B258-02, table of diameters in inch (rounded there to 0.0001 in; most rows from memory).
    // No. 0000 = 0.4600 in and No. 36 = 0.0050 in define the gauge.
    [Theory]
    [InlineData("0000", 0.4600)]
    [InlineData("000", 0.4096)]
    [InlineData("00", 0.3648)]
    [InlineData("0", 0.3249)]
    [InlineData("10", 0.1019)]
    [InlineData("16", 0.0508)]
    [InlineData("18", 0.0403)]
    [InlineData("20", 0.0320)]
    [InlineData("22", 0.0253)]
    [InlineData("24", 0.0201)]
    [InlineData("26", 0.0159)]
    [InlineData("28", 0.0126)]
    [InlineData("30", 0.0100)]
    [InlineData("32", 0.0080)]
    [InlineData("34", 0.0063)]
    [InlineData("36", 0.0050)]
    [InlineData("38", 0.0040)]
    [InlineData("40", 0.0031)]
    public void Diameters_are_those_of_the_table(string number, double inches)
    {
        Assert.Equal(inches, QuantityText.Read("AWG " + number, Unit.Metre) / 0.0254, 1e-4);
    }

    // Definition in ASTM B258: the ratio of neighbouring sizes is the 39th root of 92, 1.1229322.
    [Fact]
    public void Neighbouring_sizes_stand_in_one_ratio()
    {
        for (int number = WireGauge.Lowest; number < WireGauge.Highest; number++)
        {
            Assert.Equal(1.1229322, WireGauge.Diameter(number) / WireGauge.Diameter(number + 1), 7);
        }
    }

    [Theory]
    [InlineData("awg26")]
    [InlineData(" Awg  26 ")]
    public void Blanks_and_case_do_not_matter(string text)
    {
        // ASTM B258: 0.01594 in.
        Assert.Equal(0.4049e-3, QuantityText.Read(text, Unit.Metre), 1e-7);
    }

    [Theory]
    [InlineData("AWG", 3, "the end", "a wire number from 0000 to 40")]
    [InlineData("AWG 41", 4, "`41`", "a wire number from 0000 to 40")]
    [InlineData("AWG 00000", 4, "`00000`", "a wire number from 0000 to 40")]
    [InlineData("AWG 026", 4, "`026`", "a wire number from 0000 to 40")]
    [InlineData("AWG 99999999999", 4, "`99999999999`", "a wire number from 0000 to 40")]
    [InlineData("AWG -1", 4, "`-`", "a wire number from 0000 to 40")]
    [InlineData("AWG 26 mm", 6, "a blank", "the end of the wire number")]
    [InlineData("AWG 26.5", 6, "`.`", "the end of the wire number")]
    [InlineData("AWGx", 3, "`x`", "a wire number from 0000 to 40")]
    public void Wrong_wire_numbers_are_refused_in_place(string text, int offset, string found, string expected)
    {
        Assert.False(QuantityText.TryRead(text, Unit.Metre, out _, out QuantityFault fault));
        Assert.Equal(new QuantityFault(offset, found, expected), fault);
    }

    [Theory]
    [InlineData(-4)]
    [InlineData(41)]
    public void Numbers_outside_the_gauge_are_refused(int number)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => WireGauge.Diameter(number));
    }
}
