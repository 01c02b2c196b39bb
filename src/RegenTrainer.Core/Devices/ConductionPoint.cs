namespace RegenTrainer.Core.Devices;

/// <summary>The currents of a three-terminal device at one point, in the terms of <see cref="TwoPortPoint"/>, without its charges.</summary>
/// <param name="I1">Current into the control terminal in ampere.</param>
/// <param name="I2">Current into the output terminal in ampere.</param>
/// <param name="G11">dI1/dv1 in siemens.</param>
/// <param name="G12">dI1/dv2 in siemens.</param>
/// <param name="G21">dI2/dv1 in siemens.</param>
/// <param name="G22">dI2/dv2 in siemens.</param>
public readonly record struct ConductionPoint(double I1, double I2, double G11, double G12, double G21, double G22);
