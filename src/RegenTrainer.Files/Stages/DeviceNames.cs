using RegenTrainer.Core.Devices;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Looks up a device named in a stage file, with the fault where it cannot be had.</summary>
internal static class DeviceNames
{
    public static bool TryFind(TableReader reader, DeviceShelf shelf, TomlText name, out BipolarModel? model)
    {
        model = null;
        if (name.Text.AsSpan().IndexOfAny('/', '\\', '\0') >= 0 || name.Text.Contains("..", StringComparison.Ordinal))
        {
            reader.Refuse(name.At, name.Phrase, "the name of a device, not a path");
            return false;
        }

        DeviceReadResult? found = shelf.Find(name.Text);
        model = found?.Model;
        if (model is not null)
        {
            return true;
        }

        reader.Refuse(name.At, found is null ? name.Phrase : $"{name.Phrase} with faults: {found.Faults[0]}", found is null
            ? TableReader.Words([.. shelf.Names.Take(12)]) + " from the shelf"
            : "a device file without faults");
        return false;
    }
}
