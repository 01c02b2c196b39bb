using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Devices;

public class DeviceFigureTests
{
    [Theory]
    [InlineData(null, 0.0, null, null, "typical")]
    [InlineData(null, -1.0, null, null, "typical")]
    [InlineData(null, double.NaN, null, null, "typical")]
    [InlineData(11.0, 10.0, null, null, "minimum")]
    [InlineData(0.0, 10.0, null, null, "minimum")]
    [InlineData(null, 10.0, 9.0, null, "maximum")]
    [InlineData(null, 10.0, double.PositiveInfinity, null, "maximum")]
    [InlineData(null, 10.0, null, 0.0, "at")]
    public void Figures_out_of_order_are_refused_by_name(double? minimum, double typical, double? maximum, double? at, string name)
    {
        ArgumentOutOfRangeException refusal =
            Assert.Throws<ArgumentOutOfRangeException>(() => new DeviceFigure(minimum, typical, maximum, at, KnownBy.Print, "sheet"));
        Assert.Equal(name, refusal.ParamName);
    }

    // A weak device has the most base resistance and the least of everything that helps.
    [Fact]
    public void Grades_take_the_end_that_helps_or_hinders_regeneration()
    {
        Assert.Equal(200, SheetTypes.Bc547b.BaseOhm(Grade.Weak));
        Assert.Equal(120, SheetTypes.Bc547b.BaseOhm(Grade.Typical));
        Assert.Equal(60, SheetTypes.Bc547b.BaseOhm(Grade.Strong));
        Assert.Equal(50, SheetTypes.Textbook.BaseOhm(Grade.Weak));
        Assert.Equal(50, SheetTypes.Textbook.BaseOhm(Grade.Strong));
    }

    [Fact]
    public void Equal_figures_are_equal()
    {
        DeviceFigure one = new(1, 2, 3, 4, KnownBy.Print, "sheet");
        Assert.Equal(one, new DeviceFigure(1, 2, 3, 4, KnownBy.Print, "sheet"));
        Assert.NotEqual(one, new DeviceFigure(1, 2, 3, 5, KnownBy.Print, "sheet"));
    }
}
