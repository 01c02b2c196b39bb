using RegenTrainer.Core.Devices;

namespace RegenTrainer.Files.Devices;

/// <summary>
/// Where device names are looked up: beside the stage file, then in the user's devices folder, then among those that ship.
/// </summary>
public sealed class DeviceShelf
{
    private static readonly Lazy<IReadOnlyDictionary<string, BipolarModel>> _shipped = new(ReadShipped);

    private readonly IReadOnlyList<string> _folders;

    private DeviceShelf(IReadOnlyList<string> folders) => _folders = folders;

    /// <summary>The devices that ship, without a look at any disk.</summary>
    public static DeviceShelf Shipped { get; } = new([]);

    /// <summary>The names of the devices that ship.</summary>
    public static IReadOnlyList<string> ShippedNames => [.. _shipped.Value.Keys.Order(StringComparer.OrdinalIgnoreCase)];

    /// <summary>A shelf that looks into a folder first, then into the user's, then among those that ship.</summary>
    /// <param name="folder">The folder of the stage file.</param>
    public static DeviceShelf Beside(string folder) => new([folder, UserFolder()]);

    /// <summary>Every name that can be had, shipped ones first.</summary>
    public IReadOnlyList<string> Names =>
        [.. ShippedNames.Concat(_folders.SelectMany(FilesIn).Select(f => Path.GetFileNameWithoutExtension(f).ToUpperInvariant())).Distinct(StringComparer.OrdinalIgnoreCase)];

    /// <summary>Finds a device by name, letter case aside.</summary>
    /// <param name="name">The registered type.</param>
    /// <returns>The device, or why it cannot be had: no such name, or the faults of its file.</returns>
    public DeviceReadResult? Find(string name)
    {
        foreach (string file in _folders.SelectMany(FilesIn))
        {
            if (string.Equals(Path.GetFileNameWithoutExtension(file), name, StringComparison.OrdinalIgnoreCase)
                && TextFiles.TryRead(file, out string text, out _)
                && text.Contains(DeviceText.Format, StringComparison.Ordinal))
            {
                return DeviceText.Read(text, Path.GetFileName(file));
            }
        }

        return _shipped.Value.TryGetValue(name, out BipolarModel? model) ? new DeviceReadResult(model, []) : null;
    }

    private static IReadOnlyList<string> FilesIn(string folder)
    {
        try
        {
            return Directory.Exists(folder) ? [.. Directory.EnumerateFiles(folder, "*.toml").Order(StringComparer.Ordinal).Take(1000)] : [];
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            return [];   // a folder that cannot be listed has no devices to offer
        }
    }

    private static string UserFolder() => Path.Combine(
        Environment.GetEnvironmentVariable("XDG_CONFIG_HOME") is { Length: > 0 } home
            ? home
            : Environment.GetFolderPath(Environment.SpecialFolder.ApplicationData),
        "regentrainer", "devices");

    private static Dictionary<string, BipolarModel> ReadShipped()
    {
        var devices = new Dictionary<string, BipolarModel>(StringComparer.OrdinalIgnoreCase);
        foreach (string name in Embedded.Names("devices/"))
        {
            DeviceReadResult result = DeviceText.Read(Embedded.Text(name), name);
            BipolarModel model = result.Model ?? throw new InvalidDataException(result.Faults[0].ToString());
            devices.Add(model.Name, model);
        }

        return devices;
    }
}
