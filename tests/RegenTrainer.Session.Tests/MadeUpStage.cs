using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session.Tests;

/// <summary>
/// A stage with readings made up for tests: Q off 100, and a loop gain that goes evenly with the travel, from 0 at the idle stop
/// to 1 at the tip-over; the capacitor reaches 600 to 1500 kHz.
/// </summary>
public sealed class MadeUpStage(params (double TravelPercent, bool Upward)[] crossings) : IStageSolver
{
    private const double QOff = 100;

    public string Title { get; init; } = "Made-up stage";

    public Dial Dial { get; init; } = new(530e3, 1700e3, 10e3, new VariableCapacitor(12e-12, 365e-12));

    public RegenerationControl? Control { get; init; } = new(new LinearControl(10e3, 100), Unit.Ohm);

    public double? SupplyVolt { get; init; } = 3;

    public TipOverState? WithoutCrossings { get; init; } = TipOverState.Never;

    public string? Device { get; init; } = "BC547B";

    /// <summary>Why no operating point is found; null where one is.</summary>
    public string? Failure { get; init; }

    /// <summary>Whether the run along the dial fails by a fault of the program.</summary>
    public bool Faulty { get; init; }

    public IReadOnlyList<Caution> Cautions { get; init; } = [];

    public int Reads { get; private set; }

    public int RegimeRuns { get; private set; }

    public bool HasGrades => Device is not null;

    public IStageSolver Fork() => this;

    public IReadOnlyList<DialPoint> AlongDial(Setting setting, IReadOnlyList<double> dialHz) => Faulty
        ? throw new InvalidOperationException("a fault made up for a test")
        :
    [
        .. dialHz.Select(hz =>
        {
            Reading reading = Read(setting with { DialHz = hz });
            return new DialPoint(hz, reading.Reachable)
            {
                TuningFarad = reading.TuningFarad,
                TipOver = reading.TipOver,
                EffectiveQ = reading.EffectiveQ,
                BandwidthHz = reading.BandwidthHz,
                StageGainDb = reading.StageGainDb,
                PulledHz = reading.PulledHz,
            };
        }),
    ];

    public IReadOnlyList<Sideband> Sidebands(Setting setting, IReadOnlyList<double> audioHz) =>
        LoopGain(setting.TravelPercent) >= 1 ? [] : [.. audioHz.Select(hz => new Sideband(hz, -hz / 400, -hz / 500, -hz / 450))];

    public Interaction Interaction(Setting setting) => new()
    {
        Approach = new ApproachToTipOver(50, 60, false, -203, -4e-14, -0.02),
        BandwidthDialDegrees = 0.08,
        VernierRatio = 6.25,
        HandShiftHz = -406,
        Station = new StationFit(setting.StationInForceHz - setting.DialHz, 0, [new OffTuneAudio(1000, 0, 0)]),
        Cautions = [],
    };

    public BiasReading Bias(Setting setting) => new(
        Read(setting).Setting, [], [new DeviceBias("main", "BC547B", 3.7e-4, 1.5e-6, 0.62, 2.1, 0.0145, 248, 7.7e-4, false)], [("collector", 2.7)], 1.3e-3, 0);

    public HeadroomReading Headroom(Setting setting) => new([], null, []);

    public Setting Fit(Setting setting) => SupplyVolt is null ? setting with { SupplyVolt = null } : setting;

    public Reading Read(Setting setting)
    {
        Reads++;
        bool reachable = setting.DialHz is >= 600e3 and <= 1500e3;
        IControlLaw? law = Control?.Law;
        var reading = new Reading
        {
            Setting = new SettingInForce(
                setting.DialHz, setting.StationInForceHz, setting.TravelPercent, setting.SupplyVolt ?? SupplyVolt, setting.TemperatureCelsius,
                setting.Grade, Device, setting.DialMode),
            Cautions = Failure is { } why
                ? [new Caution("no-operating-point", why)]
                : reachable ? Cautions : [new Caution("out-of-reach", "the capacitor reaches 600 kHz to 1.5 MHz")],
            Reachable = reachable || Failure is not null,
            TuningReachFarad = (12e-12, 365e-12),
            ControlUnit = Control?.Unit ?? Unit.None,
            ControlValue = law?.ValueAt(setting.TravelPercent),
            ControlDegrees = law?.DegreesAt(setting.TravelPercent),
        };
        return reachable && Failure is null ? Tuned(reading, setting, law) : reading;
    }

