namespace RegenTrainer.Files.Toml;

/// <summary>A place in a text.</summary>
/// <param name="Line">Line, from 1.</param>
/// <param name="Column">Column in characters, from 1.</param>
internal readonly record struct TomlPlace(int Line, int Column)
{
    public static readonly TomlPlace Start = new(1, 1);
}

/// <summary>A span of a text by character offsets.</summary>
/// <param name="Offset">First character, from 0.</param>
/// <param name="Length">Number of characters.</param>
internal readonly record struct TomlSpan(int Offset, int Length)
{
    public int End => Offset + Length;
}
