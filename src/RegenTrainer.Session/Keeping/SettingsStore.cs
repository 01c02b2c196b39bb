using System.Text;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files;
using RegenTrainer.Files.Saving;
using RegenTrainer.Files.Settings;

namespace RegenTrainer.Session.Keeping;

/// <summary>The user's settings file. One that cannot be understood is never written over.</summary>
/// <param name="places">Where it is.</param>
internal sealed class SettingsStore(Places places)
{
    private const string Name = "settings.toml";

    private string? File => places.Settings is { } folder ? Path.Combine(folder, Name) : null;

    /// <summary>The settings as the file has them.</summary>
    /// <param name="notice">Why it could not be read; empty where it could or there is none.</param>
    public UserSettings Load(out string notice) => TryLoad(out _, out notice) ?? UserSettings.Empty;

    /// <summary>Puts a file down as the one used last, beside what other programs have put down since.</summary>
    /// <param name="path">Its full path.</param>
    /// <param name="notice">Why that could not be kept; empty where it could.</param>
    /// <returns>The settings now; null where they could not be read.</returns>
    public UserSettings? Use(string path, out string notice)
    {
        if (TryLoad(out string text, out notice) is not { } settings || File is not { } file)
        {
            return null;
        }

        UserSettings used = settings.Using(path);
        string written = SettingsText.Write(text, used);
        if (written == text)
        {
            return used;
        }

        string reason;
        try
        {
            AtomicFile.MakeOwnFolder(places.Settings!);
            AtomicFile.TryWrite(file, Encoding.UTF8.GetBytes(written), null, out reason);
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            reason = FileTrouble.Words(e);
        }

        notice = reason.Length == 0 ? "" : $"the files used last are not remembered: {Printable.Text(file)}: {reason}";
        return used;
    }

    private UserSettings? TryLoad(out string text, out string notice)
    {
        (text, notice) = ("", "");
        if (File is not { } file || !System.IO.File.Exists(file))
        {
            return UserSettings.Empty;
        }

        if (!TextFiles.TryRead(file, out text, out string reason))
        {
            notice = $"the settings are left alone: {Printable.Text(file)}: {reason}";
            return null;
        }

        SettingsReadResult result = SettingsText.Read(text, file);
        notice = result.Settings is null ? $"the settings are left alone: {result.Faults[0]}" : "";
        return result.Settings;
    }
}
