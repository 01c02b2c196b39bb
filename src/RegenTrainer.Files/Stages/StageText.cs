using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads and writes stage files. Both are pure: text in, text or design out.</summary>
public static class StageText
{
    /// <summary>Reads a stage file: the design, or all its faults in one go.</summary>
    /// <param name="text">Its text.</param>
    /// <param name="fileName">Its name for messages.</param>
    /// <param name="shelf">Where its devices are looked up.</param>
    public static StageReadResult Read(string text, string fileName, DeviceShelf shelf)
    {
        var reading = new StageReading(fileName, text, shelf, check: true);
        return new StageReadResult(reading.Design, reading.Faults);
    }

    /// <summary>
    /// Writes a design into a stage file's text: only values, parts and words that differ from what the text says are changed.
    /// Comments, order and the notation of everything else stay.
    /// </summary>
    /// <param name="text">A text that reads without faults.</param>
    /// <param name="design">The design to stand in it, of the family the text names.</param>
    /// <exception cref="ArgumentException">The text has faults, or is of another family.</exception>
    public static string Write(string text, StageDesign design) => StageWriting.Write(text, design);
}
