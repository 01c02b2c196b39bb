namespace RegenTrainer.Files.Reports;

/// <summary>One preset as a list names it.</summary>
/// <param name="Name">The name it is opened by.</param>
/// <param name="Title">Its title.</param>
/// <param name="Circuit">Its circuit family.</param>
public sealed record PresetEntry(string Name, string Title, string Circuit);

/// <summary>The presets as JSON, schema <c>regentrainer.presets/1</c>.</summary>
public static class PresetsJson
{
    /// <summary>Writes the list of presets as UTF-8 text.</summary>
    public static byte[] Write(IReadOnlyList<PresetEntry> presets) =>
        Report.Write("presets", null, null, [], writer => writer.List("presets", presets, (w, preset) =>
        {
            w.Word("name", preset.Name);
            w.Word("title", preset.Title);
            w.Word("circuit", preset.Circuit);
        }));
}
