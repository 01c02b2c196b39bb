using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Files.Devices;
using RegenTrainer.Session;

namespace RegenTrainer.Commands;

/// <summary>The stage a command works on. All opening of files by commands goes through here.</summary>
internal sealed class OpenedStage
{
    private readonly string _name;

    private OpenedStage(string name, StageDocument document) =>
        (_name, Document, Model) = (name, document, StageModel.Compile(document.Design));

    /// <summary>The stage with the text it was read from.</summary>
    public StageDocument Document { get; }

    /// <summary>The stage, ready for solving.</summary>
    public StageModel Model { get; }

    /// <summary>Its title.</summary>
    public string Title => Model.Design.Title;

    /// <summary>Polarity of the device in the regenerating socket; null where there is none.</summary>
    public Polarity? RegeneratingPolarity =>
        Model.Network.Devices.FirstOrDefault(device => device.Regenerating)?.Model is BipolarModel { Polarity: var polarity } ? polarity : null;

    /// <summary>Opens a stage.</summary>
    /// <param name="name">A path or a preset's name.</param>
    /// <exception cref="StopException">It has faults.</exception>
    public static OpenedStage Open(string name)
    {
        OpenedFile file = Read(name);
        return file.Design is null ? throw Refusal(file.Faults) : new OpenedStage(name, StageDocument.Of(name, file));
    }

    /// <summary>Opens a stage's design, or finds every fault of its file.</summary>
    /// <param name="name">A path or a preset's name.</param>
    /// <exception cref="StopException">The file cannot be read at all.</exception>
    public static (StageDesign? Design, IReadOnlyList<FileFault> Faults) TryOpen(string name)
    {
        OpenedFile file = Read(name);
        return (file.Design, file.Faults);
    }

    /// <summary>Ends a command with the faults of a file, one a line.</summary>
    public static StopException Refusal(IReadOnlyList<FileFault> faults) =>
        new(ExitCode.Stage, [.. faults.Select(fault => fault.ToString())]);

    /// <summary>A type by its name: beside the stage file, in the user's folder, among those that ship.</summary>
    /// <exception cref="StopException">There is none, or its file has faults.</exception>
    public DeviceModel FindDevice(string name)
    {
        DeviceShelf shelf = File.Exists(_name)
            ? DeviceShelf.Beside(Path.GetDirectoryName(Path.GetFullPath(_name)) ?? ".")
            : DeviceShelf.Beside(".");
        DeviceReadResult? found = shelf.Find(name);
        if (found?.Faults.Count > 0)
        {
            throw Refusal(found.Faults);
        }

        return found?.Model ?? throw new StopException(
            ExitCode.CommandLine,
            $"regentrainer: --device: found \"{Options.Shown(name)}\", expected one of {string.Join(", ", shelf.Names.Where(n => shelf.Find(n)?.Model is BipolarModel))}");
    }

    private static OpenedFile Read(string name)
    {
        OpenedFile file = StageFiles.Open(name);
        return file.Message is { } message
            ? throw new StopException(ExitCode.Stage, "regentrainer: " + Printable.Text(message))
            : file;
    }
}
