using RegenTrainer.Drawing;

namespace RegenTrainer.Tests.Drawing;

public sealed class AxisTests
{
    [Fact]
    public void Marks_are_round_and_few()
    {
        Assert.Equal([0, 20, 40, 60, 80, 100], new Axis(0, 100, false).Marks(5));
        Assert.Equal([-40, -30, -20, -10, 0], new Axis(-40, 0, false).Marks(4));
        Assert.Equal([600, 800, 1000, 1200, 1400, 1600], new Axis(530, 1700, false).Marks(6));
        Assert.Equal([100, 200, 500, 1000, 2000], new Axis(100, 2000, true).Marks(6));
        Assert.Equal([100, 300, 1000, 3000, 10000], new Axis(50, 10_000, true).Marks(4));
    }

    [Theory]
    [InlineData(130.0, 28513.0, true, 100.0, 50000.0)]
    [InlineData(-7.18, -1.9, false, -8.0, 0.0)]
    [InlineData(0.5, 42.6, false, 0.0, 60.0)]
    public void A_scale_holds_its_values_between_round_ends(double least, double most, bool logarithmic, double from, double to)
    {
        Axis axis = Axis.Holding([most, least], logarithmic);
        Assert.Equal(from, axis.From, 1e-9);
        Assert.Equal(to, axis.To, 1e-6);
    }

    [Theory]
    [InlineData(5.0)]
    [InlineData(0.0)]
    [InlineData(-3.0)]
    public void One_value_still_makes_a_scale(double value)
    {
        Axis axis = Axis.Holding([value], false);
        Assert.True(axis.From <= value && value <= axis.To && axis.From < axis.To);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Places_and_values_are_inverse(bool logarithmic)
    {
        var axis = new Axis(20, 5000, logarithmic);
        Assert.Equal((0, 1), (axis.PlaceOf(20), axis.PlaceOf(5000)));
        foreach (double place in (double[])[0, 0.3, 0.77, 1])
        {
            Assert.Equal(place, axis.PlaceOf(axis.ValueAt(place)), 1e-12);
        }
    }
}
