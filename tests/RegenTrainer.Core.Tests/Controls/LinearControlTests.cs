using RegenTrainer.Core.Controls;

namespace RegenTrainer.Core.Tests.Controls;

public class LinearControlTests
{
    [Fact]
    public void Value_goes_evenly_either_way()
    {
        LinearControl falling = new(200e-12, 20e-12, 180);
        Assert.Equal(110e-12, falling.ValueAt(50), 1e-24);
        Assert.Equal(75, falling.TravelAt(65e-12)!.Value, 1e-9);
        Assert.Equal((200e-12, 20e-12), (falling.ValueAtStart, falling.ValueAtEnd));
        Assert.Equal(-1, new LinearControl(-5, 11).ValueAt(25), 1e-12);
        Assert.Equal((0.0, 45.0, 180.0), (falling.DegreesAt(0), falling.DegreesAt(25), falling.DegreesAt(100)));
        Assert.Empty(falling.KinkTravels);
    }

    // Both stops and all between must be in reach whatever the roundings of the two values.
    [Fact]
    public void Travel_at_a_value_is_where_the_value_was_read()
    {
        for (int k = 1; k <= 5000; k++)
        {
            double start = Math.Sqrt(k) - 30, end = Math.Cbrt(k * 7) + 20;
            LinearControl control = k % 2 == 0 ? new(start, end) : new(end, start);
            foreach (double travel in (double[])[0, 0.1, 33.3, 50, 99.9, 100])
            {
                double? back = control.TravelAt(control.ValueAt(travel));
                Assert.True(back is >= 0 and <= 100, $"{control}: {travel} % went to {back}");
                Assert.Equal(travel, back.Value, 1e-9);
            }
        }
    }

    [Theory]
    [InlineData(0.999)]
    [InlineData(3.001)]
    [InlineData(double.NaN)]
    [InlineData(double.NegativeInfinity)]
    public void Values_out_of_reach_have_no_travel(double value)
    {
        Assert.Null(new LinearControl(1, 3).TravelAt(value));
        Assert.Null(new LinearControl(3, 1).TravelAt(value));
    }

    [Theory]
    [InlineData(double.NaN, 1, 300, "minimum", "finite")]
    [InlineData(0, double.PositiveInfinity, 300, "maximum", "finite")]
    [InlineData(2, 2, 300, "maximum", "both ends")]
    [InlineData(0, 1, 0.5, "mechanicalDegrees", "from 1 to 3600")]
    [InlineData(0, 1, 3601, "mechanicalDegrees", "from 1 to 3600")]
    public void Values_out_of_range_are_refused_with_the_range(double minimum, double maximum, double degrees, string name, string range)
    {
        ArgumentOutOfRangeException refusal = Assert.Throws<ArgumentOutOfRangeException>(() => new LinearControl(minimum, maximum, degrees));
        Assert.Equal(name, refusal.ParamName);
        Assert.Contains(range, refusal.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(-1)]
    [InlineData(101)]
    [InlineData(double.NaN)]
    public void Travel_beyond_the_stops_is_refused(double travel)
    {
        ArgumentOutOfRangeException refusal = Assert.Throws<ArgumentOutOfRangeException>(() => new LinearControl(0, 1).ValueAt(travel));
        Assert.Contains("from 0 to 100", refusal.Message, StringComparison.Ordinal);
    }
}
