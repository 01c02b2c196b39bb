using RegenTrainer.Core.Controls;

namespace RegenTrainer.Core.Tests.Controls;

public class PotentiometerTests
{
    private static readonly (double, double)[] _measured = [(0, 0), (20, 3), (55, 21.5), (80, 60), (100, 100)];

    // Trade convention: the percentage in the name of a logarithmic track is its resistance at mid rotation; a 10 % track of 10 kohm
    // has 1 kohm there from the counter-clockwise end, so that 9 kohm remain to the clockwise end.
    [Theory]
    [InlineData(Taper.Linear, 10, 5000)]
    [InlineData(Taper.Logarithmic, 10, 9000)]
    [InlineData(Taper.Logarithmic, 15, 8500)]
    [InlineData(Taper.Logarithmic, 20, 8000)]
    [InlineData(Taper.ReverseLogarithmic, 10, 1000)]
    [InlineData(Taper.ReverseLogarithmic, 15, 1500)]
    public void Percentage_of_the_track_is_its_share_at_mid_rotation(Taper taper, double percent, double ohm)
    {
        Assert.Equal(ohm, new Potentiometer(10e3, taper, percent).ValueAt(50), 1e-6);
    }

    [Fact]
    public void Reverse_logarithmic_track_is_the_logarithmic_one_seen_from_its_other_end()
    {
        Potentiometer plain = new(10e3, Taper.Logarithmic, 15), reverse = new(10e3, Taper.ReverseLogarithmic, 15);
        for (int travel = 0; travel <= 100; travel++)
        {
            Assert.Equal(10e3, plain.ValueAt(travel) + reverse.ValueAt(100 - travel), 1e-6);
        }
    }

    [Theory]
    [MemberData(nameof(Every))]
    public void Resistance_falls_with_travel_between_its_ends(Potentiometer control)
    {
        Assert.Equal(control.ValueAtStart, control.ValueAt(0));
        Assert.Equal(control.ValueAtEnd, control.ValueAt(100), control.ValueAtStart * 1e-14);
        double before = control.ValueAtStart, dead = DeadPercent(control);
        for (int k = 1; k <= 1000; k++)
        {
            double value = control.ValueAt(k / 10.0);
            Assert.InRange(value, control.ValueAtEnd, before);
            Assert.True(value < before || k / 10.0 <= dead || (k - 1) / 10.0 >= 100 - dead, $"no change at {k / 10.0} %");
            before = value;
        }
    }

    // 270 of 300 degrees turn the resistance: 15 degrees, 5 %, are dead at each stop.
    [Fact]
    public void Dead_ends_hold_their_value()
    {
        Potentiometer control = new(10e3, endOhm: 50);
        Assert.Equal(10e3, control.ValueAt(4.999));
        Assert.True(control.ValueAt(5.01) < 10e3);
        Assert.True(control.ValueAt(94.99) > 50);
        Assert.Equal(50, control.ValueAt(95.001), 1e-9);
        Assert.Equal(50, control.ValueAt(100), 1e-9);
        Assert.Equal(5025, control.ValueAt(50), 1e-6);
    }

    // 10 kohm across 10 kohm is 5 kohm, across 5 kohm 3.33 kohm.
    [Fact]
    public void Shunt_lies_across_the_rheostat()
    {
        Potentiometer control = new(10e3, shuntOhm: 10e3);
        Assert.Equal(5e3, control.ValueAtStart, 1e-9);
        Assert.Equal(3333.333, control.ValueAt(50), 1e-3);
        Assert.Equal(0, control.ValueAtEnd);
        Assert.Null(control.TravelAt(6e3));
    }

    // 55 % of the electrical angle is 5 % + 0.55 x 90 % = 54.5 % of the travel; 21.5 % of 10 kohm lie behind the wiper, 7.85 kohm before.
    [Fact]
    public void Measured_track_goes_through_its_points()
    {
        Potentiometer control = new(10e3, Taper.Table, table: _measured);
        Assert.Equal(7850, control.ValueAt(54.5), 1e-6);
        Assert.Equal(4000, control.ValueAt(77), 1e-6);
        Assert.Equal([5.0, 23.0, 54.5, 77.0, 95.0], control.KinkTravels.Select(t => Math.Round(t, 9)));
    }

