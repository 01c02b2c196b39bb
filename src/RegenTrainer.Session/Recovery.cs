namespace RegenTrainer.Session;

/// <summary>Unsaved work of a session that did not end cleanly.</summary>
/// <param name="Name">The name of the stage's file, or of the preset it came from.</param>
/// <param name="Path">The file it belongs to; null for a preset or what was never saved.</param>
/// <param name="At">When it was kept.</param>
/// <param name="StoredIn">The file that keeps it: a stage file that can be opened by itself.</param>
public sealed record Recovery(string Name, string? Path, DateTimeOffset At, string StoredIn);
