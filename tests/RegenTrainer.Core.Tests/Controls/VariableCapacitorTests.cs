using RegenTrainer.Core.Controls;

namespace RegenTrainer.Core.Tests.Controls;

public class VariableCapacitorTests
{
    private static readonly (double, double)[] _measured = [(0, 12e-12), (30, 20e-12), (90, 95e-12), (150, 260e-12), (178.5, 365e-12)];

    [Theory]
    [MemberData(nameof(Every))]
    public void Capacitance_rises_from_the_open_to_the_closed_stop(VariableCapacitor capacitor)
    {
        Assert.Equal(12, 1e12 * capacitor.FaradAt(0), 1e-9);
        Assert.Equal(365, 1e12 * capacitor.FaradAt(capacitor.RotationDegrees), 1e-9);
        double before = 0;
        for (int k = 0; k <= 500; k++)
        {
            double farad = capacitor.FaradAt(capacitor.RotationDegrees * (k / 500.0));
            Assert.True(farad > before, $"{capacitor.Law} at {k / 5.0} %");
            before = farad;
        }
    }

    [Theory]
    [MemberData(nameof(Every))]
    public void Angle_at_a_capacitance_is_where_the_capacitance_was_read(VariableCapacitor capacitor)
    {
        for (int k = 0; k <= 500; k++)
        {
            double degrees = capacitor.RotationDegrees * (k / 500.0), farad = capacitor.FaradAt(degrees);
            double? back = capacitor.DegreesAt(farad);
            Assert.True(back is not null, $"{capacitor.Law}: {farad} at {degrees} degrees is out of reach");
            Assert.Equal(degrees, back.Value, 1e-9);
            Assert.Equal(farad, capacitor.FaradAt(back.Value), 1e-22);
        }
    }

    // Both stops must be in reach whatever the roundings of capacitances, roots and angles.
    [Theory]
    [InlineData(CapacitorLaw.StraightLineCapacitance)]
    [InlineData(CapacitorLaw.StraightLineWavelength)]
    [InlineData(CapacitorLaw.StraightLineFrequency)]
    public void Stops_are_always_in_reach(CapacitorLaw law)
    {
        for (int k = 1; k <= 5000; k++)
        {
            double odd = Math.Sqrt(k) * 1e-12;
            VariableCapacitor capacitor = new(odd, (300e-12 / 7) + (2 * odd), law, rotationDegrees: 100 + Math.Cbrt(k));
            double? open = capacitor.DegreesAt(capacitor.FaradAt(0)), closed = capacitor.DegreesAt(capacitor.FaradAt(capacitor.RotationDegrees));
            Assert.True(open is not null && closed is not null, $"case {k}: {open} and {closed}");
            Assert.Equal(capacitor.MinimumFarad, capacitor.FaradAt(open.Value), 1e-22);
            Assert.Equal(capacitor.MaximumFarad, capacitor.FaradAt(capacitor.DegreesAt(capacitor.MaximumFarad)!.Value), 1e-22);
        }
    }

    [Theory]
    [MemberData(nameof(Every))]
    public void Slope_is_the_difference_quotient(VariableCapacitor capacitor)
    {
        const double h = 1e-3;
        for (double degrees = 0.7; degrees < capacitor.RotationDegrees - 1; degrees += 7.13)
        {
            double measured = (capacitor.FaradAt(degrees + h) - capacitor.FaradAt(degrees - h)) / (2 * h);
            Assert.Equal(1, capacitor.FaradPerDegreeAt(degrees) / measured, 1e-7);
        }
    }

    // Thomson's formula: with 200 µH, 12 pF tune to 3248.74 kHz and 365 pF to 589.05 kHz; a straight-line-frequency capacitor
    // has the mean of both at mid rotation, and equal steps all the way.
    [Fact]
    public void Straight_line_frequency_gives_equal_steps_of_frequency()
    {
        VariableCapacitor capacitor = Of(CapacitorLaw.StraightLineFrequency);
        Assert.Equal(3248.74, Kilohertz(0), 0.01);
        Assert.Equal(589.05, Kilohertz(180), 0.01);
        for (int k = 0; k <= 180; k++)
        {
            Assert.Equal(3248.740 - (k * (3248.740 - 589.054) / 180), Kilohertz(k), 0.01);
        }

        double Kilohertz(double degrees) => 1e-3 / (2 * Math.PI * Math.Sqrt(200e-6 * capacitor.FaradAt(degrees)));
    }

    [Fact]
    public void Straight_line_wavelength_gives_equal_steps_of_wavelength()
    {
        VariableCapacitor capacitor = Of(CapacitorLaw.StraightLineWavelength);
        double first = Period(1) - Period(0);
        for (int k = 1; k < 180; k++)
        {
            Assert.Equal(1, (Period(k + 1) - Period(k)) / first, 1e-9);
        }

        double Period(double degrees) => 2 * Math.PI * Math.Sqrt(200e-6 * capacitor.FaradAt(degrees));
    }

