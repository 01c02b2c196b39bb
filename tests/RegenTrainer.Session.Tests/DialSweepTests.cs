using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;

namespace RegenTrainer.Session.Tests;

public sealed class DialSweepTests
{
    private static readonly TimeSpan _patience = TimeSpan.FromSeconds(20);

    [Fact]
    public void A_run_has_both_ends_of_the_band_and_every_grade()
    {
        DialCurves curves = DialSweep.Run(new(new MadeUpStage((60, true)), new Setting(1e6, 40)));
        Assert.Equal([Grade.Weak, Grade.Typical, Grade.Strong], curves.Curves.Select(c => c.Grade));
        Assert.All(curves.Curves, curve =>
        {
            Assert.InRange(curve.Points.Count, 50, DialSweep.MostPoints);
            Assert.Equal((530e3, 1700e3), (curve.Points[0].DialHz, curve.Points[^1].DialHz));
            Assert.Equal(curve.Points.Select(p => p.DialHz).Order(), curve.Points.Select(p => p.DialHz));
        });
    }

    [Fact]
    public void A_stage_without_a_device_has_one_curve() =>
        Assert.Equal(Grade.Typical, Assert.Single(DialSweep.Run(new(new MadeUpStage((60, true)) { Device = null }, new Setting(1e6, 40))).Curves).Grade);

    // A property: the figures under the cursor are those of a reading with the hands there.
    [Fact]
    public void Points_equal_readings_there()
    {
        var solver = new StageSolver(StageModel.Compile(Presets.Read(Presets.Default)), [1000]);
        DialCurves curves = DialSweep.Run(new(solver, new Setting(1e6, 45) { SupplyVolt = 2.8 }));
        foreach (DialCurve curve in curves.Curves)
        {
            foreach (DialPoint point in curve.Points.Where((_, k) => k % 20 == 0))
            {
                Reading there = solver.Read(new Setting(point.DialHz, 45) { SupplyVolt = 2.8, Grade = curve.Grade });
                Assert.Equal(there.EffectiveQ!.Value, point.EffectiveQ!.Value, 1e-9 * there.EffectiveQ.Value);
                Assert.Equal(there.TipOver!.First!.Value.TravelPercent, point.TipOver!.First!.Value.TravelPercent, 1e-7);
            }
        }
    }

    [Fact]
    public void The_newest_request_is_worked_out_last_and_asked_once()
    {
        var stage = new MadeUpStage((60, true));
        using var sweep = new LatestRequest<StageRequest, DialCurves>((request, _) => DialSweep.Run(request), cutShort: false);
        for (int k = 0; k <= 50; k++)
        {
            sweep.Ask(DialSweep.Request(stage, new Setting(1e6, k)));
        }

        Assert.True(SpinWait.SpinUntil(() => sweep.Poll() && !sweep.IsWorking && sweep.Latest?.Key.Setting.TravelPercent == 50, _patience));
        DialCurves last = sweep.Latest!.Result;
        sweep.Ask(DialSweep.Request(stage, new Setting(700e3, 50) { StationHz = 710e3, Grade = Grade.Strong }));
        Assert.False(sweep.IsWorking, "dial, station and grade are of no account");
        Assert.Same(last, sweep.Latest!.Result);
        Assert.False(sweep.Poll());
    }

    [Fact]
    public void A_fault_of_the_program_comes_to_the_thread_that_polls()
    {
        using var sweep = new LatestRequest<StageRequest, DialCurves>((request, _) => DialSweep.Run(request), cutShort: false);
        sweep.Ask(new StageRequest(new MadeUpStage((60, true)) { Faulty = true }, new Setting(1e6, 40)));
        Assert.True(SpinWait.SpinUntil(() => !sweep.IsWorking, _patience));
        AggregateException fault = Assert.Throws<AggregateException>(() => sweep.Poll());
        Assert.Contains(fault.Flatten().InnerExceptions, e => e is InvalidOperationException);
        Assert.Null(sweep.Latest);
    }

    [Fact]
    public void States_along_the_dial_are_those_of_the_stage() =>
        Assert.All(
            DialSweep.Run(new(new MadeUpStage { WithoutCrossings = TipOverState.Always }, new Setting(1e6, 40))).Curves[0].Points.Where(p => p.Reachable),
            point => Assert.Equal(TipOverState.Always, point.TipOver!.State));
}
