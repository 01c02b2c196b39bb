namespace RegenTrainer.Commands;

/// <summary>What the program tells its caller when it ends.</summary>
internal static class ExitCode
{
    /// <summary>Done.</summary>
    public const int Done = 0;

    /// <summary>The stage or a file is at fault.</summary>
    public const int Stage = 1;

    /// <summary>The command line is at fault.</summary>
    public const int CommandLine = 2;

    /// <summary>The program is at fault.</summary>
    public const int Program = 70;

    /// <summary>Stopped by Ctrl+C: 128 and the signal's number.</summary>
    public const int Interrupted = 130;

    /// <summary>Stopped by a request to end: 128 and the signal's number.</summary>
    public const int Terminated = 143;
}
