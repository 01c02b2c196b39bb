using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>
/// What a device's law adds, at a departure of its port voltages from the operating point, to its linear part there:
/// charge in coulomb, current in ampere, and the flow (2/h) charge + current of the trapezoidal rule.
/// </summary>
internal sealed class PortExcess(
    IDeviceLaw law, (double Control, double Output) bias, double[,] siemens, double[,] farad, double twoOverH)
{
    private readonly TwoPortPoint _rest = law.Evaluate(bias.Control, bias.Output);
    private TwoPortPoint _point;
    private double _u1;
    private double _u2;

    /// <summary>Evaluates the law at a departure.</summary>
    internal void Evaluate(double u1, double u2)
    {
        (_u1, _u2) = (u1, u2);
        _point = law.Evaluate(bias.Control + u1, bias.Output + u2);
    }

    internal double Charge(int port) =>
        (port == 0 ? _point.Q1 - _rest.Q1 : _point.Q2 - _rest.Q2) - (farad[port, 0] * _u1) - (farad[port, 1] * _u2);

    internal double Flow(int port) =>
        (port == 0 ? _point.I1 - _rest.I1 : _point.I2 - _rest.I2) - (siemens[port, 0] * _u1) - (siemens[port, 1] * _u2)
        + (twoOverH * Charge(port));

    /// <summary>Slope of the flow of a port against a port's voltage; only speeds up Newton's method.</summary>
    internal double Slope(int port, int against) => (port, against) switch
    {
        (0, 0) => _point.G11 + (twoOverH * _point.C11),
        (0, 1) => _point.G12 + (twoOverH * _point.C12),
        (1, 0) => _point.G21 + (twoOverH * _point.C21),
        _ => _point.G22 + (twoOverH * _point.C22),
    } - siemens[port, against] - (twoOverH * farad[port, against]);
}
