namespace RegenTrainer.Session;

/// <summary>A stage at a setting, kept for comparison: what was shown of it, and its solver for what has not been shown yet.</summary>
/// <param name="Stage">What was shown.</param>
/// <param name="Solver">Its solver.</param>
public sealed record PinnedStage(StageSnapshot Stage, IStageSolver Solver);
