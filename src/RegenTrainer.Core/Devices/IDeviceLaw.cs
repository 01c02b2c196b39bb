namespace RegenTrainer.Core.Devices;

/// <summary>One law of a device: currents and charges with their derivatives at given port voltages, for one temperature and grade.</summary>
public interface IDeviceLaw
{
    /// <summary>The device at a point.</summary>
    /// <param name="v1">Control against common in volt, finite.</param>
    /// <param name="v2">Output against common in volt, finite.</param>
    TwoPortPoint Evaluate(double v1, double v2);

    /// <summary>Shortens a Newton step that would throw a junction far up its exponential.</summary>
    /// <param name="v1Old">Control voltage before the step in volt.</param>
    /// <param name="v2Old">Output voltage before the step in volt.</param>
    /// <param name="v1New">Control voltage after the step; shortened where needed.</param>
    /// <param name="v2New">Output voltage after the step; shortened where needed.</param>
    /// <returns>Whether the step was shortened.</returns>
    bool LimitStep(double v1Old, double v2Old, ref double v1New, ref double v2New);
}