    // Half of 12 pF and 365 pF together.
    [Fact]
    public void Straight_line_capacitance_has_the_mean_at_mid_rotation()
    {
        Assert.Equal(188.5, 1e12 * Of(CapacitorLaw.StraightLineCapacitance).FaradAt(90), 1e-9);
    }

    // Midway from 20 pF at 30 degrees to 95 pF at 90 degrees; the slope there is 75 pF over 60 degrees.
    [Fact]
    public void Measured_capacitor_goes_through_its_points()
    {
        VariableCapacitor capacitor = Of(CapacitorLaw.Table);
        Assert.Equal(178.5, capacitor.RotationDegrees);
        Assert.Equal(95, 1e12 * capacitor.FaradAt(90), 1e-9);
        Assert.Equal(57.5, 1e12 * capacitor.FaradAt(60), 1e-9);
        Assert.Equal(1.25, 1e12 * capacitor.FaradPerDegreeAt(60), 1e-9);
        Assert.Equal(1.25, 1e12 * capacitor.FaradPerDegreeAt(90), 1e-9);
    }

    [Theory]
    [InlineData(11.99e-12)]
    [InlineData(365.1e-12)]
    [InlineData(double.NaN)]
    [InlineData(-1)]
    public void Capacitances_out_of_reach_have_no_angle(double farad)
    {
        foreach (CapacitorLaw law in Enum.GetValues<CapacitorLaw>())
        {
            Assert.Null(Of(law).DegreesAt(farad));
        }
    }

    [Theory]
    [InlineData(0, 365e-12, null, 180, "minimumFarad", "above 0")]
    [InlineData(double.NaN, 365e-12, null, 180, "minimumFarad", "above 0")]
    [InlineData(365e-12, 365e-12, null, 180, "maximumFarad", "from 3.65")]
    [InlineData(12e-12, double.PositiveInfinity, null, 180, "maximumFarad", "from 1.2")]
    [InlineData(12e-12, 365e-12, 0.0, 180, "q", "above 0")]
    [InlineData(12e-12, 365e-12, null, 0.9, "rotationDegrees", "from 1 to 3600")]
    [InlineData(12e-12, 365e-12, null, 3601, "rotationDegrees", "from 1 to 3600")]
    public void Values_out_of_range_are_refused_with_the_range(double minimum, double maximum, double? q, double degrees, string name, string range)
    {
        ArgumentOutOfRangeException refusal =
            Assert.Throws<ArgumentOutOfRangeException>(() => new VariableCapacitor(minimum, maximum, q: q, rotationDegrees: degrees));
        Assert.Equal(name, refusal.ParamName);
        Assert.Contains(range, refusal.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(180.1)]
    [InlineData(double.NaN)]
    public void Angles_beyond_the_stops_are_refused(double degrees)
    {
        VariableCapacitor capacitor = Of(CapacitorLaw.StraightLineFrequency);
        Assert.Contains("from 0 to 180", Assert.Throws<ArgumentOutOfRangeException>(() => capacitor.FaradAt(degrees)).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentOutOfRangeException>(() => capacitor.FaradPerDegreeAt(degrees));
    }

    [Fact]
    public void Tables_that_do_not_rise_from_end_to_end_are_refused()
    {
        Refused("from 0 degrees", null);
        Refused("from 0 degrees", [(0, 12e-12)]);
        Refused("from 0 degrees", [(1, 12e-12), (180, 365e-12)]);
        Refused("from 0 degrees", [(0, 12e-12), (180, 360e-12)]);
        Refused("point 3", [(0, 12e-12), (90, 100e-12), (90, 110e-12), (180, 365e-12)]);
        Refused("point 3", [(0, 12e-12), (90, 100e-12), (100, 90e-12), (180, 365e-12)]);
        Refused("point 2", [(0, 12e-12), (90, double.NaN), (180, 365e-12)]);
        Refused("from 1 to 3600", [(0, 12e-12), (double.PositiveInfinity, 365e-12)]);

        static void Refused(string part, (double, double)[]? table)
        {
            ArgumentException refusal = Assert.ThrowsAny<ArgumentException>(() => new VariableCapacitor(12e-12, 365e-12, CapacitorLaw.Table, table: table));
            Assert.Contains(part, refusal.Message, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Equality_looks_at_the_table()
    {
        VariableCapacitor one = Of(CapacitorLaw.Table), same = new(12e-12, 365e-12, CapacitorLaw.Table, table: [.. _measured]);
        Assert.Equal(one, same);
        Assert.Equal(one.GetHashCode(), same.GetHashCode());
        Assert.NotEqual(one, new VariableCapacitor(12e-12, 365e-12, CapacitorLaw.Table, table: [(0, 12e-12), (178.5, 365e-12)]));
        Assert.NotEqual(Of(CapacitorLaw.StraightLineFrequency), new VariableCapacitor(12e-12, 365e-12, CapacitorLaw.StraightLineFrequency, 800));
    }

    public static TheoryData<VariableCapacitor> Every() => [.. Enum.GetValues<CapacitorLaw>().Select(Of)];

    private static VariableCapacitor Of(CapacitorLaw law) => new(12e-12, 365e-12, law, table: law == CapacitorLaw.Table ? _measured : null);
}
