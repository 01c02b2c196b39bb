using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session;

/// <summary>A stage at a setting, as a request.</summary>
/// <param name="Solver">The stage; it is asked on other threads only through <see cref="IStageSolver.Fork"/>.</param>
/// <param name="Setting">The setting.</param>
public sealed record StageRequest(IStageSolver Solver, Setting Setting);
