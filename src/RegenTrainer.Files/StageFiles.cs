using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files;

/// <summary>A stage opened, or why it could not be.</summary>
/// <param name="Design">The checked design; null where it could not be opened.</param>
/// <param name="Text">The file's text; empty where it could not be read.</param>
/// <param name="IsPreset">Whether it is a preset.</param>
/// <param name="Faults">The faults of the file.</param>
/// <param name="Message">Why the file could not be read at all, printable; null otherwise.</param>
public sealed record OpenedFile(StageDesign? Design, string Text, bool IsPreset, IReadOnlyList<FileFault> Faults, string? Message);

/// <summary>Opens stages by path or preset name.</summary>
public static class StageFiles
{
    /// <summary>Opens a stage.</summary>
    /// <param name="pathOrPreset">A path, or the name of a preset; a file of that name wins.</param>
    public static OpenedFile Open(string pathOrPreset) => Open(pathOrPreset, Places.OfUser());

    /// <summary>Opens a stage.</summary>
    /// <param name="pathOrPreset">A path, or the name of a preset; a file of that name wins.</param>
    /// <param name="places">Where the user's devices are.</param>
    public static OpenedFile Open(string pathOrPreset, Places places)
    {
        if (!File.Exists(pathOrPreset) && Presets.Names.Contains(pathOrPreset, StringComparer.Ordinal))
        {
            return new OpenedFile(Presets.Read(pathOrPreset), Presets.Text(pathOrPreset), true, [], null);
        }

        if (!TextFiles.TryRead(pathOrPreset, out string text, out string reason))
        {
            string presets = string.Join(", ", Presets.Names);
            return new OpenedFile(null, "", false, [], $"{Printable.Text(pathOrPreset)} cannot be opened: {reason}; presets are {presets}");
        }

        string folder = Path.GetDirectoryName(Path.GetFullPath(pathOrPreset)) ?? ".";
        StageReadResult result = StageText.Read(text, pathOrPreset, DeviceShelf.Beside(folder, places));
        return new OpenedFile(result.Design, text, false, result.Faults, null);
    }
}
