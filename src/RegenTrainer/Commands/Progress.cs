using System.Diagnostics;

namespace RegenTrainer.Commands;

/// <summary>Says on a terminal how far a long answer has got; silent for short ones and where messages go to a file.</summary>
internal sealed class Progress : IDisposable
{
    private static readonly TimeSpan _silentFor = TimeSpan.FromMilliseconds(300);

    private readonly Stopwatch _watch = Stopwatch.StartNew();
    private readonly TextWriter? _terminal;
    private readonly string _what;
    private TimeSpan _next = _silentFor;
    private int _written;

    /// <summary>Starts to watch the time.</summary>
    /// <param name="what">What is counted, in the plural.</param>
    /// <param name="terminal">The terminal; null where messages go elsewhere.</param>
    public Progress(string what, TextWriter? terminal) => (_what, _terminal) = (what, terminal);

    /// <summary>So many are done.</summary>
    public void Report(int done, int all)
    {
        if (_terminal is null || _watch.Elapsed < _next)
        {
            return;
        }

        _next = _watch.Elapsed + TimeSpan.FromMilliseconds(100);
        string text = $"{done} of {all} {_what}";
        _terminal.Write("\r" + text.PadRight(_written));
        _written = text.Length;
    }

    /// <summary>Wipes the line.</summary>
    public void Dispose()
    {
        if (_written > 0)
        {
            _terminal?.Write("\r" + new string(' ', _written) + "\r");
        }
    }
}
