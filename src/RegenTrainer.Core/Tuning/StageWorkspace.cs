using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tuning;

/// <summary>The buffers of one thread for one stage.</summary>
public sealed class StageWorkspace
{
    private readonly Complex[] _keptShape;
    private readonly Complex[] _keptLeftShape;
    private readonly double[] _keptVoltages;
    private readonly TwoPortPoint[] _keptPoints;
    private readonly Linearisation[] _keptLinear;

    /// <summary>Makes room for a stage.</summary>
    public StageWorkspace(StageModel model)
    {
        Model = model;
        Circuit = new Workspace(model.Network);
        int n = model.Network.Size, devices = model.Network.Devices.Count;
        (SavedShape, SavedLeftShape) = (new Complex[n], new Complex[n]);
        (_keptShape, _keptLeftShape, _keptVoltages) = (new Complex[n], new Complex[n], new double[n]);
        (_keptPoints, _keptLinear) = (new TwoPortPoint[devices], new Linearisation[devices]);
        (BiasSlope, Scaled) = (new double[n], new Linearisation[devices]);
    }

    /// <summary>The stage.</summary>
    public StageModel Model { get; }

    /// <summary>The buffers of its network.</summary>
    public Workspace Circuit { get; }

    /// <summary>Lightly damped modes about the dial when the tank was last labelled: more than one where tuned circuits are coupled.</summary>
    internal int Resonances { get; set; }

    internal Complex[] SavedShape { get; }

    internal Complex[] SavedLeftShape { get; }

    internal double[] BiasSlope { get; }

    internal Linearisation[] Scaled { get; }

    internal void SaveShapes()
    {
        Circuit.Shape.CopyTo(SavedShape, 0);
        Circuit.LeftShape.CopyTo(SavedLeftShape, 0);
    }

    internal void RestoreShapes()
    {
        SavedShape.CopyTo(Circuit.Shape, 0);
        SavedLeftShape.CopyTo(Circuit.LeftShape, 0);
    }

    /// <summary>Puts the state just solved aside, so that other settings can be looked at in between.</summary>
    internal void Keep()
    {
        Circuit.Shape.CopyTo(_keptShape, 0);
        Circuit.LeftShape.CopyTo(_keptLeftShape, 0);
        Circuit.Voltages.CopyTo(_keptVoltages, 0);
        Circuit.Points.CopyTo(_keptPoints, 0);
        Circuit.Linear.CopyTo(_keptLinear, 0);
    }

    /// <summary>Brings the state put aside back, pencil included.</summary>
    internal void Recall(in TankQuery query, in TankState state)
    {
        _keptShape.CopyTo(Circuit.Shape, 0);
        _keptLeftShape.CopyTo(Circuit.LeftShape, 0);
        _keptVoltages.CopyTo(Circuit.Voltages, 0);
        _keptPoints.CopyTo(Circuit.Points, 0);
        _keptLinear.CopyTo(Circuit.Linear, 0);
        Circuit.Values.SetConditions(query.ConditionsAt(query.FollowRadians is null ? state.Mode.Hz : query.DialHz));
        Circuit.Values.SetPencil(state.Mode.TuningFarad, query.ControlValue, Circuit.Linear, query.Removed ? 0 : 1);
    }
}
