namespace RegenTrainer.Files.Devices;

/// <summary>Where the devices a stage file names come from.</summary>
internal interface IDeviceSource
{
    /// <summary>Every name that can be had.</summary>
    IReadOnlyList<string> Names { get; }

    /// <summary>Finds a device by name, letter case aside; null where there is none of that name.</summary>
    DeviceReadResult? Find(string name);
}
