using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages;

/// <summary>The dial of a stage: the band it covers and the capacitor behind it.</summary>
/// <param name="LowHz">Low end of the band in Hz, above 0.</param>
/// <param name="HighHz">High end of the band in Hz, above <paramref name="LowHz"/>.</param>
/// <param name="StepHz">Channel raster in Hz, above 0.</param>
/// <param name="Capacitor">The tuning capacitor.</param>
public sealed record Dial(double LowHz, double HighHz, double StepHz, VariableCapacitor Capacitor);

/// <summary>The regeneration control: its law, and the unit of the element it turns.</summary>
/// <param name="Law">Travel to element value.</param>
/// <param name="Unit"><see cref="Unit.Ohm"/> for a rheostat, <see cref="Unit.None"/> for a feedback factor.</param>
public sealed record RegenerationControl(IControlLaw Law, Unit Unit);

/// <summary>A stage as parts at nodes, with the two things hands turn.</summary>
/// <param name="Parts">All parts; one has the role tuning, at most one the role regeneration.</param>
/// <param name="OutputNode">The node the response is counted to.</param>
/// <param name="Dial">The tuning.</param>
/// <param name="Control">The regeneration control; null where the stage has none.</param>
/// <param name="SupplyVolt">Nominal supply in volt; null where there is no supply.</param>
public sealed record StageCircuit(
    IReadOnlyList<Part> Parts, string OutputNode, Dial Dial, RegenerationControl? Control, double? SupplyVolt);
