using System.Globalization;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Commands;

/// <summary>Keeps the particulars of a fault of our own in a file of the user's, so that standard error stays one line.</summary>
internal static class FaultLog
{
    private const string FolderName = "regentrainer";
    private const string FileName = "faults.log";

    /// <summary>Writes a fault down.</summary>
    /// <returns>The line for standard error: where the particulars stand, or that they could not be kept.</returns>
    public static string Keep(Exception fault)
    {
        try
        {
            string path = Path.Combine(Folder(), FileName);
            string entry = $"{DateTime.UtcNow.ToString("u", CultureInfo.InvariantCulture)} {fault}\n\n";
            File.AppendAllText(path, entry);
            return $"regentrainer: a fault of the program itself stopped it; the particulars are in {Printable.Text(path)}";
        }
        catch (Exception refused) when (refused is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            return "regentrainer: a fault of the program itself stopped it; the particulars could not be kept, "
                + "for the folder of the log cannot be written";
        }
    }

    /// <summary>The folder of the log, made if need be; for the user alone where the system knows modes.</summary>
    private static string Folder()
    {
        string folder = Path.Combine(StateHome(), FolderName);
        if (OperatingSystem.IsWindows())
        {
            Directory.CreateDirectory(folder);
        }
        else
        {
            Directory.CreateDirectory(folder, UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);
        }

        return folder;
    }

    /// <summary>XDG Base Directory Specification: an absolute <c>$XDG_STATE_HOME</c>, or <c>~/.local/state</c>.</summary>
    /// <exception cref="DirectoryNotFoundException">The user has no home.</exception>
    private static string StateHome()
    {
        if (OperatingSystem.IsWindows())
        {
            return Place(Environment.SpecialFolder.LocalApplicationData);
        }

        string? set = Environment.GetEnvironmentVariable("XDG_STATE_HOME");
        return Path.IsPathRooted(set) ? set : Path.Combine(Place(Environment.SpecialFolder.UserProfile), ".local", "state");
    }

    private static string Place(Environment.SpecialFolder folder) =>
        Environment.GetFolderPath(folder) is { Length: > 0 } path ? path : throw new DirectoryNotFoundException("The user has no home.");
}
