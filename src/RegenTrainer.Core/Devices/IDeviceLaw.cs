namespace RegenTrainer.Core.Devices;

/// <summary>One law of a device: currents and charges with their derivatives at given port voltages, for one temperature and grade.</summary>
public interface IDeviceLaw
{
    /// <summary>The device at a point.</summary>
    /// <param name="v1">Control against common in volt, finite.</param>
    /// <param name="v2">Output against common in volt, finite.</param>
    TwoPortPoint Evaluate(double v1, double v2);

    /// <summary>The currents of the device at a point: those of <see cref="Evaluate"/>, a law may have them at less expense.</summary>
    /// <param name="v1">Control against common in volt, finite.</param>
    /// <param name="v2">Output against common in volt, finite.</param>
    ConductionPoint Conduct(double v1, double v2)
    {
        TwoPortPoint p = Evaluate(v1, v2);
        return new ConductionPoint(p.I1, p.I2, p.G11, p.G12, p.G21, p.G22);
    }

    /// <summary>Shortens a Newton step that would throw a junction far up its exponential.</summary>
    /// <param name="v1Old">Control voltage before the step in volt.</param>
    /// <param name="v2Old">Output voltage before the step in volt.</param>
    /// <param name="v1New">Control voltage after the step; shortened where needed.</param>
    /// <param name="v2New">Output voltage after the step; shortened where needed.</param>
    /// <returns>Whether the step was shortened.</returns>
    bool LimitStep(double v1Old, double v2Old, ref double v1New, ref double v2New);
}
