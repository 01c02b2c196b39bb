using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Files.Devices;

namespace RegenTrainer.Session.Tests;

public sealed class LiveStageTests
{
    private static readonly Setting _start = new(1e6, 50);

    [Fact]
    public void Ten_steps_of_half_a_percent_are_five_percent_exactly()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start with { TravelPercent = 12.3 });
        for (int k = 0; k < 10; k++)
        {
            live.TurnControl(500);
        }

        Assert.Equal(17.3, live.Setting.TravelPercent);
        Assert.Equal(17.3, live.Reading.Setting.TravelPercent);
    }

    [Fact]
    public void The_control_stops_at_its_stops_and_is_not_read_again_there()
    {
        var stage = new MadeUpStage((60, true));
        var live = new LiveStage(stage, _start with { TravelPercent = 99.8 });
        live.TurnControl(500);
        int reads = stage.Reads;
        live.TurnControl(500);
        Assert.Equal(100, live.Setting.TravelPercent);
        Assert.Equal(reads, stage.Reads);
        live.SetTravel(-5);
        Assert.Equal(0, live.Setting.TravelPercent);
    }

    /// <summary>The made-up loop gain is travel/60: 0.3 dB below 1 is 10^(-0.3/20) = 0.96605, at 57.963 % of travel.</summary>
    [Theory]
    [InlineData(10)]
    [InlineData(59.99)]
    [InlineData(80)]
    public void Standing_below_tip_over_leaves_three_tenths_of_a_decibel(double from)
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start with { TravelPercent = from });
        live.StandBelowTipOver();
        Assert.Equal(57.96, live.Setting.TravelPercent);
        Assert.InRange(live.Reading.MarginDb!.Value, 0.3, 0.302);
        Assert.Empty(live.Notice);
    }

    [Theory]
    [InlineData(10, 19.32)]   // up at 20 %: 20 x 0.96605
    [InlineData(45, 68.64)]   // oscillates from 20 to 30 %, up again at 70 %: 30 + 40 x 0.96605
    [InlineData(90, 19.32)]   // none ahead: the first
    public void Standing_below_tip_over_takes_the_next_one_upward(double from, double expected)
    {
        var live = new LiveStage(new MadeUpStage((20, true), (30, false), (70, true)), _start with { TravelPercent = from });
        live.StandBelowTipOver();
        Assert.Equal(expected, live.Setting.TravelPercent);
    }

    [Theory]
    [InlineData(TipOverState.Never, "this stage never tips over")]
    [InlineData(TipOverState.Always, "this stage oscillates along the whole travel")]
    public void Without_a_tip_over_there_is_nowhere_to_stand_and_it_says_so(TipOverState state, string notice)
    {
        var live = new LiveStage(new MadeUpStage { WithoutCrossings = state }, _start);
        live.StandBelowTipOver();
        Assert.Equal(50, live.Setting.TravelPercent);
        Assert.Equal(notice, live.Notice);
        live.TurnControl(500);
        Assert.Empty(live.Notice);
    }

    [Fact]
    public void The_station_goes_with_the_dial_until_it_is_moved_and_comes_back()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start);
        live.DialByChannel(up: true);
        Assert.Equal(1010e3, live.Reading.Setting.StationHz);
        live.StationByChannel(up: true);
        live.MoveStationBy(-1000);
        live.TurnDialBy(1000);
        Assert.Equal((1011e3, 1019e3), (live.Setting.DialHz, live.Reading.Setting.StationHz));
        live.StationToDial();
        live.DialByChannel(up: false);
        Assert.Equal((1010e3, 1010e3), (live.Setting.DialHz, live.Reading.Setting.StationHz));
    }

    [Fact]
    public void Locking_holds_the_capacitor_and_unlocking_comes_back_to_the_dial()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start);
        double farad = live.Reading.TuningFarad!.Value;
        live.ToggleLock();
        Assert.Equal((DialMode.Locked, farad), (live.Setting.DialMode, live.Setting.LockedFarad));
        live.DialByChannel(up: true);
        Assert.Equal(100e-12 * Math.Pow(1000.0 / 1010, 2), live.Setting.LockedFarad!.Value, 1e-18);
        live.ToggleLock();
        Assert.Equal((DialMode.Follows, null, 1010e3), (live.Setting.DialMode, live.Setting.LockedFarad, live.Setting.DialHz));
    }

    [Fact]
    public void Out_of_reach_is_an_answer_and_cannot_be_locked()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start with { DialHz = 1500e3 });
        live.DialByChannel(up: true);
        Assert.False(live.Reading.Reachable);
        Assert.Empty(live.Snapshot(10).Curve);
        live.ToggleLock();
        Assert.Equal(DialMode.Follows, live.Setting.DialMode);
        Assert.Contains("cannot be locked", live.Notice, StringComparison.Ordinal);
        live.DialByChannel(up: false);
        Assert.True(live.Reading.Reachable);
    }

    [Fact]
    public void The_dial_ends_somewhere_beyond_the_band()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start with { DialHz = 266e3 });
        live.TurnDialBy(-1000);
        Assert.Equal(265e3, live.Setting.DialHz);
        live.TurnDialBy(-1000);
        Assert.Equal(265e3, live.Setting.DialHz);
        Assert.Equal("the dial ends at 265 kHz", live.Notice);
    }

    [Fact]
    public void A_failed_solve_keeps_the_hands_free()
    {
        var live = new LiveStage(new MadeUpStage((60, true)) { Failure = "no operating point: it did not settle" }, _start);
        live.TurnControl(500);
        live.StandBelowTipOver();
        Assert.Equal("the tip-over is not known here", live.Notice);
        live.DialByChannel(up: true);
        live.StepSupply(up: false);
        Assert.Equal((50.5, 1010e3, 2.9), (live.Setting.TravelPercent, live.Setting.DialHz, live.Setting.SupplyVolt));
        Assert.Empty(live.Snapshot(10).Regimes);
    }

    [Fact]
    public void Grade_goes_round_and_temperature_keeps_its_range()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start with { TemperatureCelsius = 84 });
        Grade[] grades = new Grade[3];
        for (int k = 0; k < 3; k++)
        {
            live.NextGrade();
            grades[k] = live.Setting.Grade;
            live.StepTemperature(up: true);
        }

        Assert.Equal([Grade.Strong, Grade.Weak, Grade.Typical], grades);
        Assert.Equal(85, live.Setting.TemperatureCelsius);
    }

    [Fact]
    public void A_stage_without_supply_or_device_says_so()
    {
        var live = new LiveStage(new MadeUpStage((60, true)) { SupplyVolt = null, Device = null }, _start);
        live.StepSupply(up: true);
        Assert.Equal("this stage has no supply", live.Notice);
        live.NextGrade();
        Assert.Equal("this stage has no device that comes in grades", live.Notice);
        Assert.Equal(_start, live.Setting);
    }

    [Fact]
    public void What_the_stage_does_along_the_travel_is_computed_once_while_only_the_control_turns()
    {
        var stage = new MadeUpStage((60, true));
        var live = new LiveStage(stage, _start);
        for (int k = 0; k < 5; k++)
        {
            live.TurnControl(500);
            live.Snapshot(10);
        }

        Assert.Equal(1, stage.RegimeRuns);
        live.StepSupply(up: false);
        live.Snapshot(10);
        Assert.Equal(2, stage.RegimeRuns);
    }

    [Fact]
    public void The_curve_runs_twenty_kilohertz_to_either_side_of_the_station_and_holds_the_tank_itself()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start with { StationHz = 1003e3 });
        double[] hz = [.. live.Snapshot(8).Curve.Select(point => point.FrequencyHz)];
        Assert.Equal((983e3, 1023e3), (hz[0], hz[^1]));
        Assert.Contains(1000e3, hz);
        Assert.Equal(hz.Order(), hz);
    }

    [Fact]
    public void Another_stage_comes_under_hands_that_stay()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start with { TravelPercent = 55, SupplyVolt = 2.4, Grade = Grade.Weak });
        Setting hands = live.Setting;
        StageSnapshot before = live.Snapshot(11);
        var other = new MadeUpStage((70, true)) { Title = "Other" };
        live.Replace(other);
        Assert.Same(other, live.Solver);
        Assert.Equal(hands, live.Setting);
        StageSnapshot after = live.Snapshot(11);
        Assert.Equal("Other", after.Title);
        Assert.NotEqual(before.Regimes, after.Regimes);
        Assert.Equal(70, live.Reading.TipOver!.Crossings[0].TravelPercent);
    }

    [Fact]
    public void A_dial_another_stage_does_not_reach_stays_and_the_reading_says_so()
    {
        var live = new LiveStage(new MadeUpStage((60, true)), _start);
        live.Replace(new MadeUpStage((60, true)), live.Setting with { DialHz = 1600e3 });
        Assert.Equal(1600e3, live.Setting.DialHz);
        Assert.False(live.Reading.Reachable);
    }

    [Fact]
    public void What_does_not_suit_another_stage_is_let_go()
    {
        var npn = new StageSolver(StageModel.Compile(Presets.Read("tapped-coil-npn")), [1000]);
        var pnp = new StageSolver(StageModel.Compile(Presets.Read("tapped-coil-pnp")), [1000]);
        var plain = new StageSolver(StageModel.Compile(Presets.Read("plain-tank")), [1000]);
        var device = (BipolarModel)DeviceShelf.Shipped.Find("2N4401")!.Model!;
        var live = new LiveStage(npn, _start with { Device = device, SupplyVolt = 2.4 });
        Assert.Equal("2N4401", live.Reading.Setting.Device);
        live.Replace(pnp);
        Assert.Equal((null, 2.4), (live.Setting.Device, live.Setting.SupplyVolt));
        Assert.Equal("BC557B", live.Reading.Setting.Device);
        live.Replace(plain);
        Assert.Null(live.Setting.SupplyVolt);
    }

    [Fact]
    public void A_locked_capacitor_stays_where_it_is_under_another_stage()
    {
        var live = new LiveStage(new StageSolver(StageModel.Compile(Presets.Read(Presets.Default)), [1000]), _start);
        live.ToggleLock();
        double farad = live.Reading.TuningFarad!.Value;
        StageDesign fewer = Presets.Read(Presets.Default).With("coil.turns", FieldValue.Of(80));
        live.Replace(new StageSolver(StageModel.Compile(fewer), [1000]));
        Assert.Equal(farad, live.Reading.TuningFarad!.Value, farad * 1e-9);
        Assert.Equal(_start.DialHz, live.Setting.DialHz);
        Assert.True(live.Reading.TankHz > 1.01e6);   // fewer turns tune higher
    }
}