    [Fact]
    public void Kinks_are_where_the_slope_jumps()
    {
        Assert.Equal([5.0, 95.0], new Potentiometer(10e3).KinkTravels.Select(t => Math.Round(t, 9)));
        Assert.Equal([5.0, 50.0, 95.0], new Potentiometer(10e3, Taper.Logarithmic).KinkTravels.Select(t => Math.Round(t, 9)));
        Assert.Equal([10.0, 50.0, 90.0], new Potentiometer(1e3, Taper.ReverseLogarithmic, electricalDegrees: 240).KinkTravels.Select(t => Math.Round(t, 9)));
        Potentiometer bent = new(10e3, Taper.Table, table: _measured);
        foreach (double kink in bent.KinkTravels)
        {
            double before = bent.ValueAt(kink) - bent.ValueAt(kink - 0.5), after = bent.ValueAt(kink + 0.5) - bent.ValueAt(kink);
            Assert.True(Math.Abs(after - before) > 1, $"{kink} %: {before} and {after} ohm per half percent");
        }
    }

    [Theory]
    [MemberData(nameof(Every))]
    public void Travel_at_a_value_is_where_the_value_was_read(Potentiometer control)
    {
        double dead = DeadPercent(control);
        for (int k = 0; k <= 1000; k++)
        {
            double travel = k / 10.0, value = control.ValueAt(travel);
            double? back = control.TravelAt(value);
            Assert.True(back is >= 0 and <= 100, $"{travel} % reads {value} ohm, which lies at {back} %");
            Assert.Equal(value, control.ValueAt(back.Value), 1e-9 * control.ValueAtStart);

            // A shunt far below the track hides digits of its far end.
            double hidden = control.ShuntOhm is { } shunt ? control.TotalOhm / shunt : 1;
            Assert.Equal(Math.Clamp(travel, dead, 100 - dead), back.Value, 1e-9 * (1 + hidden) * (1 + hidden));
        }
    }

    // Both stops must be in reach whatever the roundings of their resistances and angles.
    [Fact]
    public void Stops_are_always_in_reach()
    {
        for (int k = 1; k <= 20000; k++)
        {
            double odd = Math.Sqrt(k);
            Potentiometer control = new(100 * odd, Taper.Logarithmic, 15, odd / 7, 100 + odd, 100 + odd, k % 2 == 0 ? 1000 / odd : null);
            foreach (double travel in (double[])[0, 100])
            {
                double? back = control.TravelAt(control.ValueAt(travel));
                Assert.True(back is >= 0 and <= 100, $"case {k}: {travel} % went to {back}");
            }

            Assert.All(control.KinkTravels, t => Assert.InRange(t, 0, 100));
        }
    }

    [Theory]
    [MemberData(nameof(Every))]
    public void Values_out_of_reach_have_no_travel(Potentiometer control)
    {
        Assert.Null(control.TravelAt(control.ValueAtStart * 1.0001));
        Assert.Null(control.TravelAt(control.ValueAtEnd - (1e-3 * control.ValueAtStart)));
        Assert.Null(control.TravelAt(double.NaN));
        Assert.Null(control.TravelAt(double.PositiveInfinity));
    }

