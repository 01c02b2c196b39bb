using RegenTrainer.Core.Stages;

namespace RegenTrainer.Files.Stages;

/// <summary>A stage file read: the design, or every fault in it.</summary>
/// <param name="Design">The checked design; null where there are faults.</param>
/// <param name="Faults">What is wrong, by position.</param>
public sealed record StageReadResult(StageDesign? Design, IReadOnlyList<FileFault> Faults);
