using System.Runtime.InteropServices;

namespace RegenTrainer.Commands;

/// <summary>Ctrl+C and requests to end while a command runs: the command is asked to stop, and stopped if it does not.</summary>
internal sealed class Interruption : IDisposable
{
    /// <summary>Time a command has to hand over what it got so far; the whole stop stays under 0.2 s.</summary>
    private static readonly TimeSpan _patience = TimeSpan.FromMilliseconds(120);

    private readonly CancellationTokenSource _source = new();
    private readonly List<PosixSignalRegistration> _registrations = [];
    private Timer? _hardStop;

    /// <summary>Starts to listen.</summary>
    public Interruption()
    {
        Listen(PosixSignal.SIGINT, Commands.ExitCode.Interrupted);
        Listen(PosixSignal.SIGTERM, Commands.ExitCode.Terminated);
    }

    /// <summary>Cancelled when the command is to stop.</summary>
    public CancellationToken Token => _source.Token;

    /// <summary>What the program ends with where it was stopped; null where it was not.</summary>
    public int? ExitCode { get; private set; }

    /// <summary>Stops listening.</summary>
    public void Dispose()
    {
        foreach (PosixSignalRegistration registration in _registrations)
        {
            registration.Dispose();
        }

        _hardStop?.Dispose();
        _source.Dispose();
    }

    private void Listen(PosixSignal signal, int exitCode) =>
        _registrations.Add(PosixSignalRegistration.Create(signal, context =>
        {
            context.Cancel = true;
            ExitCode ??= exitCode;
            _hardStop ??= new Timer(_ => Environment.Exit(exitCode), null, _patience, Timeout.InfiniteTimeSpan);
            _source.Cancel();
        }));
}
