using CsCheck;

namespace RegenTrainer.Session.Tests;

public sealed class StepsTests
{
    [Theory]
    [InlineData(500, 10, 5.0)]
    [InlineData(50, 100, 5.0)]
    [InlineData(5000, 20, 100.0)]
    [InlineData(-50, 7, 0.0)]
    public void Steps_of_the_travel_add_up_exactly(int thousandths, int times, double expected)
    {
        double travel = 0;
        for (int k = 0; k < times; k++)
        {
            travel = Steps.Travel(travel, thousandths);
        }

        Assert.Equal(expected, travel);
    }

    [Fact]
    public void Any_walk_of_the_travel_stays_between_the_stops_and_on_thousandths() =>
        Check.Sample(
            Gen.Int[-9000, 9000].List[0, 60],
            steps =>
            {
                double travel = 50;
                int exact = 50_000;
                foreach (int step in steps)
                {
                    travel = Steps.Travel(travel, step);
                    exact = Math.Min(100_000, Math.Max(0, exact + step));
                }

                return travel == exact / 1000.0;
            });

    [Theory]
    [InlineData(1000e3, 10e3, true, 1010e3)]
    [InlineData(1000e3, 10e3, false, 990e3)]
    [InlineData(1003.2e3, 10e3, true, 1010e3)]
    [InlineData(1003.2e3, 10e3, false, 1000e3)]
    [InlineData(999e3, 9e3, true, 1008e3)]     // channels of the 9 kHz raster are multiples of 9 kHz: Geneva plan of 1975
    [InlineData(531e3, 9e3, false, 522e3)]
    public void Channels_lie_on_the_raster(double hz, double raster, bool up, double expected) =>
        Assert.Equal(expected, Steps.Channel(hz, raster, up), 6);

    [Theory]
    [InlineData(3.0, true, 3.1)]
    [InlineData(3.0, false, 2.9)]
    [InlineData(2.44, true, 2.5)]
    public void Supply_goes_by_whole_tenths(double volt, bool up, double expected) => Assert.Equal(expected, Steps.TenthOfVolt(volt, up));
}
