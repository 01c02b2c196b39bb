using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>A transistor without collector junction: I_C = I_S (exp(v/V_T) - 1), I_B = I_C/gain, and one constant capacitance.</summary>
internal sealed record ExponentialLaw(double SaturationAmpere, double ThermalVolt, double Gain, double InputFarad = 0) : IDeviceLaw
{
    public TwoPortPoint Evaluate(double v1, double v2)
    {
        double collector = SaturationAmpere * (Math.Exp(v1 / ThermalVolt) - 1);
        double slope = SaturationAmpere / ThermalVolt * Math.Exp(v1 / ThermalVolt);
        return new TwoPortPoint(
            collector / Gain, collector, slope / Gain, 0, slope, 0, InputFarad * v1, 0, InputFarad, 0, 0, 0);
    }

    public bool LimitStep(double oldV1, double oldV2, ref double newV1, ref double newV2) => false;
}

/// <summary>Two terminals: i = -g (v - v^3/(3 V^2)), a negative conductance that saturates, in parallel with a quadratic charge.</summary>
internal sealed record CubicLaw(double Siemens, double Volt, double Farad = 0, double FaradPerVolt = 0) : IDeviceLaw
{
    public TwoPortPoint Evaluate(double v1, double v2)
    {
        double x = v1 / Volt;
        return new TwoPortPoint(
            -Siemens * Volt * (x - (x * x * x / 3)),
            0,
            -Siemens * (1 - (x * x)),
            0,
            0,
            0,
            (Farad * v1) + (0.5 * FaradPerVolt * v1 * v1),
            0,
            Farad + (FaradPerVolt * v1),
            0,
            0,
            0);
    }

    public bool LimitStep(double oldV1, double oldV2, ref double newV1, ref double newV2) => false;
}

/// <summary>
/// A transistor with both junctions (transport form) and 25 mV: I_S 1e-15 A, gains 200 and 4, a transit time, and constant
/// junction capacitances [Ebers and Moll 1954].
/// </summary>
internal sealed record TwoJunctionLaw(double TransitSecond = 0, double EmitterFarad = 0, double CollectorFarad = 0) : IDeviceLaw
{
    private const double Thermal = 0.025;
    private const double Saturation = 1e-15;
    private const double Forward = 200;
    private const double Reverse = 4;

    public TwoPortPoint Evaluate(double v1, double v2)
    {
        double vbc = v1 - v2;
        (double f, double r) = (Saturation * (Math.Exp(v1 / Thermal) - 1), Saturation * (Math.Exp(vbc / Thermal) - 1));
        (double df, double dr) = ((f + Saturation) / Thermal, (r + Saturation) / Thermal);
        double chargeBc = CollectorFarad * vbc;
        return new TwoPortPoint(
            (f / Forward) + (r / Reverse),
            f - r - (r / Reverse),
            (df / Forward) + (dr / Reverse),
            -dr / Reverse,
            df - dr - (dr / Reverse),
            dr + (dr / Reverse),
            (TransitSecond * f) + (EmitterFarad * v1) + chargeBc,
            -chargeBc,
            (TransitSecond * df) + EmitterFarad + CollectorFarad,
            -CollectorFarad,
            -CollectorFarad,
            CollectorFarad);
    }

    public bool LimitStep(double oldV1, double oldV2, ref double newV1, ref double newV2) => false;
}
