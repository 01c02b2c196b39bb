using System.Diagnostics;

namespace RegenTrainer.EndToEnd.Tests;

/// <summary>The program in a real terminal: a tmux server of this test's own.</summary>
internal sealed class Tmux : IDisposable
{
    private static readonly TimeSpan _patience = TimeSpan.FromSeconds(30);
    private static int _servers;

    private readonly string _socket = $"regentrainer-{Environment.ProcessId}-{Interlocked.Increment(ref _servers)}";
    private readonly string? _ownHome;

    /// <summary>Starts the program; the shell says how it ended.</summary>
    /// <param name="columns">Width of the terminal.</param>
    /// <param name="rows">Height of the terminal.</param>
    /// <param name="arguments">Arguments of the program, as a shell would take them.</param>
    /// <param name="environment">Assignments before the command, as a shell would take them.</param>
    /// <param name="folder">Folder it is started in.</param>
    /// <param name="home">Folder with the user's settings and state; null for one of its own.</param>
    public Tmux(int columns, int rows, string arguments = "", string environment = "", string? folder = null, string? home = null)
    {
        _ownHome = home is null ? Directory.CreateTempSubdirectory("regentrainer-home-").FullName : null;
        string places = home ?? _ownHome!;
        // A session that stays keeps the server alive, whatever the program does to its own.
        Tell("-f", "/dev/null", "new-session", "-d", "-s", "keep", "sleep 600");
        Tell("set", "-g", "escape-time", "0");
        Tell("new-session", "-d", "-x", Text(columns), "-y", Text(rows), "-s", "run", "-c", folder ?? Path.GetTempPath(),
            $"env TERM=xterm-256color LC_ALL=C.UTF-8 XDG_STATE_HOME={places}/state XDG_CONFIG_HOME={places}/config {environment} dotnet {ProgramRun.ProgramPath} {arguments}; echo ENDED=$?; sleep 600");
    }

    /// <summary>Why these tests cannot run here; null where they can.</summary>
    public static string? Missing { get; } = Find() ? null : "tmux is not installed: the terminal tests are skipped";

    /// <summary>The lines on the screen, trimmed at the right.</summary>
    public string[] Lines => [.. Screen.Split('\n').Select(l => l.TrimEnd())];

    /// <summary>What is on the screen.</summary>
    public string Screen => Ask("capture-pane", "-p", "-t", "run").TrimEnd('\n');

    /// <summary>The same with the colours' escape sequences.</summary>
    public string ColouredScreen => Ask("capture-pane", "-p", "-e", "-t", "run");

    /// <summary>Whether the alternate screen, the mouse and the cursor are as a shell wants them.</summary>
    public bool IsRestored => Ask("display", "-p", "-t", "run", "#{alternate_on}#{mouse_any_flag}#{cursor_flag}").Trim() == "001";

    /// <summary>The program's process; the shell's child.</summary>
    public int ProgramProcess
    {
        get
        {
            string shell = Ask("display", "-p", "-t", "run", "#{pane_pid}").Trim();
            return int.Parse(Run("pgrep", ["-P", shell]).Split('\n')[0], System.Globalization.CultureInfo.InvariantCulture);
        }
    }

    public void Keys(params string[] keys) => Tell(["send-keys", "-t", "run", .. keys]);

    /// <summary>Types characters as they are.</summary>
    public void Type(string text) => Tell("send-keys", "-t", "run", "-l", "--", text);

    public void Resize(int columns, int rows) => Tell("resize-window", "-t", "run", "-x", Text(columns), "-y", Text(rows));

    /// <summary>Waits until the screen holds a text.</summary>
    public string WaitFor(string text)
    {
        var clock = Stopwatch.StartNew();
        string screen;
        do
        {
            screen = Screen;
            Thread.Sleep(50);

            // A frame that is still being written shows old and newer rows: two looks must agree.
            if (screen.Contains(text, StringComparison.Ordinal) && Screen == screen)
            {
                return screen;
            }
        }
        while (clock.Elapsed < _patience);
        Assert.Fail($"the screen never showed \"{text}\":\n{screen}");
        return screen;
    }

    /// <summary>Waits until the screen no longer holds a text.</summary>
    public void WaitWithout(string text)
    {
        var clock = Stopwatch.StartNew();
        while (Screen.Contains(text, StringComparison.Ordinal))
        {
            Assert.True(clock.Elapsed < _patience, $"the screen kept showing \"{text}\":\n{Screen}");
            Thread.Sleep(50);
        }
    }

    public void Dispose()
    {
        Run("tmux", ["-L", _socket, "kill-server"]);
        try
        {
            if (_ownHome is not null)
            {
                Directory.Delete(_ownHome, recursive: true);
            }
        }
        catch (IOException)
        {
            // The program was still writing there as its terminal went away: a folder of temporary files may stay.
        }
    }

    private static string Text(int number) => number.ToString(System.Globalization.CultureInfo.InvariantCulture);

    private static bool Find()
    {
        try
        {
            return Run("tmux", ["-V"]).StartsWith("tmux", StringComparison.Ordinal);
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return false;
        }
    }

    private void Tell(params string[] words) => Run("tmux", ["-L", _socket, .. words]);

    private string Ask(params string[] words) => Run("tmux", ["-L", _socket, .. words]);

    private static string Run(string program, IReadOnlyList<string> words)
    {
        var start = new ProcessStartInfo(program) { RedirectStandardOutput = true, RedirectStandardError = true, UseShellExecute = false };
        foreach (string word in words)
        {
            start.ArgumentList.Add(word);
        }

        using Process process = Process.Start(start) ?? throw new InvalidOperationException($"{program} did not start");
        string text = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return text;
    }
}
