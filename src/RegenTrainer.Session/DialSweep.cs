using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>
/// Works out the runs along the dial on other threads. The run going on is finished, then the newest request is taken, so that
/// results keep coming while a key is held; what is shown last says which setting it belongs to.
/// </summary>
public sealed class DialSweep
{
    /// <summary>Points of a run at most.</summary>
    public const int MostPoints = 61;

    private readonly Lock _lock = new();
    private (IStageSolver Solver, Setting Setting)? _asked;
    private (IStageSolver Solver, Setting Setting)? _waiting;
    private Task? _running;
    private DialCurves? _latest;
    private Exception? _fault;
    private bool _changed;

    /// <summary>The last result; null before there is one.</summary>
    public DialCurves? Latest
    {
        get
        {
            lock (_lock)
            {
                return _latest;
            }
        }
    }

    /// <summary>Whether a newer result than <see cref="Latest"/> is on its way.</summary>
    public bool IsWorking
    {
        get
        {
            lock (_lock)
            {
                return _running is not null;
            }
        }
    }

    /// <summary>Asks for the runs at a setting; asking for what was asked last does nothing.</summary>
    /// <param name="solver">The stage; asked on other threads only through <see cref="IStageSolver.Fork"/>.</param>
    /// <param name="setting">The setting; its dial, station and grade are of no account.</param>
    public void Ask(IStageSolver solver, Setting setting)
    {
        Setting key = setting with { DialHz = solver.Dial.LowHz, StationHz = null, Grade = Grade.Typical, DialMode = DialMode.Follows, LockedFarad = null };
        lock (_lock)
        {
            if (_asked is { } last && ReferenceEquals(last.Solver, solver) && last.Setting == key)
            {
                return;
            }

            _asked = _waiting = (solver, key);
            _running ??= Task.Run(Work);
        }
    }

    /// <summary>Whether there is news since the last call.</summary>
    /// <exception cref="AggregateException">The work failed by a fault of the program.</exception>
    public bool Poll()
    {
        lock (_lock)
        {
            if (_fault is { } fault)
            {
                _fault = null;
                throw new AggregateException(fault);
            }

            (bool changed, _changed) = (_changed, false);
            return changed;
        }
    }

    /// <summary>The runs at a setting, one grade on each thread.</summary>
    /// <param name="solver">The stage.</param>
    /// <param name="setting">The setting; its dial, station and grade are of no account.</param>
    public static DialCurves Run(IStageSolver solver, Setting setting)
    {
        IReadOnlyList<double> hz = DialRaster.Points(solver.Dial, MostPoints, out _);
        Grade[] grades = solver.HasGrades ? [Grade.Weak, Grade.Typical, Grade.Strong] : [Grade.Typical];
        var curves = new DialCurve[grades.Length];
        IStageSolver[] solvers = [.. grades.Select(_ => solver.Fork())];
        Parallel.For(0, grades.Length, k => curves[k] = new DialCurve(grades[k], solvers[k].AlongDial(setting with { Grade = grades[k] }, hz)));
        return new DialCurves(setting, curves);
    }

    private void Work()
    {
        while (true)
        {
            (IStageSolver solver, Setting setting) next;
            lock (_lock)
            {
                if (_waiting is not { } waiting)
                {
                    (_running, _changed) = (null, true);
                    return;
                }

                (next, _waiting) = (waiting, null);
            }

            DialCurves? curves = null;
            Exception? fault = null;
            try
            {
                curves = Run(next.solver, next.setting);
            }
            catch (Exception e)
            {
                fault = e;
            }

            lock (_lock)
            {
                (_latest, _fault, _changed) = (curves ?? _latest, fault, true);
            }
        }
    }
}
