using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Devices;

/// <summary>
/// The exponential law of a junction with an emission coefficient [Shockley 1949] and the charge of its depletion layer. The
/// control terminal is the inner anode, common the cathode; the output terminal is not there: nothing flows into it and nothing
/// hangs on its voltage. Holds up to the breakdown, which it does not have; charge stored by forward current is left out, which
/// a detector's microamperes do not show.
/// </summary>
public sealed class DiodeLaw : IDeviceLaw
{
    /// <summary>
    /// Band gap in volt and power of temperature of each material: germanium [Millman and Halkias 1972], silicon [Gray and Meyer
    /// 1977], barrier and power of thermionic emission for a metal on silicon [Sze 1981]. Built-in voltage in volt and grading
    /// exponent are usual ones, from memory.
    /// </summary>
    private static readonly MaterialFigures[] _materials =
    [
        new(1.12, 3, JunctionCapacitance.BuiltInVolt, JunctionCapacitance.Grading),
        new(0.785, 2, 0.4, 0.5),
        new(0.69, 2, 0.6, 0.5),
    ];

    private readonly double _saturation;
    private readonly double _slopeVolt;
    private readonly double _criticalVolt;
    private readonly JunctionCapacitance _junction;

    /// <summary>The law of one grade at one temperature.</summary>
    /// <param name="model">The type.</param>
    /// <param name="grade">
    /// Weak loads the tank it hangs on most: it takes the high saturation current, capacitance and series resistance and the low
    /// emission coefficient; strong the opposite.
    /// </param>
    /// <param name="temperatureCelsius">Junction temperature in °C, -100 to 200.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside its range.</exception>
    public DiodeLaw(DiodeModel model, Grade grade, double temperatureCelsius)
    {
        Guard.InRange(temperatureCelsius, -100, 200, nameof(temperatureCelsius));
        MaterialFigures material = _materials[(int)model.Material];
        double emission = model.EmissionCoefficient.RisingWith(grade);
        double cold = BipolarLaw.DataSheetCelsius + PhysicalConstants.ZeroCelsius, now = temperatureCelsius + PhysicalConstants.ZeroCelsius;
        double thermal = PhysicalConstants.ThermalVoltage(temperatureCelsius);
        double inverseStep = (1 / PhysicalConstants.ThermalVoltage(BipolarLaw.DataSheetCelsius)) - (1 / thermal);

        // The emission coefficient divides the whole exponent of temperature too, so that the forward voltage at a current falls
        // at the rate of the material, whatever the coefficient.
        double exponent = (material.Power * Math.Log(now / cold)) + (material.GapVolt * inverseStep);
        _saturation = model.SaturationCurrent.FallingWith(grade) * Math.Exp(exponent / emission);
        _slopeVolt = emission * thermal;
        _criticalVolt = Math.Max(JunctionCurve.CriticalVolt(_slopeVolt, _saturation), 2 * _slopeVolt);
        _junction = JunctionCapacitance.FromReverse(
            model.Capacitance.FallingWith(grade), model.Capacitance.At ?? 0, material.BuiltInVolt, material.Grading);
    }

    /// <inheritdoc/>
    public TwoPortPoint Evaluate(double v1, double v2)
    {
        ConductionPoint conduction = Conduct(v1, v2);
        (double charge, double farad) = _junction.At(v1);
        return new TwoPortPoint(conduction.I1, 0, conduction.G11, 0, 0, 0, charge, 0, farad, 0, 0, 0);
    }

    /// <inheritdoc/>
    public ConductionPoint Conduct(double v1, double v2)
    {
        double exponential = JunctionCurve.Exponential(v1 / _slopeVolt, out double slope);
        return new ConductionPoint(_saturation * (exponential - 1), 0, _saturation * slope / _slopeVolt, 0, 0, 0);
    }

    /// <inheritdoc/>
    public bool LimitStep(double v1Old, double v2Old, ref double v1New, ref double v2New)
    {
        double limited = JunctionCurve.Limit(v1Old, v1New, _slopeVolt, _criticalVolt);
        bool shortened = limited != v1New;
        v1New = limited;
        return shortened;
    }

    private readonly record struct MaterialFigures(double GapVolt, double Power, double BuiltInVolt, double Grading);
}
