using RegenTrainer.Core.Stages;
using RegenTrainer.Files;

namespace RegenTrainer.Session;

/// <summary>A design with the text it was read from and where that came from.</summary>
/// <param name="Design">The design as the text has it.</param>
/// <param name="Text">The text.</param>
/// <param name="Path">The full path of its file; null for a preset or what was never saved.</param>
/// <param name="Name">The file's name or the preset's, as it is; printed through <c>Printable</c>.</param>
public sealed record StageDocument(StageDesign Design, string Text, string? Path, string Name)
{
    /// <summary>The document of a stage just opened.</summary>
    /// <param name="pathOrPreset">What was asked for.</param>
    /// <param name="file">What was found; without faults.</param>
    /// <exception cref="ArgumentException">The file could not be opened.</exception>
    public static StageDocument Of(string pathOrPreset, OpenedFile file)
    {
        StageDesign design = file.Design ?? throw new ArgumentException("The file was not opened.", nameof(file));
        return file.IsPreset
            ? new StageDocument(design, file.Text, null, pathOrPreset)
            : new StageDocument(design, file.Text, System.IO.Path.GetFullPath(pathOrPreset), System.IO.Path.GetFileName(pathOrPreset));
    }
}
