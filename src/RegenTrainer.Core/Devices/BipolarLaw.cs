using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Devices;

/// <summary>
/// The transport form of the Ebers-Moll law with both junctions [Ebers and Moll 1954; Gray and Meyer 1977], Early's voltage
/// [Early 1952], a base current that gains a second exponential of emission coefficient 2 at low currents [Sah, Noyce and
/// Shockley 1957], diffusion charge and junction capacitances.
/// </summary>
public sealed class BipolarLaw : IDeviceLaw
{
    /// <summary>Temperature in °C at which data sheets state their figures.</summary>
    public const double DataSheetCelsius = 25;

    /// <summary>Current gain with emitter and collector exchanged: usual for small planar transistors, from memory.</summary>
    private const double ReverseGain = 5;

    /// <summary>Band gap of silicon in volt [Gray and Meyer 1977].</summary>
    private const double BandGapVolt = 1.12;

    /// <summary>The saturation current rises as this power of temperature beside the band gap's exponential [Gray and Meyer 1977].</summary>
    private const double SaturationPower = 3;

    /// <summary>The gain rises as this power of temperature, 0.6 %/K near 25 °C: from memory.</summary>
    private const double GainPower = 1.75;

    /// <summary>The transport factor 1 - v_bc/V_A is held above this where a large forward collector junction would turn it over.</summary>
    private const double SmallestEarlyFactor = 0.05;

    /// <summary>Collector-emitter voltage in volt at which data sheets state gain and transition frequency: common practice.</summary>
    private const double DataSheetVolt = 5;

    private readonly double _sign;
    private readonly double _thermalVolt;
    private readonly double _saturation;
    private readonly double _inverseGain;
    private readonly double _recombination;
    private readonly double _earlyVolt;
    private readonly double _transitSeconds;
    private readonly double _criticalVolt;
    private readonly JunctionCapacitance _emitterJunction;
    private readonly JunctionCapacitance _collectorJunction;

    /// <summary>The law of one grade at one temperature.</summary>
    /// <param name="model">The type.</param>
    /// <param name="grade">Weak takes the low gain, transition frequency and saturation current and the high capacitances; strong the opposite.</param>
    /// <param name="temperatureCelsius">Junction temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside its range.</exception>
    public BipolarLaw(BipolarModel model, Grade grade, double temperatureCelsius)
    {
        Guard.InRange(temperatureCelsius, -100, 200, nameof(temperatureCelsius));
        _sign = model.Polarity == Polarity.Npn ? 1 : -1;
        _thermalVolt = PhysicalConstants.ThermalVoltage(temperatureCelsius);
        double cold = DataSheetCelsius + PhysicalConstants.ZeroCelsius, now = temperatureCelsius + PhysicalConstants.ZeroCelsius;
        double coldThermal = PhysicalConstants.ThermalVoltage(DataSheetCelsius);
        double coldSaturation = model.SaturationCurrent.RisingWith(grade);
        double rise = Math.Pow(now / cold, SaturationPower) * Math.Exp(BandGapVolt * ((1 / coldThermal) - (1 / _thermalVolt)));
        double gainRise = Math.Pow(now / cold, GainPower);
        _saturation = coldSaturation * rise;
        _earlyVolt = model.EarlyVoltage.Typical;
        (_inverseGain, _recombination) = BaseCurrents(model, grade, coldSaturation);
        _inverseGain /= gainRise;
        _recombination *= Math.Sqrt(rise) / gainRise;
        _emitterJunction = JunctionCapacitance.FromReverse(model.InputCapacitance.FallingWith(grade), model.InputCapacitance.At ?? 0.5);
        _collectorJunction = JunctionCapacitance.FromReverse(model.OutputCapacitance.FallingWith(grade), model.OutputCapacitance.At ?? 5);

        // tau = 1/(2 pi f_T) - (C_je + C_jc) V_T/I at the current the transition frequency is stated for; only the part of that
        // current that is not Early's has its charge in the base.
        double transition = model.TransitionFrequency.RisingWith(grade), transitionAt = model.TransitionFrequency.At ?? 1e-2;
        (double baseVolt, double early) = SheetPoint(transitionAt, coldSaturation);
        double junctions = _emitterJunction.At(baseVolt).Farad + _collectorJunction.At(baseVolt - DataSheetVolt).Farad;
        double transit = (1 / (2 * Math.PI * transition)) - (junctions * coldThermal / transitionAt);
        IsTransitTimeClamped = transit < 0;
        _transitSeconds = Math.Max(0, transit) * early;
        _criticalVolt = JunctionCurve.CriticalVolt(_thermalVolt, _saturation);
    }

    /// <summary>Whether the stated capacitances alone are slower than the stated transition frequency, so that no transit time is left.</summary>
    public bool IsTransitTimeClamped { get; }

    /// <inheritdoc/>
    public TwoPortPoint Evaluate(double v1, double v2)
    {
        double baseEmitter = _sign * v1, baseCollector = _sign * (v1 - v2);
        ConductionPoint conduction = Conduct(baseEmitter, baseCollector, out double forwardAmpere, out double forwardSiemens);
        (double emitterCharge, double emitterFarad) = _emitterJunction.At(baseEmitter);
        (double collectorCharge, double collectorFarad) = _collectorJunction.At(baseCollector);
        emitterCharge += _transitSeconds * forwardAmpere;
        emitterFarad += _transitSeconds * forwardSiemens;
        return new TwoPortPoint(
            conduction.I1,
            conduction.I2,
            conduction.G11,
            conduction.G12,
            conduction.G21,
            conduction.G22,
            _sign * (emitterCharge + collectorCharge),
            -_sign * collectorCharge,
            emitterFarad + collectorFarad,
            -collectorFarad,
            -collectorFarad,
            collectorFarad);
    }

