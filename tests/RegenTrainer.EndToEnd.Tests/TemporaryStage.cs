namespace RegenTrainer.EndToEnd.Tests;

/// <summary>A stage file in a folder of its own, gone when disposed of.</summary>
internal sealed class TemporaryStage : IDisposable
{
    /// <summary>Writes the file.</summary>
    public TemporaryStage(string text)
    {
        Folder = Directory.CreateTempSubdirectory("regentrainer-stage-").FullName;
        Path = System.IO.Path.Combine(Folder, "stage.toml");
        File.WriteAllText(Path, text);
    }

    /// <summary>The folder.</summary>
    public string Folder { get; }

    /// <summary>The file.</summary>
    public string Path { get; }

    /// <inheritdoc/>
    public void Dispose() => Directory.Delete(Folder, recursive: true);
}
