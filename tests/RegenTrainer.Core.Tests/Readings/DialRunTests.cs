using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>The dial point by point, its dead spots and the ends of its reach.</summary>
public sealed class DialRunTests
{
    private static readonly double[] _dial = [530e3, 800e3, 1.2e6, 1.7e6];

    [Fact]
    public void Points_do_not_depend_on_what_was_asked_before_or_on_the_thread()
    {
        StageModel model = StageUnderTest.Default.Model;
        (Grade Grade, double Hz)[] places =
            [.. Enum.GetValues<Grade>().SelectMany(g => _dial.Select(hz => (g, hz)))];
        DialPoint At(StageWorkspace ws, (Grade Grade, double Hz) place) => DialRun.At(ws, new Setting(place.Hz, 45) { Grade = place.Grade });
        DialPoint[] alone = [.. places.Select(p => At(new StageWorkspace(model), p))];
        var one = new StageWorkspace(model);
        DialPoint[] backwards = [.. places.Reverse().Select(p => At(one, p)).Reverse()];
        DialPoint[] together = [.. places.AsParallel().AsOrdered().WithDegreeOfParallelism(2).Select(p => At(new StageWorkspace(model), p))];
        for (int k = 0; k < places.Length; k++)
        {
            foreach (DialPoint other in new[] { backwards[k], together[k] })
            {
                DefaultStageTests.AssertSame(alone[k].TuningFarad, other.TuningFarad);
                DefaultStageTests.AssertSame(alone[k].EffectiveQ, other.EffectiveQ, 1e-7);
                DefaultStageTests.AssertSame(alone[k].TipOver?.First?.TravelPercent, other.TipOver?.First?.TravelPercent);
            }
        }
    }

    [Theory]
    [InlineData(DialMode.Follows)]
    [InlineData(DialMode.Locked)]
    public void The_reach_ends_where_points_stop_being_reachable(DialMode mode)
    {
        StageUnderTest stage = StageUnderTest.Default;
        var setting = new Setting(1e6, 50) { DialMode = mode };
        (double? low, double? high) = DialRun.Reach(stage.Workspace, setting);
        foreach ((double hz, bool inside) in new[] { (low!.Value * 1.0001, true), (low.Value / 1.0001, false), (high!.Value / 1.0001, true), (high.Value * 1.0001, false) })
        {
            DialPoint point = DialRun.At(stage.Workspace, setting with { DialHz = hz });
            Assert.Equal(inside, point.Reachable);
            Assert.Equal(inside ? null : DeadSpotReason.OutOfReach, point.Dead);
        }
    }

    [Fact]
    public void A_sound_stage_has_no_dead_spots_but_those_beyond_its_capacitor()
    {
        IReadOnlyList<DeadSpot> spots = Spots(DefaultStage.Design, new Setting(1e6, 50));
        Assert.All(spots, s => Assert.Equal(DeadSpotReason.OutOfReach, s.Reason));
        DeadSpot only = Assert.Single(spots);
        Assert.Equal(2e6, only.ToHz);
        Assert.InRange(only.FromHz, 1.7e6, 2e6);
    }

    [Fact]
    public void A_stage_that_cannot_regenerate_is_dead_along_the_dial() =>
        Assert.Equal(
            DeadSpotReason.NeverTipsOver,
            Spots(DefaultStage.With("regeneration.series.value", 100e3), new Setting(1e6, 50))[0].Reason);

    [Fact]
    public void An_end_resistance_too_large_leaves_tip_over_beyond_the_travel() =>
        Assert.Equal(
            DeadSpotReason.TipsOverBeyondTravel,
            Spots(DefaultStage.With("regeneration.potentiometer.end", 3e3), new Setting(1e6, 50))[0].Reason);

    [Fact]
    public void A_control_too_small_to_stop_the_stage_always_oscillates() =>
        Assert.Equal(
            DeadSpotReason.AlwaysOscillates,
            Spots(DefaultStage.With("regeneration.potentiometer.total", 150).With("regeneration.potentiometer.end", FieldValue.Of(1)), new Setting(1e6, 50))[^2].Reason);

    [Fact]
    public void Neighbours_of_one_reason_are_one_spot_and_others_stand_apart()
    {
        DialPoint Point(double hz, DeadSpotReason? dead) => new(hz, Reachable: true) { Dead = dead };
        Assert.Equal(
            [new DeadSpot(1, 2, DeadSpotReason.NeverTipsOver), new DeadSpot(3, 3, DeadSpotReason.AlwaysOscillates), new DeadSpot(5, 6, DeadSpotReason.AlwaysOscillates)],
            DeadSpot.Along(
            [
                Point(1, DeadSpotReason.NeverTipsOver), Point(2, DeadSpotReason.NeverTipsOver), Point(3, DeadSpotReason.AlwaysOscillates),
                Point(4, null), Point(5, DeadSpotReason.AlwaysOscillates), Point(6, DeadSpotReason.AlwaysOscillates),
            ]));
        Assert.Empty(DeadSpot.Along([]));
    }

    private static IReadOnlyList<DeadSpot> Spots(StageDesign design, Setting setting)
    {
        var ws = new StageWorkspace(StageModel.Compile(design));
        return DeadSpot.Along([.. Enumerable.Range(0, 15).Select(k => DialRun.At(ws, setting with { DialHz = 600e3 + (k * 100e3) }))]);
    }
}
