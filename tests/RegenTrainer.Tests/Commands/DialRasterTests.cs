using RegenTrainer.Commands;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Stages;
using RegenTrainer.Session;

namespace RegenTrainer.Tests.Commands;

public sealed class DialRasterTests
{
    [Theory]
    [InlineData(530e3, 1700e3, 10e3, 118, 1)] // ITU Region 2 medium wave: 118 channels
    [InlineData(531e3, 1602e3, 9e3, 120, 1)] // ITU Regions 1 and 3 medium wave: 120 channels
    public void A_broadcast_band_has_its_channels(double low, double high, double step, int count, int expectedEvery)
    {
        IReadOnlyList<double> points = DialRaster.Points(Dial(low, high, step), 2000, out int every);
        Assert.Equal(count, points.Count);
        Assert.Equal(expectedEvery, every);
        Assert.Equal(low, points[0]);
        Assert.Equal(high, points[^1]);
        Assert.All(points.Zip(points.Skip(1)), pair => Assert.Equal(step, pair.Second - pair.First, 1e-6));
    }

    [Fact]
    public void An_end_off_the_raster_is_still_a_point()
    {
        IReadOnlyList<double> points = DialRaster.Points(Dial(500e3, 525e3, 10e3), 2000, out _);
        Assert.Equal([500e3, 510e3, 520e3, 525e3], points);
    }

    [Fact]
    public void A_raster_of_a_million_points_is_thinned_on_the_raster()
    {
        IReadOnlyList<double> points = DialRaster.Points(Dial(530e3, 1700e3, 1), 2000, out int every);
        Assert.InRange(points.Count, 1000, 2000);
        Assert.True(every > 1);
        Assert.Equal(530e3 + every, points[1]);
        Assert.Equal(1700e3, points[^1]);
    }

    [Theory]
    [InlineData(530e3, 1700e3, 10e3, 950e3)] // geometric mean 949.2 kHz
    [InlineData(531e3, 1602e3, 9e3, 918e3)] // geometric mean 922.3 kHz; 918 and 927 kHz are channels
    [InlineData(1e6, 1.1e6, 1e6, 1e6)]
    public void The_middle_of_the_band_lies_on_the_raster(double low, double high, double step, double middle) =>
        Assert.Equal(middle, SettingOptions.MiddleOfBandHz(Dial(low, high, step)));

    private static Dial Dial(double low, double high, double step) =>
        new(low, high, step, new VariableCapacitor(12e-12, 365e-12, CapacitorLaw.StraightLineCapacitance));
}
