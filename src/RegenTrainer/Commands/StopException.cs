namespace RegenTrainer.Commands;

/// <summary>Ends a command with lines on standard error and an exit code.</summary>
internal sealed class StopException : Exception
{
    public StopException(int exitCode, params IReadOnlyList<string> lines)
        : base(string.Join('\n', lines)) => (ExitCode, Lines) = (exitCode, lines);

    /// <summary>What the program ends with.</summary>
    public int ExitCode { get; }

    /// <summary>The lines, fit to be shown.</summary>
    public IReadOnlyList<string> Lines { get; }
}
