namespace RegenTrainer.Core.Stages;

/// <summary>Why a design is impossible, at which field.</summary>
/// <param name="Key">The dotted key, or <c>part:NAME</c> for a part of the stage's own.</param>
/// <param name="Found">What stands there, a phrase.</param>
/// <param name="Expected">What was expected, a phrase.</param>
public sealed record FieldFault(string Key, string Found, string Expected);