    /// <inheritdoc/>
    public ConductionPoint Conduct(double v1, double v2) => Conduct(_sign * v1, _sign * (v1 - v2), out _, out _);

    private ConductionPoint Conduct(double baseEmitter, double baseCollector, out double forwardAmpere, out double forwardSiemens)
    {
        double half = JunctionCurve.Exponential(0.5 * baseEmitter / _thermalVolt, out double halfSlope);
        (double forward, double forwardSlope) = 0.5 * baseEmitter / _thermalVolt < JunctionCurve.LargestExponent / 2
            ? (half * half, half * half)
            : (JunctionCurve.Exponential(baseEmitter / _thermalVolt, out double s), s);
        double reverse = JunctionCurve.Exponential(baseCollector / _thermalVolt, out double reverseSlope);

        forwardAmpere = _saturation * (forward - 1);
        double reverseAmpere = _saturation * (reverse - 1);
        forwardSiemens = _saturation * forwardSlope / _thermalVolt;
        double reverseSiemens = _saturation * reverseSlope / _thermalVolt;
        double early = 1 - (baseCollector / _earlyVolt);
        bool held = early < SmallestEarlyFactor;
        early = held ? SmallestEarlyFactor : early;
        double byEarly = held ? 0 : -(forwardAmpere - reverseAmpere) / _earlyVolt;

        // Derivatives by the two junction voltages first, then by the port voltages: v_be = v1, v_bc = v1 - v2.
        double transport = (forwardAmpere - reverseAmpere) * early;
        double transportByEmitter = forwardSiemens * early, transportByCollector = (-reverseSiemens * early) + byEarly;
        double emitterBase = (forwardAmpere * _inverseGain) + (_recombination * (half - 1));
        double emitterBaseSiemens = (forwardSiemens * _inverseGain) + (_recombination * 0.5 * halfSlope / _thermalVolt);
        double collectorBase = reverseAmpere / ReverseGain, collectorBaseSiemens = reverseSiemens / ReverseGain;
        return new ConductionPoint(
            _sign * (emitterBase + collectorBase),
            _sign * (transport - collectorBase),
            emitterBaseSiemens + collectorBaseSiemens,
            -collectorBaseSiemens,
            transportByEmitter + transportByCollector - collectorBaseSiemens,
            collectorBaseSiemens - transportByCollector);
    }

    /// <inheritdoc/>
    public bool LimitStep(double v1Old, double v2Old, ref double v1New, ref double v2New)
    {
        double emitter = JunctionCurve.Limit(_sign * v1Old, _sign * v1New, _thermalVolt, _criticalVolt);
        double collector = JunctionCurve.Limit(_sign * (v1Old - v2Old), _sign * (v1New - v2New), _thermalVolt, _criticalVolt);
        if (emitter == _sign * v1New && collector == _sign * (v1New - v2New))
        {
            return false;
        }

        (v1New, v2New) = (_sign * emitter, _sign * (emitter - collector));
        return true;
    }

    /// <summary>Base voltage and Early's factor at the voltage of data sheets, their temperature and a collector current.</summary>
    private (double BaseVolt, double Early) SheetPoint(double collectorAmpere, double saturation)
    {
        double thermal = PhysicalConstants.ThermalVoltage(DataSheetCelsius), volt = 0, early = 1;

        // The factor hangs on the base voltage by less than a hundredth part of it, so that each round adds two digits or more.
        for (int round = 0; round < 10; round++)
        {
            volt = thermal * Math.Log(collectorAmpere / (saturation * early));
            early = Math.Max(1 + ((DataSheetVolt - volt) / _earlyVolt), SmallestEarlyFactor);
        }

        return (volt, early);
    }

    /// <summary>
    /// One over the ideal gain, and the recombination current in ampere at the temperature of data sheets: the two stated gains
    /// give both, exactly. A gain that falls faster than the root of the current is met at its higher current alone.
    /// </summary>
    private (double InverseGain, double Recombination) BaseCurrents(BipolarModel model, Grade grade, double saturation)
    {
        double gain = model.CurrentGain.RisingWith(grade), gainAt = model.CurrentGain.At ?? 1e-3;
        (double forward, double half, double demand) = Point(gain, gainAt);
        double recombination = 0;
        if (model.CurrentGainLow is { At: { } lowAt } low && lowAt < gainAt)
        {
            (double lowForward, double lowHalf, double lowDemand) = Point(low.Typical * gain / model.CurrentGain.Typical, lowAt);
            recombination = ((lowDemand * forward) - (demand * lowForward)) / ((lowHalf * forward) - (half * lowForward));
            recombination = Math.Max(0, Math.Min(recombination, demand / half));
        }

        return ((demand - (recombination * half)) / forward, recombination);

        (double Forward, double Half, double Demand) Point(double ratio, double ampere)
        {
            double volt = SheetPoint(ampere, saturation).BaseVolt, thermal = PhysicalConstants.ThermalVoltage(DataSheetCelsius);
            return (saturation * (Math.Exp(volt / thermal) - 1), Math.Exp(0.5 * volt / thermal) - 1, ampere / ratio);
        }
    }
}
