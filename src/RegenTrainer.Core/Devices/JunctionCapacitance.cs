namespace RegenTrainer.Core.Devices;

/// <summary>
/// Charge and capacitance of a junction, C0/(1 - v/phi)^m, continued with its slope above half the built-in voltage, where the
/// depletion formula loses its meaning [Gray and Meyer 1977, sec. 1.2].
/// </summary>
internal readonly struct JunctionCapacitance
{
    /// <summary>Built-in voltage in volt: usual for silicon, from memory.</summary>
    public const double BuiltInVolt = 0.75;

    /// <summary>Grading exponent: a graded junction, from memory.</summary>
    public const double Grading = 0.33;

    private readonly double _zeroBias;
    private readonly double _builtInVolt;
    private readonly double _grading;
    private readonly double _bendFarad;
    private readonly double _bendSlope;
    private readonly double _bendCharge;

    /// <summary>A junction by its capacitance without bias.</summary>
    /// <param name="zeroBiasFarad">Capacitance without bias in farad.</param>
    /// <param name="builtInVolt">Built-in voltage in volt, above 0.</param>
    /// <param name="grading">Grading exponent, above 0 and below 1.</param>
    public JunctionCapacitance(double zeroBiasFarad, double builtInVolt = BuiltInVolt, double grading = Grading)
    {
        (_zeroBias, _builtInVolt, _grading) = (zeroBiasFarad, builtInVolt, grading);
        _bendFarad = zeroBiasFarad * Math.Pow(0.5, -grading);
        _bendSlope = _bendFarad * grading / (builtInVolt * 0.5);
        _bendCharge = zeroBiasFarad * builtInVolt / (1 - grading) * (1 - Math.Pow(0.5, 1 - grading));
    }

    /// <summary>The junction whose capacitance at a reverse voltage is given.</summary>
    public static JunctionCapacitance FromReverse(
        double farad, double reverseVolt, double builtInVolt = BuiltInVolt, double grading = Grading) =>
        new(farad * Math.Pow(1 + (reverseVolt / builtInVolt), grading), builtInVolt, grading);

    /// <summary>Charge in coulomb (zero without bias) and capacitance in farad at a forward voltage.</summary>
    public (double Charge, double Farad) At(double volt)
    {
        double above = volt - (_builtInVolt / 2);
        if (above > 0)
        {
            return (_bendCharge + (above * (_bendFarad + (0.5 * above * _bendSlope))), _bendFarad + (above * _bendSlope));
        }

        // One power serves both: (1-v/phi)^(1-m) = (1-v/phi) (1-v/phi)^-m.
        double rest = 1 - (volt / _builtInVolt);
        double power = Math.Exp(-_grading * Math.Log(rest));
        return (_zeroBias * _builtInVolt / (1 - _grading) * (1 - (rest * power)), _zeroBias * power);
    }
}
