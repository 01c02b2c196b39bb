using System.Text;

namespace RegenTrainer.Commands;

/// <summary>Where results and messages go. A reader that closes its end (<c>| head</c>) ends the output and is no fault.</summary>
internal sealed class Output
{
    private readonly Stream _results;
    private readonly TextWriter _messages;
    private bool _closed;

    /// <summary>Writes results to a stream and messages to a writer.</summary>
    public Output(Stream results, TextWriter messages) => (_results, _messages) = (results, messages);

    /// <summary>A result as text; UTF-8, line feeds.</summary>
    public void Result(string text) => Result(Encoding.UTF8.GetBytes(text));

    /// <summary>A result as bytes.</summary>
    public void Result(ReadOnlySpan<byte> bytes)
    {
        if (_closed)
        {
            return;
        }

        try
        {
            _results.Write(bytes);
            _results.Flush();
        }
        catch (IOException)
        {
            _closed = true;
        }
    }

    /// <summary>A message of one line.</summary>
    public void Message(string line)
    {
        try
        {
            _messages.Write(line + "\n");
            _messages.Flush();
        }
        catch (IOException)
        {
            // Nobody reads messages any more; the exit code still tells.
        }
    }
}
