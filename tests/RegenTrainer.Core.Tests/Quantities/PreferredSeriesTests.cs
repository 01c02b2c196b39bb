using CsCheck;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Quantities;

public class PreferredSeriesTests
{
    // IEC 60063:2015, tables of the series; E3 and E192 (the value 920) from memory.
    [Theory]
    [InlineData("E3", "10 22 47")]
    [InlineData("E6", "10 15 22 33 47 68")]
    [InlineData("E12", "10 12 15 18 22 27 33 39 47 56 68 82")]
    [InlineData("E24", "10 11 12 13 15 16 18 20 22 24 27 30 33 36 39 43 47 51 56 62 68 75 82 91")]
    [InlineData(
        "E48",
        "100 105 110 115 121 127 133 140 147 154 162 169 178 187 196 205 215 226 237 249 261 274 287 301 316 332 348 365 383 "
        + "402 422 442 464 487 511 536 562 590 619 649 681 715 750 787 825 866 909 953")]
    [InlineData(
        "E96",
        "100 102 105 107 110 113 115 118 121 124 127 130 133 137 140 143 147 150 154 158 162 165 169 174 178 182 187 191 196 "
        + "200 205 210 215 221 226 232 237 243 249 255 261 267 274 280 287 294 301 309 316 324 332 340 348 357 365 374 383 392 "
        + "402 412 422 432 442 453 464 475 487 499 511 523 536 549 562 576 590 604 619 634 649 665 681 698 715 732 750 768 787 "
        + "806 825 845 866 887 909 931 953 976")]
    public void Series_hold_the_values_of_the_standard(string name, string values)
    {
        PreferredSeries series = PreferredSeries.ByName(name)!;
        Assert.Equal(name, series.Name);
        Assert.Equal(values, string.Join(' ', series.Values));
    }

    // IEC 60063:2015: 192 values, every other one of E96, and 920 where the rounded power would be 919 (from memory).
    [Fact]
    public void The_finest_series_holds_920_and_the_whole_of_E96()
    {
        IReadOnlyList<int> values = PreferredSeries.E192.Values;
        Assert.Equal(192, values.Count);
        Assert.Equal(192, values.Distinct().Count());
        Assert.Contains(920, values);
        Assert.DoesNotContain(919, values);
        Assert.Equal(PreferredSeries.E96.Values, values.Where((_, at) => at % 2 == 0));
        Assert.Equal([100, 101, 102, 104, 105, 106], values.Take(6));
        Assert.Equal([965, 976, 988], values.TakeLast(3));
    }

    // The neighbours follow from the E24 and E96 tables of IEC 60063.
    [Theory]
    [InlineData("E24", 4700.0, 4700.0, 5100.0, 4300.0)]
    [InlineData("E24", 1000.0, 1000.0, 1100.0, 910.0)]
    [InlineData("E24", 9.5, 9.1, 10.0, 9.1)]
    [InlineData("E24", 9.8, 10.0, 10.0, 9.1)]
    [InlineData("E12", 5000.0, 4700.0, 5600.0, 4700.0)]
    [InlineData("E3", 4.7e-12, 4.7e-12, 10e-12, 2.2e-12)]
    [InlineData("E96", 976.0, 976.0, 1000.0, 953.0)]
    [InlineData("E6", 47000.000000001, 47000.0, 68000.0, 33000.0)]
    public void Neighbours_are_found_across_decades(string name, double value, double nearest, double above, double below)
    {
        PreferredSeries series = PreferredSeries.ByName(name)!;
        Assert.Equal(nearest, series.Nearest(value));
        Assert.Equal(above, series.Above(value));
        Assert.Equal(below, series.Below(value));
    }

    [Fact]
    public void Up_and_down_again_comes_back_and_the_nearest_lies_between()
    {
        Gen.Select(Gen.Int[0, 6].Select(at => PreferredSeries.All[at]), Gen.Double[-12.0, 9.0]).Sample((series, power) =>
        {
            double value = Math.Pow(10.0, power);
            double preferred = series.Nearest(value);
            Assert.Equal(preferred, series.Below(series.Above(preferred)));
            Assert.Equal(preferred, series.Above(series.Below(preferred)));
            Assert.True(preferred == series.Above(value) || preferred == series.Below(value) || Math.Abs((preferred / value) - 1.0) < 1e-8);
        });
    }

    [Theory]
    [InlineData(0.0)]
    [InlineData(-1.0)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(1e31)]
    public void Values_without_neighbours_are_refused(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => PreferredSeries.E12.Nearest(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => PreferredSeries.E12.Above(value));
        Assert.Throws<ArgumentOutOfRangeException>(() => PreferredSeries.E12.Below(value));
    }

    [Fact]
    public void Names_are_read_in_either_case_and_others_give_none()
    {
        Assert.Same(PreferredSeries.E24, PreferredSeries.ByName("e24"));
        Assert.Null(PreferredSeries.ByName("E25"));
        Assert.Null(PreferredSeries.ByName(""));
    }
}
