using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Readings;

/// <summary>
/// Reads how far a stage can be driven: the carrier is raised in steps, each cycle solved with the devices' full laws, until a
/// device runs out of current or voltage; then the drive is closed in on.
/// </summary>
public static class HeadroomReader
{
    /// <summary>A collector current down to this share of that at rest counts as cut off; an exponential never reaches zero.</summary>
    public const double CutOffShare = 0.05;

    /// <summary>A collector within this many volt of its emitter is saturated: common practice.</summary>
    public const double SaturatedBelowVolt = 0.2;

    /// <summary>Below this collector current in ampere a device is cut off at rest.</summary>
    private const double IdleAmpere = 1e-9;

    /// <summary>Limits beyond this multiple of the first one's drive are not looked for: the stage is far out of its range there.</summary>
    private const double LookBeyond = 4;

    /// <summary>The search begins at this share of what small signals predict.</summary>
    private const double StartShare = 0.25;

    /// <summary>And is given up at this multiple of it.</summary>
    private const double GiveUpBeyond = 20;

    private const double StepRatio = 1.4;

    private const double SmallestRatio = 1.02;

    /// <summary>The drive at a limit is found to this relative accuracy.</summary>
    private const double Tolerance = 1e-4;

    private const int RefineLimit = 40;

    /// <summary>The headroom at a setting.</summary>
    /// <param name="ws">A workspace of the stage.</param>
    /// <param name="setting">The setting.</param>
    public static HeadroomReading Read(StageWorkspace ws, Setting setting)
    {
        if (StageReader.TryDecaying(ws, setting) is not { } position)
        {
            return new HeadroomReading([], null, [new Caution("no-headroom", "headroom is known only where the tank is tuned and does not oscillate")]);
        }

        int devices = ws.Model.Network.Devices.Count;
        if (devices == 0)
        {
            return new HeadroomReading([], null, []);
        }

        double station = setting.StationHz ?? position.DialHz;
        if (DrivenCycle.TryPrepare(ws.Circuit, ws.Model.OutputIndex, station) is not { } cycle)
        {
            return new HeadroomReading([], null, [new Caution("headroom-unsolved", "the driven stage cannot be solved: the circuit is singular")]);
        }

        var search = new Search(ws.Circuit, cycle);
        bool ended = search.Run();
        DeviceHeadroom[] found =
            [.. Enumerable.Range(0, devices).Where(d => ws.Model.Network.Devices[d].Model is BipolarModel).Select(d => new DeviceHeadroom(ws.Model.Network.Devices[d].Part.Name, search.Level(2 * d), search.Level((2 * d) + 1)))];
        FirstLimit? first = First(found);
        return new HeadroomReading(found, first, first is null && !ended
            ? [new Caution("headroom-unsolved", "the driven stage did not settle: no limit was found")]
            : []);
    }

    private static FirstLimit? First(IReadOnlyList<DeviceHeadroom> devices)
    {
        FirstLimit? first = null;
        foreach (DeviceHeadroom device in devices)
        {
            Take(device.Name, DeviceLimit.CutOff, device.CutOff);
            Take(device.Name, DeviceLimit.Saturation, device.Saturation);
        }

        return first;

        void Take(string name, DeviceLimit limit, LimitLevel? level)
        {
            if (level is { } l && (first is null || l.AntennaVolt < first.Level.AntennaVolt))
            {
                first = new FirstLimit(name, limit, l);
            }
        }
    }

    /// <summary>The limits in order: cut-off and saturation of the first device, then of the second, and so on.</summary>
    private sealed class Search
    {
        private readonly DrivenCycle _cycle;
        private readonly LimitLevel?[] _levels;
        private readonly double _expected;

        public Search(Workspace w, DrivenCycle cycle)
        {
            _cycle = cycle;
            _levels = new LimitLevel?[2 * w.Network.Devices.Count];
            double expected = double.PositiveInfinity;
            for (int d = 0; d < w.Network.Devices.Count; d++)
            {
                if (w.Network.Devices[d].Model is not BipolarModel)
                {
                    // A diode rectifies at any drive: it has no limits of an amplifier, so none are looked for.
                    _levels[2 * d] = _levels[(2 * d) + 1] = new LimitLevel(double.PositiveInfinity, double.PositiveInfinity, double.PositiveInfinity);
                    continue;
                }

                (double ampere, double volt) = cycle.SmallSignal(d);
                double current = Math.Abs(w.Points[d].I2), left = cycle.LeastOutputVolt(d) - SaturatedBelowVolt;
                _levels[2 * d] = current < IdleAmpere ? default(LimitLevel) : null;
                _levels[(2 * d) + 1] = left <= 0 && current >= IdleAmpere ? default(LimitLevel) : null;
                expected = current < IdleAmpere ? expected : Math.Min(expected, (1 - CutOffShare) * current / ampere);
                expected = left <= 0 ? expected : Math.Min(expected, left / volt);
            }

            _expected = expected;
        }

        public LimitLevel? Level(int limit) => _levels[limit];

        /// <summary>Raises the drive; false where a cycle could not be solved before any limit was found.</summary>
        public bool Run()
        {
            (double drive, double ratio) = (StartShare * _expected, StepRatio);
            double last = GiveUpBeyond * _expected;
            double[] before = [.. _levels.Select((_, k) => Left(k))];
            double beforeDrive = 0;
            while (double.IsFinite(drive) && drive <= last && Array.Exists(_levels, l => l is null))
            {
                if (!_cycle.TrySolve(drive))
                {
                    ratio = Math.Sqrt(ratio);
                    if (ratio < SmallestRatio)
                    {
                        return false;
                    }

                    drive = beforeDrive > 0 ? beforeDrive * ratio : drive / 2;
                    continue;
                }

                double[] now = [.. _levels.Select((_, k) => Left(k))];
                for (int k = 0; k < now.Length; k++)
                {
                    if (_levels[k] is null && now[k] <= 0)
                    {
                        _levels[k] = Refine(k, beforeDrive, before[k], drive, now[k]);
                    }
                }

                double first = _levels.Min(l => l?.AntennaVolt > 0 ? l.Value.AntennaVolt : double.PositiveInfinity);
                last = Math.Min(last, LookBeyond * first);
                if (!_cycle.TrySolve(drive))
                {
                    return true;
                }

                (before, beforeDrive) = (now, drive);
                drive *= ratio;
            }

            return true;
        }

        /// <summary>What is left to a limit: as a share of the current at rest, or in volt.</summary>
        private double Left(int limit) => limit % 2 == 0
            ? _cycle.LeastCurrentShare(limit / 2) - CutOffShare
            : _cycle.LeastOutputVolt(limit / 2) - SaturatedBelowVolt;

        /// <summary>Regula falsi with Illinois weights [Dowell and Jarratt 1971]; null where a cycle between cannot be solved.</summary>
        private LimitLevel? Refine(int limit, double a, double fa, double b, double fb)
        {
            for (int step = 0; step < RefineLimit && Math.Abs(b - a) > Tolerance * Math.Abs(b); step++)
            {
                double next = b - (fb * (b - a) / (fb - fa));
                if (!_cycle.TrySolve(next))
                {
                    return null;
                }

                double value = Left(limit), moved = Math.Abs(next - b);
                (a, fa) = value * fb < 0 ? (b, fb) : (a, fa / 2);
                (b, fb) = (next, value);
                if (moved < Tolerance * next)
                {
                    break;
                }
            }

            (double tank, double output) = _cycle.Amplitudes();
            return new LimitLevel(_cycle.AntennaVolt, tank, output);
        }
    }
}
