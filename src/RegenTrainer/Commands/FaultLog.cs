using System.Globalization;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files;
using RegenTrainer.Files.Saving;

namespace RegenTrainer.Commands;

/// <summary>Keeps the particulars of a fault of our own in a file of the user's, so that standard error stays one line.</summary>
internal static class FaultLog
{
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
    /// <exception cref="DirectoryNotFoundException">The user has no home.</exception>
    private static string Folder()
    {
        string folder = Places.OfUser().State ?? throw new DirectoryNotFoundException("The user has no home.");
        AtomicFile.MakeOwnFolder(folder);
        return folder;
    }
}
