using System.ComponentModel;
using System.Diagnostics;
using System.Globalization;

namespace RegenTrainer.Session.Keeping;

/// <summary>A process by its number and the second it was started in, so that another one with the same number is told apart.</summary>
/// <param name="Id">The process number.</param>
/// <param name="StartSecond">Seconds from 1970-01-01 UTC to its start.</param>
public readonly record struct ProcessMark(int Id, long StartSecond)
{
    /// <summary>The system counts starts from its own, so that two programs may read them a little apart.</summary>
    private const long Slack = 2;

    /// <summary>The process this runs in.</summary>
    public static ProcessMark Own { get; } = Of(Environment.ProcessId) ?? new ProcessMark(Environment.ProcessId, 0);

    /// <summary>Whether this process still runs.</summary>
    public bool IsRunning => Of(Id) is { } now && Math.Abs(now.StartSecond - StartSecond) <= Slack;

    /// <summary>The running process of a number; null where there is none.</summary>
    public static ProcessMark? Of(int id)
    {
        try
        {
            using Process process = Process.GetProcessById(id);
            return new ProcessMark(id, new DateTimeOffset(process.StartTime).ToUnixTimeSeconds());
        }
        catch (Exception e) when (e is ArgumentException or InvalidOperationException or Win32Exception or NotSupportedException)
        {
            return null;
        }
    }

    /// <summary>Reads what <see cref="ToString"/> wrote; null for anything else.</summary>
    public static ProcessMark? Parse(string text)
    {
        string[] pieces = text.Split(' ');
        return pieces.Length == 2
            && int.TryParse(pieces[0], NumberStyles.None, CultureInfo.InvariantCulture, out int id)
            && long.TryParse(pieces[1], NumberStyles.None, CultureInfo.InvariantCulture, out long second)
            ? new ProcessMark(id, second)
            : null;
    }

    /// <summary>Number and second, with a blank between.</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{Id} {StartSecond}");
}