    public IReadOnlyList<ResponsePoint> Response(Setting setting, IReadOnlyList<double> hz)
    {
        double gain = LoopGain(setting.TravelPercent);
        if (gain >= 1)
        {
            return [];
        }

        double q = QOff / (1 - gain);
        return
        [
            .. hz.Select(f => new ResponsePoint(f, -10 * Math.Log10(1 + Math.Pow(2 * q * (f - setting.DialHz) / setting.DialHz, 2)), 0)),
        ];
    }

    public IReadOnlyList<Neighbour> Neighbours(Setting setting) =>
        LoopGain(setting.TravelPercent) >= 1 ? [] : [new(-20e3, -34), new(-10e3, -28.4), new(10e3, -28.1), new(20e3, -34)];

    public IReadOnlyList<RegimeSpan> RegimesAlongTravel(Setting setting)
    {
        RegimeRuns++;
        if (crossings.Length == 0)
        {
            return [new RegimeSpan(0, 100, WithoutCrossings == TipOverState.Always ? Regime.Oscillating : Regime.Idle)];
        }

        var spans = new List<RegimeSpan>();
        double from = 0;
        foreach ((double travel, bool upward) in crossings)
        {
            if (upward)
            {
                double middle = (from + travel) / 2;
                spans.Add(new RegimeSpan(from, middle, Regime.Idle));
                spans.Add(new RegimeSpan(middle, travel, Regime.Working));
            }
            else
            {
                spans.Add(new RegimeSpan(from, travel, Regime.Oscillating));
            }

            from = travel;
        }

        spans.Add(new RegimeSpan(from, 100, crossings[^1].Upward ? Regime.Oscillating : Regime.Idle));
        return spans;
    }

    private Reading Tuned(Reading reading, Setting setting, IControlLaw? law)
    {
        double gain = LoopGain(setting.TravelPercent), q = QOff / (1 - gain), growth = (gain - 1) * Math.PI * setting.DialHz / QOff;
        bool decays = gain < 1;
        (double TravelPercent, bool Upward)? next = crossings.Where(c => c.Upward && c.TravelPercent >= setting.TravelPercent)
            .Cast<(double, bool)?>().FirstOrDefault();
        return reading with
        {
            TuningFarad = setting.LockedFarad ?? 100e-12 * Math.Pow(1e6 / setting.DialHz, 2),
            TankHz = setting.DialHz,
            GrowthPerSecond = growth,
            QRegenerationOff = QOff,
            PulledHz = -1200,
            EffectiveQ = decays ? q : null,
            BandwidthHz = decays ? setting.DialHz / q : null,
            StageGainDb = decays ? 31.2 : null,
            RingTimeSeconds = decays ? -1 / growth : null,
            SpeechIndex = decays ? 0.59 : null,
            Sidebands = decays ? [new(1000, -8.6, -8.6, -8.6), new(3000, -17.5, -17.5, -17.5)] : [],
            MarginDb = decays && gain > 0 ? -20 * Math.Log10(gain) : null,
            MarginPercent = next?.TravelPercent - setting.TravelPercent,
            MarginDegrees = 3 * (next?.TravelPercent - setting.TravelPercent),
            Regime = !decays ? Regime.Oscillating : gain < 0.5 ? Regime.Idle : gain < 0.891 ? Regime.Working : Regime.Edge,
            TipOver = law is null ? null : Tips(law),
        };
    }

    private TipOver? Tips(IControlLaw law)
    {
        TipOverState? state = crossings.Length switch { 0 => WithoutCrossings, 1 => TipOverState.Once, _ => TipOverState.Several };
        return state is { } known
            ? new TipOver(
                known,
                [.. crossings.Select(c => new Crossing(law.ValueAt(c.TravelPercent), c.TravelPercent, law.DegreesAt(c.TravelPercent), c.Upward, 1e6, 1e-10))])
            : null;
    }

    private double LoopGain(double travelPercent)
    {
        if (crossings.Length == 0)
        {
            return WithoutCrossings == TipOverState.Always ? 1.2 : 0.3 * travelPercent / 100;
        }

        double from = 0;
        foreach ((double travel, bool upward) in crossings)
        {
            if (travelPercent < travel)
            {
                return upward ? (travelPercent - from) / (travel - from) : 1.1;
            }

            from = travel;
        }

        return crossings[^1].Upward ? 1 + ((travelPercent - from) / 100) : 0.1;
    }
}
