using RegenTrainer.Core.Devices;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Looks up a device named in a stage file, with the fault where it cannot be had.</summary>
internal static class DeviceNames
{
    private const int MostNames = 12;
    private const int MostLooked = 100;

    public static bool TryFind(TableReader reader, IDeviceSource source, TomlText name, DeviceKind wanted, out DeviceModel? model)
    {
        model = null;
        if (name.Text.AsSpan().IndexOfAny('/', '\\', '\0') >= 0 || name.Text.Contains("..", StringComparison.Ordinal))
        {
            reader.Refuse(name.At, name.Phrase, "the name of a device, not a path");
            return false;
        }

        DeviceReadResult? found = source.Find(name.Text, wanted);
        model = found?.Model;
        if (model is not null && model.Kind == wanted)
        {
            return true;
        }

        if (model is not null)
        {
            reader.Refuse(name.At, $"{name.Phrase}, {DeviceModel.Phrase(model.Kind)}", Expected(source, wanted));
            model = null;
            return false;
        }

        if (found is null)
        {
            reader.Refuse(name.At, name.Phrase, Expected(source, wanted));
        }
        else
        {
            reader.Refuse(name.At, $"{name.Phrase}, whose device file has faults", "a device file without faults");
            reader.Faults.AddRange(found.Faults.Except(reader.Faults));
        }

        return false;
    }

    private static string Expected(IDeviceSource source, DeviceKind wanted)
    {
        IReadOnlyList<string> names =
            [.. source.Names.Take(MostLooked).Where(n => source.Find(n, wanted)?.Model?.Kind == wanted).Take(MostNames)];
        string kind = DeviceModel.Phrase(wanted);
        return names.Count > 0 ? $"{kind}, {TableReader.Words(names)} from the shelf" : kind;
    }
}
