namespace RegenTrainer.Core.Devices;

/// <summary>
/// A three-terminal device at one point, as a two-port of control, output and common terminal: v1 is control and v2 output
/// against common. Currents in ampere flow into control (1) and output (2), charges in coulomb likewise; common has minus both.
/// </summary>
/// <param name="I1">Current into the control terminal in ampere.</param>
/// <param name="I2">Current into the output terminal in ampere.</param>
/// <param name="G11">dI1/dv1 in siemens.</param>
/// <param name="G12">dI1/dv2 in siemens.</param>
/// <param name="G21">dI2/dv1 in siemens.</param>
/// <param name="G22">dI2/dv2 in siemens.</param>
/// <param name="Q1">Charge on the control terminal in coulomb.</param>
/// <param name="Q2">Charge on the output terminal in coulomb.</param>
/// <param name="C11">dQ1/dv1 in farad.</param>
/// <param name="C12">dQ1/dv2 in farad.</param>
/// <param name="C21">dQ2/dv1 in farad.</param>
/// <param name="C22">dQ2/dv2 in farad.</param>
public readonly record struct TwoPortPoint(
    double I1, double I2, double G11, double G12, double G21, double G22,
    double Q1, double Q2, double C11, double C12, double C21, double C22);

/// <summary>What a circuit stamps for a device: an admittance G + sC and the mean currents.</summary>
/// <param name="G11">Conductance in siemens.</param>
/// <param name="G12">Conductance in siemens.</param>
/// <param name="G21">Conductance in siemens.</param>
/// <param name="G22">Conductance in siemens.</param>
/// <param name="C11">Capacitance in farad.</param>
/// <param name="C12">Capacitance in farad.</param>
/// <param name="C21">Capacitance in farad.</param>
/// <param name="C22">Capacitance in farad.</param>
/// <param name="MeanControlAmpere">Mean current into the control terminal in ampere.</param>
/// <param name="MeanOutputAmpere">Mean current into the output terminal in ampere.</param>
public readonly record struct Linearisation(
    double G11, double G12, double G21, double G22, double C11, double C12, double C21, double C22,
    double MeanControlAmpere, double MeanOutputAmpere)
{
    /// <summary>The small-signal linearisation of a device at a point.</summary>
    public static Linearisation From(in TwoPortPoint p) =>
        new(p.G11, p.G12, p.G21, p.G22, p.C11, p.C12, p.C21, p.C22, p.I1, p.I2);
}
