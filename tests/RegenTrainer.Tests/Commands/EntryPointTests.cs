using System.Runtime.Versioning;
using System.Text;
using RegenTrainer.Commands;

namespace RegenTrainer.Tests.Commands;

public sealed class EntryPointTests : IDisposable
{
    private readonly string _home = Directory.CreateTempSubdirectory("regentrainer-log-").FullName;
    private readonly string? _before = Environment.GetEnvironmentVariable("XDG_STATE_HOME");
    private readonly StringWriter _messages = new();
    private readonly MemoryStream _results = new();

    public void Dispose()
    {
        Environment.SetEnvironmentVariable("XDG_STATE_HOME", _before);
        Directory.Delete(_home, recursive: true);
        _messages.Dispose();
        _results.Dispose();
    }

    [Fact]
    [UnsupportedOSPlatform("windows")]
    public void A_fault_of_our_own_is_one_line_that_names_the_log()
    {
        Environment.SetEnvironmentVariable("XDG_STATE_HOME", _home);
        int exitCode = EntryPoint.Guarded(new Output(_results, _messages), () => throw new InvalidOperationException("broken\nhere"));

        string line = _messages.ToString();
        string log = Path.Combine(_home, "regentrainer", "faults.log");
        Assert.Equal(70, exitCode);
        Assert.Equal(1, line.Count(c => c == '\n'));
        Assert.Contains(log, line, StringComparison.Ordinal);
        Assert.DoesNotContain("InvalidOperation", line, StringComparison.Ordinal);
        Assert.DoesNotContain("broken", line, StringComparison.Ordinal);
        Assert.Contains("InvalidOperationException: broken", File.ReadAllText(log), StringComparison.Ordinal);
        Assert.Equal(
            UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute,
            File.GetUnixFileMode(Path.GetDirectoryName(log)!));
    }

    [Fact]
    public void A_home_that_cannot_be_written_is_told_and_no_crash()
    {
        // A file stands where the folder would be.
        string file = Path.Combine(_home, "file");
        File.WriteAllText(file, "");
        Environment.SetEnvironmentVariable("XDG_STATE_HOME", file);
        int exitCode = EntryPoint.Guarded(new Output(_results, _messages), () => throw new InvalidOperationException("broken"));

        Assert.Equal(70, exitCode);
        Assert.Contains("could not be kept", _messages.ToString(), StringComparison.Ordinal);
        Assert.Equal(1, _messages.ToString().Count(c => c == '\n'));
    }

    [Fact]
    public void A_stop_hands_over_its_lines_and_code()
    {
        int exitCode = EntryPoint.Guarded(new Output(_results, _messages), () => throw new StopException(1, "first", "second"));
        Assert.Equal(1, exitCode);
        Assert.Equal("first\nsecond\n", _messages.ToString());
        Assert.Equal(0, _results.Length);
    }

    [Fact]
    public void A_reader_that_went_away_is_no_fault()
    {
        using var closed = new ClosedStream();
        var output = new Output(closed, _messages);
        int exitCode = EntryPoint.Guarded(output, () =>
        {
            output.Result("first");
            output.Result("second");
            return 0;
        });
        Assert.Equal(0, exitCode);
        Assert.Equal("", _messages.ToString());
        Assert.Equal(1, closed.Writes);
    }

    [Fact]
    public void Results_are_utf8_without_a_mark_before_them()
    {
        new Output(_results, _messages).Result("1.22 k\u03a9\n");
        Assert.Equal(Encoding.UTF8.GetBytes("1.22 k\u03a9\n"), _results.ToArray());
    }

    private sealed class ClosedStream : MemoryStream
    {
        public int Writes { get; private set; }

        public override void Write(ReadOnlySpan<byte> buffer)
        {
            Writes++;
            throw new IOException("Broken pipe");
        }
    }
}
