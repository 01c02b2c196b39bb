namespace RegenTrainer.Session;

/// <summary>What a batch came to.</summary>
/// <typeparam name="T">One index's result.</typeparam>
/// <param name="Results">The results of the first indices in order, all that were done without a gap.</param>
/// <param name="Count">How many were asked for.</param>
public sealed record BatchResult<T>(IReadOnlyList<T> Results, int Count)
{
    /// <summary>Whether it was stopped before its end.</summary>
    public bool IsCut => Results.Count < Count;
}
