namespace RegenTrainer.Session;

/// <summary>How something asked of a file went.</summary>
public enum FileOutcome
{
    /// <summary>It was done.</summary>
    Done,

    /// <summary>It was not done; the words say why and what helps. Nothing is lost.</summary>
    Refused,

    /// <summary>A preset, or what was never saved, has no file yet: a path is needed.</summary>
    NeedsPath,

    /// <summary>The file was changed, or is gone, since it was read. Nothing was written.</summary>
    ChangedOnDisk,

    /// <summary>There is a file of that path already. Nothing was written.</summary>
    Exists,

    /// <summary>It was opened, and another running program has it open as well.</summary>
    OpenElsewhere,
}

/// <summary>What was asked of a file and how it went.</summary>
/// <param name="Outcome">How it went.</param>
/// <param name="Words">One line for the builder, printable.</param>
public sealed record FileAnswer(FileOutcome Outcome, string Words);
