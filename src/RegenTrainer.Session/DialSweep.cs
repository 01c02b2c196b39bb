using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>Works out the runs along the dial.</summary>
public static class DialSweep
{
    /// <summary>Points of a run at most.</summary>
    public const int MostPoints = 61;

    /// <summary>Points worked out in one go: few enough that threads end together.</summary>
    private const int PointsInPiece = 10;

    /// <summary>A request that leaves out what is of no account: dial, station, grade and lock.</summary>
    public static StageRequest Request(IStageSolver solver, Setting setting) => new(solver, setting with
    {
        DialHz = solver.Dial.LowHz,
        StationHz = null,
        Grade = Grade.Typical,
        DialMode = DialMode.Follows,
        LockedFarad = null,
    });

    /// <summary>The runs at a setting, in pieces on as many threads as there are, so that none waits for another's grade.</summary>
    public static DialCurves Run(StageRequest request)
    {
        IStageSolver solver = request.Solver;
        IReadOnlyList<double> hz = DialRaster.Points(solver.Dial, MostPoints, out _);
        Grade[] grades = solver.HasGrades ? [Grade.Weak, Grade.Typical, Grade.Strong] : [Grade.Typical];
        int pieces = (hz.Count + PointsInPiece - 1) / PointsInPiece;
        var found = new IReadOnlyList<DialPoint>[grades.Length * pieces];
        Parallel.For(0, found.Length, solver.Fork, (index, _, own) =>
        {
            (int grade, int piece) = Math.DivRem(index, pieces);
            double[] part = [.. hz.Skip(piece * PointsInPiece).Take(PointsInPiece)];
            found[index] = own.AlongDial(request.Setting with { Grade = grades[grade] }, part);
            return own;
        }, _ => { });
        return new DialCurves([.. grades.Select((grade, k) => Curve(grade, [.. found.Skip(k * pieces).Take(pieces).SelectMany(points => points)]))]);
    }

    private static DialCurve Curve(Grade grade, IReadOnlyList<DialPoint> points) => new(grade, points, DeadSpot.Along(points));
}
