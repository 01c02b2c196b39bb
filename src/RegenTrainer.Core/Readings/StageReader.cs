using System.Numerics;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>Reads a stage: the one way from a setting to figures that pages, commands and larger questions share.</summary>
public static class StageReader
{
    /// <summary>The audio frequencies in Hz that are shown where none are asked for.</summary>
    public static readonly IReadOnlyList<double> DefaultAudioHz = [400, 1000, 3000];

    /// <summary>Everything computed for one setting.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    /// <param name="audioHz">Audio frequencies of the sidebands in Hz, above 0.</param>
    /// <returns>The reading; where a solve fails its figures are null and a caution says why.</returns>
    public static Reading Read(StageWorkspace ws, Setting setting, IReadOnlyList<double> audioHz)
    {
        Position position = Position.Solve(ws, setting, TankHint.None);
        var cautions = new List<Caution>();
        Reading reading = Frame(ws.Model, setting, position, cautions);
        if (!position.State.Found)
        {
            cautions.Add(Failure.Describe(ws.Model, position.State));
            return reading;
        }

        if (!position.Reachable)
        {
            cautions.Add(OutOfReach(ws, position));
            return reading;
        }

        return ReadingFigures.Complete(reading, ws, position, setting, audioHz, cautions);
    }

    /// <summary>The run along the dial: every figure equals that of a reading there.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting; its dial is replaced by each of <paramref name="dialHz"/>.</param>
    /// <param name="dialHz">Dial points in Hz.</param>
    public static IReadOnlyList<DialPoint> AlongDial(StageWorkspace ws, Setting setting, IReadOnlyList<double> dialHz)
    {
        var points = new DialPoint[dialHz.Count];
        for (int k = 0; k < points.Length; k++)
        {
            points[k] = DialRun.At(ws, setting with { DialHz = dialHz[k] });
        }

        return points;
    }

    /// <summary>The response from antenna electromotive force to output; empty above tip-over, out of reach or unsolved.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    /// <param name="hz">Frequencies in Hz, above 0.</param>
    public static IReadOnlyList<ResponsePoint> Response(StageWorkspace ws, Setting setting, IReadOnlyList<double> hz)
    {
        if (TryDecaying(ws, setting) is null)
        {
            return [];
        }

        var points = new ResponsePoint[hz.Count];
        for (int k = 0; k < points.Length; k++)
        {
            Complex h = new Transfer(ws).At(hz[k]);
            points[k] = new ResponsePoint(hz[k], Decibel.FromRatio(Complex.Abs(h)), h.Phase * 180 / Math.PI);
        }

        return points;
    }

    /// <summary>The neighbours on the raster, one and two channels away on both sides; empty above tip-over, out of reach or unsolved.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    public static IReadOnlyList<Neighbour> Neighbours(StageWorkspace ws, Setting setting)
    {
        if (TryDecaying(ws, setting) is not { } position)
        {
            return [];
        }

        var sidebands = new SidebandResponse(ws, setting.StationHz ?? position.DialHz);
        double step = ws.Model.Circuit.Dial.StepHz;
        return [.. new[] { -2 * step, -step, step, 2 * step }.Where(o => sidebands.StationHz + o > 0).Select(sidebands.NeighbourAt)];
    }

    /// <summary>How each of many audio frequencies fares, as a curve; empty above tip-over, out of reach or unsolved.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    /// <param name="audioHz">Audio frequencies in Hz, above 0; those not below the station are left out.</param>
    public static IReadOnlyList<Sideband> AudioCurve(StageWorkspace ws, Setting setting, IReadOnlyList<double> audioHz)
    {
        if (TryDecaying(ws, setting) is not { } position)
        {
            return [];
        }

        var sidebands = new SidebandResponse(ws, setting.StationHz ?? position.DialHz);
        return [.. audioHz.Where(hz => hz < sidebands.StationHz).Select(sidebands.At)];
    }

    /// <summary>Audio frequencies at equal ratios, both ends included, as a curve is drawn over a logarithmic axis.</summary>
    /// <param name="lowHz">Lowest in Hz, above 0.</param>
    /// <param name="highHz">Highest in Hz, above <paramref name="lowHz"/>.</param>
    /// <param name="points">How many, 2 or more.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value lies outside its range.</exception>
    public static IReadOnlyList<double> SpacedByRatio(double lowHz, double highHz, int points)
    {
        Guard.Positive(lowHz, nameof(lowHz));
        Guard.InRange(highHz, Math.BitIncrement(lowHz), double.MaxValue, nameof(highHz));
        Guard.InRange(points, 2, int.MaxValue, nameof(points));
        double[] spaced = [.. Enumerable.Range(0, points).Select(k => lowHz * Math.Pow(highHz / lowHz, k / (points - 1.0)))];
        spaced[^1] = highHz;
        return spaced;
    }

    /// <summary>The position of a setting at which a response exists; null above tip-over, out of reach or unsolved.</summary>
    internal static Position? TryDecaying(StageWorkspace ws, Setting setting)
    {
        Position position = Position.Solve(ws, setting, TankHint.None);
        bool decays = position.State.Found && position.Reachable
            && TankFamily.FastestGrowing(ws, position.Query.DialHz, position.State).Real < 0;
        return decays ? position : null;
    }

    internal static SettingInForce InForce(StageModel model, Setting setting, in Position position) => new(
        position.DialHz,
        setting.StationHz ?? position.DialHz,
        setting.TravelPercent,
        setting.SupplyVolt ?? model.Circuit.SupplyVolt,
        setting.TemperatureCelsius,
        setting.Grade,
        setting.Device?.Name ?? model.RegeneratingType,
        setting.DialMode);

    private static Reading Frame(StageModel model, Setting setting, in Position position, List<Caution> cautions)
    {
        Controls.VariableCapacitor capacitor = model.Circuit.Dial.Capacitor;
        return new Reading
        {
            Setting = InForce(model, setting, position),
            Cautions = cautions,
            Reachable = position.Reachable,
            TuningReachFarad = (capacitor.MinimumFarad, capacitor.MaximumFarad),
            ControlUnit = model.Circuit.Control?.Unit ?? Unit.None,
            ControlValue = model.ControlLaw?.ValueAt(setting.TravelPercent),
            ControlDegrees = model.ControlLaw?.DegreesAt(setting.TravelPercent),
        };
    }

    internal static Caution OutOfReach(StageWorkspace ws, in Position position)
    {
        Controls.VariableCapacitor capacitor = ws.Model.Circuit.Dial.Capacitor;
        string Say(double? hz) => hz is { } value ? QuantityText.Write(value, Unit.Hertz, 4) : "unknown";
        double? low = position.HzAt(ws, capacitor.MaximumFarad), high = position.HzAt(ws, capacitor.MinimumFarad);
        return new Caution(
            "out-of-reach",
            $"{Say(position.DialHz)} needs {QuantityText.Write(position.State.Mode.TuningFarad, Unit.Farad, 4)}, the capacitor has "
            + $"{QuantityText.Write(capacitor.MinimumFarad, Unit.Farad)} to {QuantityText.Write(capacitor.MaximumFarad, Unit.Farad)}: "
            + $"{Say(low)} to {Say(high)}");
    }
}
