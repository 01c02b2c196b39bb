using RegenTrainer.Core.Quantities;
using RegenTrainer.Files;

namespace RegenTrainer.Screens;

/// <summary>A stage that can be opened.</summary>
/// <param name="Where">Where it stands: used last, here, preset.</param>
/// <param name="Name">What opens it: a path or a preset's name.</param>
/// <param name="Title">Its title; empty where that is not known.</param>
internal sealed record StageChoice(string Where, string Name, string Title);

/// <summary>The stages that are offered for opening.</summary>
internal static class StageChoices
{
    private const int MostFiles = 200;

    /// <summary>What every stage file has in its format, whatever its number.</summary>
    private const string AnyFormat = "regentrainer.stage/";

    /// <summary>The files used last, those of a folder, and the presets.</summary>
    public static IReadOnlyList<StageChoice> Of(IReadOnlyList<string> lastUsed, string folder) =>
    [
        .. lastUsed.Where(File.Exists).Select(path => new StageChoice("used last", path, "")),
        .. FilesIn(folder).Select(path => new StageChoice("here", Path.GetFileName(path), "")),
        .. Presets.Names.Select(name => new StageChoice("preset", name, Printable.Text(Presets.Read(name).Title))),
    ];

    private static IReadOnlyList<string> FilesIn(string folder)
    {
        try
        {
            return
            [
                .. Directory.EnumerateFiles(folder, "*.toml").Take(MostFiles).Order(StringComparer.Ordinal)
                    .Where(path => TextFiles.TryRead(path, out string text, out _) && text.Contains(AnyFormat, StringComparison.Ordinal)),
            ];
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            return [];   // a folder that cannot be listed has no stages to offer
        }
    }
}
