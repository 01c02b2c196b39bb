using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Stages;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>The interaction against single readings and against the closed forms of a lone tank.</summary>
public sealed class InteractionReaderTests
{
    [Theory]
    [InlineData(600e3, DialMode.Follows)]
    [InlineData(1e6, DialMode.Follows)]
    [InlineData(1e6, DialMode.Locked)]
    [InlineData(1.6e6, DialMode.Follows)]
    public void The_approach_is_the_difference_of_readings_at_its_ends(double dialHz, DialMode mode)
    {
        StageUnderTest stage = StageUnderTest.Default;
        var setting = new Setting(dialHz, 20) { DialMode = mode };
        ApproachToTipOver approach = InteractionReader.Read(stage.Workspace, setting).Approach!.Value;
        Assert.Equal(stage.Read(setting).TipOver!.First!.Value.TravelPercent, approach.ToPercent, 1e-9);
        Assert.Equal(approach.ToPercent - 10, approach.FromPercent, 1e-9);
        Assert.False(approach.FromStop);

        Reading tip = stage.Read(setting with { TravelPercent = approach.ToPercent });
        double farad = tip.TuningFarad!.Value;
        Reading before = stage.Read(setting with
        {
            TravelPercent = approach.FromPercent,
            DialMode = DialMode.Locked,
            LockedFarad = farad,
        });
        Assert.Equal(tip.TankHz!.Value - before.TankHz!.Value, approach.PullHz, 1e-3);
        Assert.InRange(approach.PullHz, -2000, -1);

        // With the capacitor the re-peaking asks for, the tank at the beginning stands where tip-over will be.
        Reading peaked = stage.Read(setting with
        {
            TravelPercent = approach.FromPercent,
            DialMode = DialMode.Locked,
            LockedFarad = farad - approach.RepeakFarad,
        });
        Assert.Equal(tip.TankHz!.Value, peaked.TankHz!.Value, 1e-3);
        Assert.Equal(180 * approach.RepeakFarad / (365e-12 - 12e-12), approach.RepeakDegrees!.Value, 1e-6);   // straight-line capacitance
    }

    [Fact]
    public void A_control_that_tips_over_early_begins_at_its_stop()
    {
        // A small rheostat: nearly all of its travel oscillates.
        var stage = new StageUnderTest(DefaultStage.With("regeneration.potentiometer.total", 1300));
        ApproachToTipOver approach = InteractionReader.Read(stage.Workspace, new Setting(1e6, 0)).Approach!.Value;
        Assert.InRange(approach.ToPercent, 0.01, 10);
        Assert.True(approach.FromStop);
        Assert.Equal(0, approach.FromPercent);
    }

    [Fact]
    public void A_stage_that_never_tips_over_has_no_approach_and_one_above_it_no_station()
    {
        var weak = new StageUnderTest(DefaultStage.With("regeneration.series.value", 100e3));
        Interaction never = InteractionReader.Read(weak.Workspace, new Setting(1e6, 50));
        Assert.Null(never.Approach);
        Assert.NotNull(never.Station);
        Interaction above = InteractionReader.Read(StageUnderTest.Default.Workspace, new Setting(1e6, 100));
        Assert.NotNull(above.Approach);
        Assert.Null(above.Station);
        Assert.Null(above.VernierRatio);
        Interaction beyond = InteractionReader.Read(StageUnderTest.Default.Workspace, new Setting(3e6, 50));
        Assert.Equal("out-of-reach", Assert.Single(beyond.Cautions).Code);
    }

    [Fact]
    public void The_vernier_turns_half_a_degree_into_one_bandwidth()
    {
        StageUnderTest stage = StageUnderTest.Default;
        double travel = stage.Read(1e6, 0).TipOver!.First!.Value.TravelPercent - 0.5;
        Interaction sharp = InteractionReader.Read(stage.Workspace, new Setting(1e6, travel));
        Assert.True(sharp.VernierRatio > 5);
        Assert.Equal(0.5, sharp.VernierRatio!.Value * sharp.BandwidthDialDegrees!.Value, 1e-12);
        Assert.Equal(stage.Read(1e6, travel).BandwidthDialDegrees, sharp.BandwidthDialDegrees);
        Assert.Equal(1, InteractionReader.Read(stage.Workspace, new Setting(1e6, 0)).VernierRatio);
    }

    /// <summary>
    /// The universal resonance curve [Terman 1943]: with a = 2 Q df/f0 the response is 1/sqrt(1 + a^2), so that a station half a
    /// bandwidth beside the tank (a = 1) loses 3.01 dB and its sidebands at the same distance stand at a = 2 and a = 0:
    /// 10 lg 5 = 6.99 dB apart.
    /// </summary>
    [Fact]
    public void A_station_on_the_slope_follows_the_universal_resonance_curve()
    {
        StageUnderTest stage = StageUnderTest.Default;
        var setting = new Setting(1e6, stage.Read(1e6, 0).TipOver!.First!.Value.TravelPercent - 2);
        double half = stage.Read(setting).BandwidthHz!.Value / 2;
        StationFit fit = InteractionReader.Read(stage.Workspace, setting with { StationHz = 1e6 + half }, [half]).Station!;
        Assert.Equal(half, fit.OffsetHz, 1e-3);
        Assert.Equal(-3.01, fit.CarrierLossDb, 0.05);
        Assert.Equal(-6.99, Assert.Single(fit.Audio).AsymmetryDb, 0.1);
        Assert.True(fit.Audio[0].SecondHarmonicPercent > 1);
        StationFit onTune = InteractionReader.Read(stage.Workspace, setting, [half]).Station!;
        Assert.Equal(0, onTune.CarrierLossDb, 1e-9);
        Assert.InRange(Math.Abs(onTune.Audio[0].AsymmetryDb), 0, 0.1);
        Assert.InRange(onTune.Audio[0].SecondHarmonicPercent, 0, 0.2);
    }

    [Fact]
    public void The_audio_curve_passes_through_the_sidebands_of_a_reading()
    {
        StageUnderTest stage = StageUnderTest.Default;
        IReadOnlyList<double> audio = StageReader.SpacedByRatio(50, 10e3, 60);
        Assert.Equal((50.0, 10e3, 60), (audio[0], audio[^1], audio.Count));
        Assert.All(audio.Zip(audio.Skip(1)), pair => Assert.Equal(Math.Pow(200, 1 / 59.0), pair.Second / pair.First, 1e-12));
        IReadOnlyList<Sideband> curve = StageReader.AudioCurve(stage.Workspace, new Setting(1e6, 50), audio);
        Assert.Equal(stage.Read(new Setting(1e6, 50), [.. audio]).Sidebands, curve);
        Assert.Empty(StageReader.AudioCurve(stage.Workspace, new Setting(1e6, 100), audio));
    }
}
