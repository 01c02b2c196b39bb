using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Regeneration;

/// <summary>Growth of the tank as a function of the controlled element, with its slope; each point starts from the one before.</summary>
internal struct GrowthAlongControl
{
    private readonly StageWorkspace _ws;
    private readonly bool _logarithmic;
    private TankQuery _query;
    private TankHint _hint;

    public GrowthAlongControl(StageWorkspace ws, in TankQuery query, in TankHint hint, bool logarithmic)
    {
        (_ws, _query, _hint, _logarithmic) = (ws, query, hint, logarithmic);
    }

    /// <summary>Why the last point failed; converged where it did not.</summary>
    public SolveStop Stop { get; private set; }

    /// <summary>The state at the last point.</summary>
    public TankState State { get; private set; }

    /// <summary>The element's value at a place of the scan.</summary>
    public readonly double ValueAt(double u) => _logarithmic ? Math.Exp(u) : u;

    /// <summary>The place of the scan at a value.</summary>
    public readonly double PlaceOf(double value) => _logarithmic ? Math.Log(value) : value;

    /// <summary>Re s and its slope by the place, with the tank held at the dial where the tuning follows.</summary>
    public bool TryPoint(double u, out double growth, out double slope)
    {
        double value = ValueAt(u);
        _query = _query with { ControlValue = value };
        State = TankSolver.Solve(_ws, _query, _hint);
        Stop = State.Stop;
        (growth, slope) = (double.NaN, double.NaN);
        if (!State.Found)
        {
            _hint = TankHint.None;
            return false;
        }

        _hint = TankHint.From(State);
        Complex byControl = ControlSlope.Total(_ws, State, value) * (_logarithmic ? value : 1);
        growth = State.Mode.S.Real;
        slope = byControl.Real;
        Complex fastest = TankFamily.FastestGrowing(_ws, _query.DialHz, State);
        if (fastest != State.Mode.S)
        {
            // Another tuned circuit leads: its growth counts, and its slope is not at hand.
            (growth, slope) = (fastest.Real, double.NaN);
            return true;
        }

        if (_query.FollowRadians is not null)
        {
            Complex byTuning = ModeSolver.ByTuning(_ws.Circuit, State.Mode.S);
            slope -= byControl.Imaginary * byTuning.Real / byTuning.Imaginary;
        }

        return true;
    }
}
