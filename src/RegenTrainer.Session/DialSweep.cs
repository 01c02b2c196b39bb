using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>Works out the runs along the dial.</summary>
public static class DialSweep
{
    /// <summary>Points of a run at most.</summary>
    public const int MostPoints = 61;

    /// <summary>A request that leaves out what is of no account: dial, station, grade and lock.</summary>
    public static StageRequest Request(IStageSolver solver, Setting setting) => new(solver, setting with
    {
        DialHz = solver.Dial.LowHz,
        StationHz = null,
        Grade = Grade.Typical,
        DialMode = DialMode.Follows,
        LockedFarad = null,
    });

    /// <summary>The runs at a setting, one grade on each thread.</summary>
    public static DialCurves Run(StageRequest request)
    {
        IStageSolver solver = request.Solver;
        IReadOnlyList<double> hz = DialRaster.Points(solver.Dial, MostPoints, out _);
        Grade[] grades = solver.HasGrades ? [Grade.Weak, Grade.Typical, Grade.Strong] : [Grade.Typical];
        var curves = new DialCurve[grades.Length];
        IStageSolver[] solvers = [.. grades.Select(_ => solver.Fork())];
        Parallel.For(0, grades.Length, k =>
        {
            IReadOnlyList<DialPoint> points = solvers[k].AlongDial(request.Setting with { Grade = grades[k] }, hz);
            curves[k] = new DialCurve(grades[k], points, DeadSpot.Along(points));
        });
        return new DialCurves(curves);
    }
}
