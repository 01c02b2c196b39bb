using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;

namespace RegenTrainer.Session.Keeping;

/// <summary>What a recovery holds.</summary>
/// <param name="Name">The name of the stage's file or preset.</param>
/// <param name="Path">The file it belongs to; null where there is none.</param>
/// <param name="At">When it was kept.</param>
/// <param name="Process">The process that kept it; null where that cannot be read.</param>
/// <param name="Fingerprint">Of the file's content when it was read, see <see cref="Keeping.Fingerprint"/>.</param>
/// <param name="Text">The stage file with all edits.</param>
internal sealed record RecoveryContent(string Name, string? Path, DateTimeOffset At, ProcessMark? Process, string Fingerprint, string Text);

/// <summary>Writes and reads recoveries: a stage file with some lines of comment in front, so that it opens by itself as well.</summary>
internal static class RecoveryText
{
    private const string First = "# Unsaved work, kept by regentrainer. It can be opened as a stage file.";
    private const string Last = "# ---";

    // The lines are read by people too: letters beyond ASCII stay letters. Line ends are escaped all the same.
    private static readonly JsonSerializerOptions _options = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    public static string Write(RecoveryContent content) => string.Join(
        '\n',
        First,
        "# name: " + Quoted(content.Name),
        "# path: " + Quoted(content.Path ?? ""),
        "# at: " + content.At.ToString("O", CultureInfo.InvariantCulture),
        "# process: " + content.Process,
        "# read: " + content.Fingerprint,
        Last,
        content.Text);

    /// <summary>Reads a recovery. What cannot be understood of its first lines is left open; the text is always kept.</summary>
    public static RecoveryContent Read(string text)
    {
        string name = "", path = "", fingerprint = "";
        DateTimeOffset at = DateTimeOffset.UnixEpoch;
        ProcessMark? process = null;
        string rest = text;
        while (rest.StartsWith('#'))
        {
            int end = rest.IndexOf('\n', StringComparison.Ordinal);
            string line = end < 0 ? rest : rest[..end];
            rest = end < 0 ? "" : rest[(end + 1)..];
            if (line == Last)
            {
                break;
            }

            string value = line[(line.IndexOf(':', StringComparison.Ordinal) + 1)..].Trim();
            switch (line.Split(':')[0])
            {
                case "# name":
                    name = Unquoted(value);
                    break;
                case "# path":
                    path = Unquoted(value);
                    break;
                case "# at" when DateTimeOffset.TryParse(value, CultureInfo.InvariantCulture, DateTimeStyles.RoundtripKind, out DateTimeOffset read):
                    at = read;
                    break;
                case "# process":
                    process = ProcessMark.Parse(value);
                    break;
                case "# read":
                    fingerprint = value;
                    break;
                default:
                    break;
            }
        }

        bool whole = name.Length > 0;
        return new RecoveryContent(name, path.Length > 0 ? path : null, at, process, fingerprint, whole ? rest : text);
    }

    private static string Quoted(string text) => JsonSerializer.Serialize(text, _options);

    private static string Unquoted(string text)
    {
        try
        {
            return JsonSerializer.Deserialize<string>(text) ?? "";
        }
        catch (JsonException)
        {
            return "";
        }
    }
}
