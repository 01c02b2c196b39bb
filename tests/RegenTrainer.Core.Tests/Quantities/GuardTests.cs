using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Tests.Quantities;

public class GuardTests
{
    [Theory]
    [InlineData(0.0)]
    [InlineData(0.5)]
    [InlineData(1.0)]
    public void The_ends_of_an_interval_belong_to_it(double value)
    {
        Assert.Equal(value, Guard.InRange(value, 0.0, 1.0, "coupling"));
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void What_is_not_finite_never_passes(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.Finite(value, "x"));
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.Positive(value, "x"));
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.NotNegative(value, "x"));
        Assert.Throws<ArgumentOutOfRangeException>(() =>
            Guard.InRange(value, double.NegativeInfinity, double.PositiveInfinity, "x"));
    }

    [Fact]
    public void The_message_gives_name_value_and_allowed_interval()
    {
        ArgumentOutOfRangeException thrown =
            Assert.Throws<ArgumentOutOfRangeException>(() => Guard.InRange(1.5, 0.0, 1.0, "coupling"));
        Assert.Equal("coupling", thrown.ParamName);
        Assert.StartsWith("coupling is 1.5; it must be from 0 to 1.", thrown.Message, StringComparison.Ordinal);
        thrown = Assert.Throws<ArgumentOutOfRangeException>(() => Guard.InRange(7, 1, 5, "windings"));
        Assert.StartsWith("windings is 7; it must be from 1 to 5.", thrown.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Zero_is_not_negative_and_not_positive()
    {
        Assert.Equal(0.0, Guard.NotNegative(0.0, "x"));
        Assert.Equal(0, Guard.NotNegative(0, "n"));
        Assert.Equal(2, Guard.Positive(2, "n"));
        Assert.Equal(1e-300, Guard.Positive(1e-300, "x"));
        Assert.Equal(-3.0, Guard.Finite(-3.0, "x"));
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.Positive(0.0, "x"));
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.Positive(0, "n"));
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.NotNegative(-1, "n"));
        Assert.Throws<ArgumentOutOfRangeException>(() => Guard.NotNegative(-1e-300, "x"));
    }

    [Theory]
    [InlineData("coil-too-short")]
    [InlineData("a1")]
    public void Caution_codes_are_lower_case_with_hyphens(string code)
    {
        Caution caution = new(code, "The coil is shorter than the formula was checked for.");
        Assert.Equal(code, caution.Code);
        Assert.Equal(new Caution(code, "The coil is shorter than the formula was checked for."), caution);
    }

    [Theory]
    [InlineData("", "text")]
    [InlineData("Coil", "text")]
    [InlineData("-coil", "text")]
    [InlineData("coil-", "text")]
    [InlineData("coil--short", "text")]
    [InlineData("coil short", "text")]
    [InlineData("1coil", "text")]
    [InlineData("coil", " ")]
    public void Other_codes_and_blank_texts_are_refused(string code, string text)
    {
        Assert.Throws<ArgumentException>(() => new Caution(code, text));
    }
}
