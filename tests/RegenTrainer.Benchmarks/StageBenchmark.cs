using BenchmarkDotNet.Attributes;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Files;
using RegenTrainer.Session;

namespace RegenTrainer.Benchmarks;

/// <summary>The default preset at 1 MHz, through the same functions the screen and the commands call.</summary>
[MemoryDiagnoser(false)]
public class StageBenchmark
{
    private readonly StageWorkspace _workspace;
    private readonly TankQuery _query = new(1e6, DialMode.Follows, 0, 2000, 20, Grade.Typical, null, null);
    private TankHint _hint;
    private double _ohm = 2000;
    private readonly StageRequest _dial;

    public StageBenchmark()
    {
        _workspace = new StageWorkspace(StageModel.Compile(Presets.Read(Presets.Default)));
        _hint = TankHint.From(TankSolver.Solve(_workspace, _query, TankHint.None));
        _dial = DialSweep.Request(new StageSolver(_workspace.Model, StageReader.DefaultAudioHz), new Setting(1e6, 50));
    }

    /// <summary>One step of the control (2 % of its resistance), operating point and tank mode solved again from the last.</summary>
    [Benchmark]
    public double TankUpdate()
    {
        _ohm = _ohm == 2000 ? 1960 : 2000;
        TankState state = TankSolver.Solve(_workspace, _query with { ControlValue = _ohm }, _hint);
        _hint = TankHint.From(state);
        return state.Mode.S.Real;
    }

    /// <summary>The tip-over along the whole travel, from nothing.</summary>
    [Benchmark]
    public TipOver? TipOverAlongTravel()
    {
        TipOver? tip = TipOverSolver.TryFind(_workspace, _query, _workspace.Model.ControlLaw!, TankHint.None, out _);
        _hint = TankHint.None;
        return tip;
    }

    /// <summary>A complete reading, from nothing.</summary>
    [Benchmark]
    public Reading CompleteReading()
    {
        _hint = TankHint.None;
        return StageReader.Read(_workspace, new Setting(1e6, 50), StageReader.DefaultAudioHz);
    }

    /// <summary>What the Dial page asks for: weak, typical and strong devices at 60 points each, on the threads there are.</summary>
    [Benchmark]
    public DialCurves DialThreeGrades() => DialSweep.Run(_dial);
}
