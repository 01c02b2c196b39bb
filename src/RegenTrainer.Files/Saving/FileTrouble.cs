namespace RegenTrainer.Files.Saving;

/// <summary>Why the system would not read or write a file, in plain words with what helps.</summary>
public static class FileTrouble
{
    private const int UnixDiskFull = 28;         // ENOSPC
    private const int UnixReadOnlyDisk = 30;     // EROFS
    private const int LinuxShareUsedUp = 122;    // EDQUOT
    private const int WindowsHeld = unchecked((int)0x80070020);
    private const int WindowsDiskFull = unchecked((int)0x80070070);

    /// <summary>Whether an exception is the system's answer about a file, not a fault of the program.</summary>
    public static bool Is(Exception e) => e is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException;

    /// <summary>The reason as a phrase: why, and what to do.</summary>
    /// <param name="e">What the system threw.</param>
    public static string Words(Exception e) => e switch
    {
        UnauthorizedAccessException => "access is denied; choose a place where you may write",
        DirectoryNotFoundException => "its folder is not there; make the folder or choose another",
        FileNotFoundException => "there is no such file",
        PathTooLongException => "the path is too long; choose a shorter one",
        IOException { HResult: UnixDiskFull or WindowsDiskFull } => "the disk is full; make room or choose another place",
        IOException { HResult: LinuxShareUsedUp } => "your share of the disk is used up; make room or choose another place",
        IOException { HResult: UnixReadOnlyDisk } => "the disk can only be read; choose another place",
        IOException { HResult: WindowsHeld } => "another program holds it; close it there and try again",
        IOException => "the disk would not take it; try again or choose another place",
        _ => "the path is none the system knows; choose another",
    };
}
