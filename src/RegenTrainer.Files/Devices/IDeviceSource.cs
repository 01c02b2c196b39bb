using RegenTrainer.Core.Devices;

namespace RegenTrainer.Files.Devices;

/// <summary>Where the devices a stage file names come from.</summary>
internal interface IDeviceSource
{
    /// <summary>Every name that can be had.</summary>
    IReadOnlyList<string> Names { get; }

    /// <summary>Finds a device by name, letter case aside; null where there is none of that name.</summary>
    /// <param name="name">The registered type.</param>
    /// <param name="wanted">The kind it is wanted for; a device of another kind is found all the same.</param>
    DeviceReadResult? Find(string name, DeviceKind wanted);
}
