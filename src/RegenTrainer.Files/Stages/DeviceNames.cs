using RegenTrainer.Core.Devices;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Looks up a device named in a stage file, with the fault where it cannot be had.</summary>
internal static class DeviceNames
{
    private const int MostNames = 12;

    public static bool TryFind(TableReader reader, IDeviceSource source, TomlText name, out BipolarModel? model)
    {
        model = null;
        if (name.Text.AsSpan().IndexOfAny('/', '\\', '\0') >= 0 || name.Text.Contains("..", StringComparison.Ordinal))
        {
            reader.Refuse(name.At, name.Phrase, "the name of a device, not a path");
            return false;
        }

        DeviceReadResult? found = source.Find(name.Text);
        model = found?.Model;
        if (model is not null)
        {
            return true;
        }

        if (found is null)
        {
            reader.Refuse(name.At, name.Phrase, TableReader.Words([.. source.Names.Take(MostNames)]) + " from the shelf");
        }
        else
        {
            reader.Refuse(name.At, $"{name.Phrase}, whose device file has faults", "a device file without faults");
            reader.Faults.AddRange(found.Faults.Except(reader.Faults));
        }

        return false;
    }
}
