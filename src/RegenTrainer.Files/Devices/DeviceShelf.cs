using RegenTrainer.Core.Devices;

namespace RegenTrainer.Files.Devices;

/// <summary>
/// Where device names are looked up: beside the stage file, then in the user's devices folder, then among those that ship.
/// </summary>
public sealed class DeviceShelf : IDeviceSource
{
    private static readonly Lazy<IReadOnlyDictionary<string, DeviceModel>> _shipped = new(ReadShipped);

    private readonly IReadOnlyList<string> _folders;

    private DeviceShelf(IReadOnlyList<string> folders) => _folders = folders;

    /// <summary>The devices that ship, without a look at any disk.</summary>
    public static DeviceShelf Shipped { get; } = new([]);

    /// <summary>The names of the devices that ship.</summary>
    public static IReadOnlyList<string> ShippedNames => [.. _shipped.Value.Keys.Order(StringComparer.OrdinalIgnoreCase)];

    /// <summary>A shelf that looks into a folder first, then into the user's, then among those that ship.</summary>
    /// <param name="folder">The folder of the stage file.</param>
    public static DeviceShelf Beside(string folder) => Beside(folder, Places.OfUser());

    /// <summary>A shelf that looks into a folder first, then into the user's, then among those that ship.</summary>
    /// <param name="folder">The folder of the stage file; null where there is none.</param>
    /// <param name="places">Where the user's devices are.</param>
    public static DeviceShelf Beside(string? folder, Places places) => new([.. new[] { folder, places.Devices }.OfType<string>()]);

    /// <summary>Every name that can be had, shipped ones first.</summary>
    public IReadOnlyList<string> Names =>
    [
        .. ShippedNames.Concat(_folders.SelectMany(FilesIn).Where(f => TextOf(f) is not null).Select(Stem))
            .Distinct(StringComparer.OrdinalIgnoreCase),
    ];

    /// <summary>Finds a device by name, letter case aside.</summary>
    /// <param name="name">The registered type.</param>
    /// <returns>The device or the faults of its file; null where there is none of that name.</returns>
    public DeviceReadResult? Find(string name)
    {
        foreach (string file in _folders.SelectMany(FilesIn).Where(f => string.Equals(Stem(f), name, StringComparison.OrdinalIgnoreCase)))
        {
            if (TextOf(file) is { } text)
            {
                return DeviceText.Read(text, Path.GetFileName(file));
            }
        }

        return _shipped.Value.TryGetValue(name, out DeviceModel? model) ? new DeviceReadResult(model, []) : null;
    }

    /// <inheritdoc/>
    DeviceReadResult? IDeviceSource.Find(string name, DeviceKind wanted) => Find(name);

    private static string Stem(string file) => Path.GetFileNameWithoutExtension(file);

    /// <summary>The text of a device file of whatever format number; null for a stage file beside it, or what cannot be read.</summary>
    private static string? TextOf(string file) =>
        TextFiles.TryRead(file, out string text, out _) && text.Contains(DeviceText.AnyFormat, StringComparison.Ordinal) ? text : null;

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

    private static Dictionary<string, DeviceModel> ReadShipped()
    {
        var devices = new Dictionary<string, DeviceModel>(StringComparer.OrdinalIgnoreCase);
        foreach (string name in Embedded.Names("devices/"))
        {
            DeviceReadResult result = DeviceText.Read(Embedded.Text(name), name);
            DeviceModel model = result.Model ?? throw new InvalidDataException(result.Faults[0].ToString());
            devices.Add(model.Name, model);
        }

        return devices;
    }
}
