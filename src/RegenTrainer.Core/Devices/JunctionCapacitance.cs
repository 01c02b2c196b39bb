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

    private const double BendVolt = BuiltInVolt / 2;

    private readonly double _zeroBias;
    private readonly double _bendFarad;
    private readonly double _bendSlope;
    private readonly double _bendCharge;

    /// <summary>A junction by its capacitance without bias, in farad.</summary>
    public JunctionCapacitance(double zeroBiasFarad)
    {
        _zeroBias = zeroBiasFarad;
        _bendFarad = zeroBiasFarad * Math.Pow(0.5, -Grading);
        _bendSlope = _bendFarad * Grading / (BuiltInVolt * 0.5);
        _bendCharge = zeroBiasFarad * BuiltInVolt / (1 - Grading) * (1 - Math.Pow(0.5, 1 - Grading));
    }

    /// <summary>The junction whose capacitance at a reverse voltage is given.</summary>
    public static JunctionCapacitance FromReverse(double farad, double reverseVolt) =>
        new(farad * Math.Pow(1 + (reverseVolt / BuiltInVolt), Grading));

    /// <summary>Charge in coulomb (zero without bias) and capacitance in farad at a forward voltage.</summary>
    public (double Charge, double Farad) At(double volt)
    {
        if (volt > BendVolt)
        {
            double above = volt - BendVolt;
            return (_bendCharge + (above * (_bendFarad + (0.5 * above * _bendSlope))), _bendFarad + (above * _bendSlope));
        }

        // One power serves both: (1-v/phi)^(1-m) = (1-v/phi) (1-v/phi)^-m.
        double rest = 1 - (volt / BuiltInVolt);
        double power = Math.Exp(-Grading * Math.Log(rest));
        return (_zeroBias * BuiltInVolt / (1 - Grading) * (1 - (rest * power)), _zeroBias * power);
    }
}
