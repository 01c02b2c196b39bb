using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>A stage under the builder's hands: where they are, what was read there, and one method for everything they can do.</summary>
public sealed class LiveStage
{
    /// <summary>The response is drawn so far to either side of the station, in Hz.</summary>
    public const double HalfSpanHz = 20e3;

    /// <summary>The margin in dB at which <see cref="StandBelowTipOver"/> stops.</summary>
    public const double StandingMarginDb = 0.3;

    private const double LowestVolt = 0;
    private const double HighestVolt = 1000;
    private const double LowestCelsius = -40;
    private const double HighestCelsius = 85;

    /// <summary>The dial turns past the ends of the band by this factor, so that the reach of the capacitor can be seen.</summary>
    private const double BeyondBand = 2;

    private IStageSolver _solver;
    private Setting _setting;
    private string _notice = "";
    private StageSnapshot? _shown;
    private int _shownPoints;
    private (Setting Setting, IReadOnlyList<RegimeSpan> Spans)? _regimes;

    /// <summary>Begins at a setting.</summary>
    /// <param name="solver">The stage.</param>
    /// <param name="start">Where the hands are first.</param>
    public LiveStage(IStageSolver solver, Setting start)
    {
        (_solver, _setting) = (solver, start);
        Reading = solver.Read(start);
        if (start.LockedFarad is not null)
        {
            _setting = start with { DialHz = Reading.Setting.DialHz };
        }
    }

    /// <summary>The stage's solver.</summary>
    public IStageSolver Solver => _solver;

    /// <summary>Where the hands are.</summary>
    public Setting Setting => _setting;

    /// <summary>What was read there last.</summary>
    public Reading Reading { get; private set; }

    /// <summary>What the last method could not do, in words; empty where it did.</summary>
    public string Notice => _notice;

    /// <summary>
    /// Puts another stage under the hands. They stay where they are, but for what does not suit it; a dial it does not reach
    /// stays too, and the reading says so.
    /// </summary>
    /// <param name="solver">The stage.</param>
    public void Replace(IStageSolver solver) => Replace(solver, _setting);

    /// <summary>Puts another stage under the hands, and the hands elsewhere.</summary>
    /// <param name="solver">The stage.</param>
    /// <param name="setting">Where the hands are from now on, but for what does not suit the stage.</param>
    public void Replace(IStageSolver solver, Setting setting)
    {
        (_solver, _setting) = (solver, solver.Fit(setting));
        (_notice, _shown, _regimes) = ("", null, null);
        Reading = solver.Read(Asked(_setting));
    }

    /// <summary>Turns the control by thousandths of a percent, up to its stops.</summary>
    public void TurnControl(int thousandths) => Ask(_setting with { TravelPercent = Steps.Travel(_setting.TravelPercent, thousandths) });

    /// <summary>Sets the control to a travel in %; beyond a stop it stands at the stop.</summary>
    public void SetTravel(double travelPercent) => Ask(_setting with { TravelPercent = Steps.Travel(Math.Clamp(travelPercent, 0, 100), 0) });

    /// <summary>Sets the control <see cref="StandingMarginDb"/> below tip-over.</summary>
    public void StandBelowTipOver()
    {
        double? travel = MarginSearch.Find(_solver, Asked(_setting), Reading, StandingMarginDb, out string why);
        if (travel is { } found)
        {
            Ask(_setting with { TravelPercent = found });
            return;
        }

        Refuse(why);
    }

    /// <summary>Turns the dial to the next channel of the raster.</summary>
    public void DialByChannel(bool up) => TurnDial(Steps.Channel(_setting.DialHz, _solver.Dial.StepHz, up));

    /// <summary>Turns the dial by so many Hz.</summary>
    public void TurnDialBy(double hz) => TurnDial(_setting.DialHz + hz);

    /// <summary>Takes the next channel of the raster as the station; the dial stays.</summary>
    public void StationByChannel(bool up) => SetStation(Steps.Channel(StationHz, _solver.Dial.StepHz, up));

    /// <summary>Moves the station by so many Hz; the dial stays.</summary>
    public void MoveStationBy(double hz) => SetStation(StationHz + hz);

    /// <summary>Lets the station stand at the dial again, and go with it.</summary>
    public void StationToDial() => Ask(_setting with { StationHz = null });

    /// <summary>Changes the supply by a tenth of a volt.</summary>
    public void StepSupply(bool up)
    {
        if ((_setting.SupplyVolt ?? _solver.SupplyVolt) is not { } volt)
        {
            Refuse("this stage has no supply");
            return;
        }

        Ask(_setting with { SupplyVolt = Math.Clamp(Steps.TenthOfVolt(volt, up), LowestVolt, HighestVolt) });
    }

