using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files;

/// <summary>The stages that ship inside the program.</summary>
public static class Presets
{
    /// <summary>The preset that opens where none is named.</summary>
    public const string Default = "tapped-coil-npn";

    private const string Suffix = ".toml";
    private const string Folder = "presets/";

    /// <summary>The names, in order.</summary>
    public static IReadOnlyList<string> Names { get; } =
        [.. Embedded.Names("").Where(n => n.LastIndexOf('/') == Folder.Length - 1).Select(n => n[Folder.Length..^Suffix.Length])];

    /// <summary>The text of a preset.</summary>
    /// <exception cref="FileNotFoundException">There is no such preset.</exception>
    public static string Text(string name) => Embedded.Text(Folder + name + Suffix);

    /// <summary>The design of a preset.</summary>
    /// <exception cref="FileNotFoundException">There is no such preset.</exception>
    /// <exception cref="InvalidDataException">The preset has faults, which the tests rule out.</exception>
    public static StageDesign Read(string name)
    {
        StageReadResult result = StageText.Read(Text(name), name + Suffix, DeviceShelf.Shipped);
        return result.Design ?? throw new InvalidDataException(result.Faults[0].ToString());
    }
}
