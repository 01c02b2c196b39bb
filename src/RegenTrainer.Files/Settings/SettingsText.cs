using RegenTrainer.Files.Stages;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Settings;

/// <summary>What the program remembers for its user.</summary>
/// <param name="LastUsed">Paths of the stage files used last, the last one first.</param>
public sealed record UserSettings(IReadOnlyList<string> LastUsed)
{
    /// <summary>So many files are remembered.</summary>
    public const int MostFiles = 10;

    /// <summary>Settings of a user who has none yet.</summary>
    public static UserSettings Empty { get; } = new([]);

    /// <summary>The same with a file as the one used last.</summary>
    public UserSettings Using(string path) =>
        this with { LastUsed = [.. LastUsed.Where(p => p != path).Prepend(path).Take(MostFiles)] };
}

/// <summary>Settings read, or every fault of their file.</summary>
/// <param name="Settings">The settings; null where there are faults.</param>
/// <param name="Faults">What is wrong, by position.</param>
public sealed record SettingsReadResult(UserSettings? Settings, IReadOnlyList<FileFault> Faults);

/// <summary>Reads and writes the text of the settings file.</summary>
public static class SettingsText
{
    /// <summary>The format this program reads.</summary>
    public const string Format = "regentrainer.settings/1";

    private const string LastUsed = "last_used";

    /// <summary>Reads settings.</summary>
    /// <param name="text">The text.</param>
    /// <param name="fileName">Its name for messages.</param>
    public static SettingsReadResult Read(string text, string fileName)
    {
        List<FileFault> faults = [];
        UserSettings? settings = Read(text, fileName, faults, out _);
        return new SettingsReadResult(faults.Count == 0 ? settings : null, faults);
    }

    /// <summary>Writes settings into a text: comments and order stay, what is the same already stays as it is written.</summary>
    /// <param name="text">A text that reads without faults; empty for a file that is not there yet.</param>
    /// <param name="settings">The settings to stand in it.</param>
    /// <exception cref="ArgumentException">The text has faults.</exception>
    public static string Write(string text, UserSettings settings)
    {
        string list = "[" + string.Concat(settings.LastUsed.Select(p => $"\n  {Notation.Quoted(p)},")) + (settings.LastUsed.Count > 0 ? "\n]" : "]");
        if (text.Length == 0)
        {
            return $"format = \"{Format}\"\n\n# Stage files used last, the last one first.\n{LastUsed} = {list}\n";
        }

        List<FileFault> faults = [];
        UserSettings? old = Read(text, "settings", faults, out TomlTable? root);
        if (old is null || faults.Count > 0)
        {
            throw new ArgumentException($"The text has faults: {faults[0]}", nameof(text));
        }

        if (old.LastUsed.SequenceEqual(settings.LastUsed, StringComparer.Ordinal))
        {
            return text;
        }

        var edits = new TextEdits(text);
        if (root!.Find(LastUsed) is { } entry)
        {
            edits.Replace(entry.Value.Span, list);
        }
        else
        {
            edits.InsertLineBehind(root.Body!.Value.End, $"{LastUsed} = {list}");
        }

        return edits.Apply();
    }

    private static UserSettings? Read(string text, string fileName, List<FileFault> faults, out TomlTable? root)
    {
        root = TomlReader.TryRead(fileName, text, faults);
        if (root is null)
        {
            return null;
        }

        var reader = new TableReader(fileName, root, faults);
        if (reader.Choice("format", [Format], required: true) is null)
        {
            return null;
        }

        const string expected = "a list of paths in quotes";
        List<string> paths = [];
        foreach (TomlValue value in reader.List(LastUsed, required: false, expected))
        {
            if (value is TomlText path)
            {
                paths.Add(path.Text);
            }
            else
            {
                reader.Refuse(value.At, value.Phrase, expected);
            }
        }

        reader.Finish();
        return new UserSettings(paths);
    }
}