    /// <summary>Changes the temperature by one degree.</summary>
    public void StepTemperature(bool up) => Ask(_setting with
    {
        TemperatureCelsius = Math.Clamp(_setting.TemperatureCelsius + (up ? 1 : -1), LowestCelsius, HighestCelsius),
    });

    /// <summary>Puts the next grade of device into the regenerating socket: weak, typical, strong and again weak.</summary>
    public void NextGrade()
    {
        if (Reading.Setting.Device is null)
        {
            Refuse("this stage has no device that comes in grades");
            return;
        }

        Ask(_setting with
        {
            Grade = _setting.Grade switch { Grade.Weak => Grade.Typical, Grade.Typical => Grade.Strong, _ => Grade.Weak },
        });
    }

    /// <summary>Locks the tuning capacitor where it stands, or lets the tuning follow the dial again.</summary>
    public void ToggleLock()
    {
        if (_setting.DialMode == DialMode.Locked)
        {
            Ask(_setting with { DialMode = DialMode.Follows, LockedFarad = null });
            return;
        }

        if (Reading.TuningFarad is not { } farad)
        {
            Refuse("the dial cannot be locked: the capacitor does not tune here");
            return;
        }

        Ask(_setting with { DialMode = DialMode.Locked, LockedFarad = farad });
    }

    /// <summary>Everything a page shows.</summary>
    /// <param name="points">Evenly spaced points of the response, 2 or more.</param>
    public StageSnapshot Snapshot(int points)
    {
        Guard.InRange(points, 2, 100_000, nameof(points));
        if (_shown is { } shown && _shownPoints == points)
        {
            return shown;
        }

        Setting asked = Asked(_setting);
        _shownPoints = points;
        return _shown = new StageSnapshot(
            _solver.Title, _solver.Dial, _solver.Control, _setting, Reading, Curve(asked, points), _solver.Neighbours(asked), Regimes(asked), _notice);
    }

    /// <summary>Where the station is now, in Hz.</summary>
    private double StationHz => Asked(_setting).StationInForceHz;

    private void TurnDial(double hz)
    {
        double lowest = _solver.Dial.LowHz / BeyondBand, highest = _solver.Dial.HighHz * BeyondBand;
        if (hz < lowest || hz > highest)
        {
            Refuse($"the dial ends at {QuantityText.Write(hz < lowest ? lowest : highest, Unit.Hertz, 4)}");
            return;
        }

        Setting turned = _setting with { DialHz = hz };
        if (_setting.LockedFarad is not null)
        {
            // Turning a locked dial tunes the tank to the new place as the control stands, then the capacitor stays again.
            Reading tuned = _solver.Read(turned with { DialMode = DialMode.Follows, LockedFarad = null });
            turned = turned with { LockedFarad = tuned.TuningFarad };
        }

        Ask(turned);
    }

    private void SetStation(double hz)
    {
        if (Math.Abs(hz - _setting.DialHz) > _solver.Dial.HighHz || hz <= HalfSpanHz)
        {
            Refuse("the station is too far from the dial");
            return;
        }

        Ask(_setting with { StationHz = hz });
    }

    private void Ask(Setting setting)
    {
        _notice = "";
        _shown = null;
        if (setting != _setting)
        {
            _setting = setting;
            Reading = _solver.Read(Asked(setting));
        }
    }

    private void Refuse(string why) => (_notice, _shown) = (why, null);

    /// <summary>A station that goes with the dial stays where the dial was set when a locked tank is pulled.</summary>
    private static Setting Asked(Setting setting) =>
        setting.LockedFarad is not null && setting.StationHz is null ? setting with { StationHz = setting.DialHz } : setting;

    private IReadOnlyList<RegimeSpan> Regimes(Setting asked)
    {
        Setting whatever = asked with { TravelPercent = 0, StationHz = null };
        if (_regimes is not { } known || known.Setting != whatever)
        {
            _regimes = (whatever, Reading.Regime is null ? [] : _solver.RegimesAlongTravel(whatever));
        }

        return _regimes.Value.Spans;
    }

    private IReadOnlyList<ResponsePoint> Curve(Setting asked, int points)
    {
        if (Reading.GrowthPerSecond is not < 0)
        {
            return [];
        }

        double station = Reading.Setting.StationHz, from = Math.Max(station - HalfSpanHz, 1);
        var hz = new List<double>(points + 1);
        for (int k = 0; k < points; k++)
        {
            hz.Add(from + ((station + HalfSpanHz - from) * k / (points - 1)));
        }

        // A narrow peak between two points would be missed: the tank's own frequency is always one of them.
        if (Reading.TankHz is { } tank && tank > hz[0] && tank < hz[^1])
        {
            int at = hz.BinarySearch(tank);
            if (at < 0)
            {
                hz.Insert(~at, tank);
            }
        }

        return _solver.Response(asked, hz);
    }
}