    [Theory]
    [InlineData(-0.001)]
    [InlineData(100.001)]
    [InlineData(double.NaN)]
    public void Travel_beyond_the_stops_is_refused(double travel)
    {
        ArgumentOutOfRangeException refusal = Assert.Throws<ArgumentOutOfRangeException>(() => new Potentiometer(10e3).ValueAt(travel));
        Assert.Contains("from 0 to 100", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Angles_count_from_the_idle_stop()
    {
        Potentiometer control = new(10e3, mechanicalDegrees: 280, electricalDegrees: 250);
        Assert.Equal((0.0, 140.0, 280.0), (control.DegreesAt(0), control.DegreesAt(50), control.DegreesAt(100)));
    }

    [Theory]
    [InlineData(0, 15, 0, 300, 270, null, "totalOhm", "above 0")]
    [InlineData(double.NaN, 15, 0, 300, 270, null, "totalOhm", "above 0")]
    [InlineData(10e3, 0.5, 0, 300, 270, null, "midPercent", "from 1 to 49")]
    [InlineData(10e3, 50, 0, 300, 270, null, "midPercent", "from 1 to 49")]
    [InlineData(10e3, 15, -1, 300, 270, null, "endOhm", "from 0 to 9999.99")]
    [InlineData(10e3, 15, 10e3, 300, 270, null, "endOhm", "from 0 to 9999.99")]
    [InlineData(10e3, 15, 0, 0.5, 0.5, null, "mechanicalDegrees", "from 1 to 3600")]
    [InlineData(10e3, 15, 0, 3601, 270, null, "mechanicalDegrees", "from 1 to 3600")]
    [InlineData(10e3, 15, 0, 300, 301, null, "electricalDegrees", "from 1 to 300")]
    [InlineData(10e3, 15, 0, 300, 270, 0.0, "shuntOhm", "above 0")]
    public void Values_out_of_range_are_refused_with_the_range(
        double total, double mid, double end, double mechanical, double electrical, double? shunt, string name, string range)
    {
        ArgumentOutOfRangeException refusal =
            Assert.Throws<ArgumentOutOfRangeException>(() => new Potentiometer(total, Taper.Logarithmic, mid, end, mechanical, electrical, shunt));
        Assert.Equal(name, refusal.ParamName);
        Assert.Contains(range, refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Tables_that_do_not_rise_from_end_to_end_are_refused()
    {
        Refused("from 0 %, 0 % to 100 %, 100 %", null);
        Refused("from 0 %, 0 % to 100 %, 100 %", [(0, 0)]);
        Refused("from 0 %, 0 % to 100 %, 100 %", [(0, 1), (100, 100)]);
        Refused("from 0 %, 0 % to 100 %, 100 %", [(0, 0), (100, 99)]);
        Refused("point 3", [(0, 0), (50, 20), (50, 30), (100, 100)]);
        Refused("point 3", [(0, 0), (50, 20), (60, 20), (100, 100)]);
        Refused("point 2", [(0, 0), (double.NaN, 20), (100, 100)]);
        Refused("point 4", [(0, 0), (20, 20), (double.PositiveInfinity, 30), (100, 100)]);

        static void Refused(string part, (double, double)[]? table)
        {
            ArgumentException refusal = Assert.Throws<ArgumentException>(() => new Potentiometer(10e3, Taper.Table, table: table));
            Assert.Contains(part, refusal.Message, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Equality_looks_at_the_track()
    {
        Potentiometer one = new(10e3, Taper.Table, table: _measured), same = new(10e3, Taper.Table, table: [.. _measured]);
        Assert.Equal(one, same);
        Assert.Equal(one.GetHashCode(), same.GetHashCode());
        Assert.NotEqual(one, new Potentiometer(10e3, Taper.Table, table: [(0, 0), (50, 20), (100, 100)]));
        Assert.NotEqual(new Potentiometer(10e3), new Potentiometer(10e3, shuntOhm: 1e6));
    }

    public static TheoryData<Potentiometer> Every()
    {
        TheoryData<Potentiometer> all = [];
        foreach (double? shunt in (double?[])[null, 1e6, 10e3, 470])
        {
            foreach (double end in (double[])[0, 20.3])
            {
                foreach ((double mechanical, double electrical) in ((double, double)[])[(300, 270), (270.3, 270.3), (281.7, 233.3)])
                {
                    all.Add(new Potentiometer(10e3, Taper.Linear, 15, end, mechanical, electrical, shunt));
                    all.Add(new Potentiometer(10e3, Taper.Logarithmic, 10, end, mechanical, electrical, shunt));
                    all.Add(new Potentiometer(10e3, Taper.ReverseLogarithmic, 15, end, mechanical, electrical, shunt));
                    all.Add(new Potentiometer(10e3, Taper.Table, 15, end, mechanical, electrical, shunt, _measured));
                }
            }
        }

        return all;
    }

    private static double DeadPercent(Potentiometer control) =>
        50 * (control.MechanicalDegrees - control.ElectricalDegrees) / control.MechanicalDegrees;
}
