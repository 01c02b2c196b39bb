using System.Text;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Saving;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Session.Keeping;

/// <summary>A document and its file: writes the one into the other, and never over what someone else wrote unasked.</summary>
/// <param name="document">The document.</param>
/// <param name="fingerprint">Of the file's content, or the preset's, as it was read.</param>
/// <param name="places">Where the user's devices and home are.</param>
internal sealed class DocumentFile(StageDocument document, string fingerprint, Places places)
{
    /// <summary>Folders of the system whose files are none, and must not be replaced by one.</summary>
    private static readonly string[] _systemFolders = ["/dev/", "/proc/", "/sys/"];

    public StageDocument Document { get; private set; } = document;

    /// <summary>Of the file's content as it was last read or written.</summary>
    public string Fingerprint { get; private set; } = fingerprint;

    /// <summary>Whether the document's own text is in the file; that of a recovery is not.</summary>
    public bool TextIsInFile { get; private set; } = Keeping.Fingerprint.Of(document.Text) == fingerprint;

    /// <summary>Where the document's devices are looked up.</summary>
    public DeviceShelf Shelf => ShelfOf(Document.Path, places);

    /// <summary>The shelf of a stage file; for one without a path the user's devices and those that ship.</summary>
    public static DeviceShelf ShelfOf(string? path, Places places) => DeviceShelf.Beside(path is null ? null : Path.GetDirectoryName(path), places);

    /// <summary>Writes a design into the document's file.</summary>
    /// <param name="design">The design.</param>
    /// <param name="evenIfChanged">Whether to write over what someone else wrote since.</param>
    public FileAnswer Save(StageDesign design, bool evenIfChanged)
    {
        if (Document.Path is not { } path)
        {
            return new FileAnswer(FileOutcome.NeedsPath, $"{Printable.Text(Document.Name)} has no file yet: give a path to save it at");
        }

        string written = StageText.Write(Document.Text, design);
        string shown = Printable.Text(path);
        bool there = TextFiles.TryRead(path, out string disk, out string reason);
        if (there && disk == written)
        {
            Take(path, written, design);
            return new FileAnswer(FileOutcome.Done, $"{shown} has it all already");
        }

        bool same = there && Keeping.Fingerprint.Of(disk) == Fingerprint;
        if (!evenIfChanged && !same && Directory.Exists(Path.GetDirectoryName(path)))
        {
            string what = there ? "was changed by another program since it was read" : $"can no longer be read: {reason}";
            return new FileAnswer(FileOutcome.ChangedOnDisk, $"{shown} {what}; nothing is written yet");
        }

        return Write(path, written, design);
    }

    /// <summary>Writes a design into another file, which is the document's from then on.</summary>
    /// <param name="design">The design.</param>
    /// <param name="typed">The path as the builder typed it; <c>~</c> at its start is the user's home.</param>
    /// <param name="replace">Whether a file that is there may be replaced.</param>
    public FileAnswer SaveAs(StageDesign design, string typed, bool replace)
    {
        if (Full(typed, out string refusal) is not { } path)
        {
            return new FileAnswer(FileOutcome.Refused, refusal);
        }

        if (path == Document.Path)
        {
            return Save(design, replace);
        }

        if (!replace && Path.Exists(path))
        {
            return Directory.Exists(path)
                ? new FileAnswer(FileOutcome.Refused, $"{Printable.Text(path)} is a folder: give the name of a file in it")
                : new FileAnswer(FileOutcome.Exists, $"{Printable.Text(path)} is there already; nothing is written yet");
        }

        return Write(path, StageText.Write(Document.Text, design), design);
    }

    private FileAnswer Write(string path, string text, StageDesign design)
    {
        if (!AtomicFile.TryWrite(path, Bytes(path, text), null, out string reason))
        {
            return new FileAnswer(FileOutcome.Refused, $"{Printable.Text(path)} is not written: {reason}");
        }

        Take(path, text, design);
        IReadOnlyList<FileFault> faults = StageText.Read(text, Path.GetFileName(path), Shelf).Faults;
        string doubt = faults.Count == 0 ? "" : $"; opened there it has a fault: {faults[0]}";
        return new FileAnswer(FileOutcome.Done, $"saved as {Printable.Text(path)}{doubt}");
    }

    private void Take(string path, string text, StageDesign design)
    {
        Document = new StageDocument(design, text, path, Path.GetFileName(path));
        (Fingerprint, TextIsInFile) = (Keeping.Fingerprint.Of(text), true);
    }

    /// <summary>The text as bytes, with the mark in front that the file has now.</summary>
    private static byte[] Bytes(string path, string text)
    {
        byte[] body = Encoding.UTF8.GetBytes(text);
        try
        {
            if (!File.Exists(path))
            {
                return body;
            }

            using FileStream stream = File.OpenRead(path);
            byte[] start = new byte[Encoding.UTF8.Preamble.Length];
            bool marked = stream.ReadAtLeast(start, start.Length, throwOnEndOfStream: false) == start.Length
                && start.AsSpan().SequenceEqual(Encoding.UTF8.Preamble);
            return marked ? [.. start, .. body] : body;
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            return body;   // what cannot be read has no mark to keep; the writing says what is wrong
        }
    }

    private string? Full(string typed, out string refusal)
    {
        string trimmed = typed.Trim();
        refusal = "";
        if (trimmed.Length == 0)
        {
            refusal = "found nothing, expected the path of a file";
            return null;
        }

        try
        {
            bool ofHome = trimmed.StartsWith("~/", StringComparison.Ordinal) && places.Home is not null;
            string path = Path.GetFullPath(ofHome ? Path.Combine(places.Home!, trimmed[2..].TrimStart('/')) : trimmed);
            refusal = Path.EndsInDirectorySeparator(path) ? $"{Printable.Text(path)} is a folder: give the name of a file in it"
                : !OperatingSystem.IsWindows() && _systemFolders.Any(f => path.StartsWith(f, StringComparison.Ordinal))
                    ? $"{Printable.Text(path)} is no place for files: choose another"
                    : "";
            return refusal.Length == 0 ? path : null;
        }
        catch (Exception e) when (FileTrouble.Is(e))
        {
            refusal = $"{Printable.Text(trimmed)}: {FileTrouble.Words(e)}";
            return null;
        }
    }
}
