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
        var reading = new StageReading(fileName, text, shelf);
        return new StageReadResult(reading.Design, reading.Faults);
    }

    /// <summary>Writes a design into a stage file's text: only values that differ from what the text says are changed.</summary>
    /// <param name="text">A text that reads without faults.</param>
    /// <param name="design">The design to stand in it: of the same family, with the same parts of its own.</param>
    /// <param name="shelf">Where the text's devices are looked up.</param>
    /// <exception cref="ArgumentException">The text has faults, or family, parts or output node differ.</exception>
    public static string Write(string text, StageDesign design, DeviceShelf shelf) => new StageWriting(text, design, shelf).Text;
}
