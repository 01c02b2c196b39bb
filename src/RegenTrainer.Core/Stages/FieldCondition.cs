namespace RegenTrainer.Core.Stages;

/// <summary>A choice that decides whether another field has a meaning or must be given.</summary>
/// <param name="Key">Dotted key of the choice.</param>
/// <param name="Words">The words with which the condition holds.</param>
public sealed record FieldCondition(string Key, IReadOnlyList<string> Words)
{
    /// <summary>The condition as it would stand in a stage file.</summary>
    public string Phrase => $"{Key} = {string.Join(" or ", Words.Select(word => $"\"{word}\""))}";

    /// <summary>Whether the condition holds.</summary>
    /// <param name="word">The word in force for a key, or null where it is not known.</param>
    public bool Holds(Func<string, string?> word) => word(Key) is { } inForce && Words.Contains(inForce, StringComparer.Ordinal);
}
