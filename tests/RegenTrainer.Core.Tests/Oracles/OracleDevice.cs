using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>A nonlinear device of a carrier-level run: a law at three nodes.</summary>
/// <param name="Name">Name, unique within the stage.</param>
/// <param name="Control">Node of the control lead (base).</param>
/// <param name="Output">Node of the output lead (collector).</param>
/// <param name="Common">Node both port voltages are counted from (emitter).</param>
/// <param name="LeadOhm">Resistance in series with the control lead in ohm, from 0.</param>
/// <param name="Law">Currents and charges into the control and output leads at the two port voltages.</param>
internal sealed record OracleDevice(string Name, string Control, string Output, string Common, double LeadOhm, IDeviceLaw Law);

/// <summary>Unknowns of a device's terminals, -1 for earth.</summary>
/// <param name="Device">The device.</param>
/// <param name="Control">Unknown of the control terminal behind its lead resistance.</param>
/// <param name="Output">Unknown of the output terminal.</param>
/// <param name="Common">Unknown of the common terminal.</param>
internal sealed record OracleDevicePlace(OracleDevice Device, int Control, int Output, int Common);

/// <summary>How a constant loss tangent becomes a resistance. All agree at the reference frequency.</summary>
internal enum OracleLossForm
{
    /// <summary>A conductance across a capacitor, a resistance in series with an inductor.</summary>
    Plain,

    /// <summary>A resistance in series with a capacitor, across an inductor: carries no direct current, drops no direct voltage.</summary>
    BlockingDirectCurrent,
}
