using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Devices;

/// <summary>A device file read: the model, or every fault in it.</summary>
/// <param name="Model">The device; null where there are faults.</param>
/// <param name="Faults">What is wrong, by position.</param>
public sealed record DeviceReadResult(DeviceModel? Model, IReadOnlyList<FileFault> Faults);

/// <summary>Reads device files.</summary>
public static class DeviceText
{
    /// <summary>The format this program reads.</summary>
    public const string Format = "regentrainer.device/1";

    /// <summary>What every device file has in its format, whatever its number.</summary>
    internal const string AnyFormat = "regentrainer.device/";

    /// <summary>Reads a device file.</summary>
    /// <param name="text">Its text.</param>
    /// <param name="fileName">Its name for messages.</param>
    public static DeviceReadResult Read(string text, string fileName)
    {
        List<FileFault> faults = [];
        if (TomlReader.TryRead(fileName, text, faults) is not { } root)
        {
            return new DeviceReadResult(null, faults);
        }

        var reader = new TableReader(fileName, root, faults);
        if (reader.Choice("format", [Format], required: true) is null)
        {
            return new DeviceReadResult(null, faults);
        }

        DeviceModel? model = ReadModel(reader);
        faults.Sort((a, b) => (a.Line, a.Column).CompareTo((b.Line, b.Column)));
        return new DeviceReadResult(faults.Count == 0 ? model : null, faults);
    }

    private static DeviceModel? ReadModel(TableReader reader)
    {
        string? name = reader.Text("name", required: true, "the registered type");
        string? kind = reader.Choice("kind", ["bipolar", "diode"], required: true);
        if (kind is null)
        {
            return null;   // without a kind no other key can be judged
        }

        DeviceModel? model = kind == "diode" ? Diode(reader, name) : Bipolar(reader, name);
        reader.Finish();
        return model;
    }

    private static BipolarModel? Bipolar(TableReader reader, string? name)
    {
        string? polarity = reader.Choice("polarity", ["npn", "pnp"], required: true);
        DeviceFigure? gain = Figure(reader, "current_gain", Unit.None, 1, 1e5, Unit.Ampere, required: true);
        DeviceFigure? gainLow = Figure(reader, "current_gain_low", Unit.None, 0.1, 1e5, Unit.Ampere, required: false);
        DeviceFigure? transition = Figure(reader, "transition_frequency", Unit.Hertz, 1e4, 1e11, Unit.Ampere, required: true);
        DeviceFigure? output = Figure(reader, "output_capacitance", Unit.Farad, 1e-15, 1e-8, Unit.Volt, required: true);
        DeviceFigure? input = Figure(reader, "input_capacitance", Unit.Farad, 1e-15, 1e-8, Unit.Volt, required: true);
        DeviceFigure? saturation = Figure(reader, "saturation_current", Unit.Ampere, 1e-20, 1e-3, null, required: true);
        DeviceFigure? early = Figure(reader, "early_voltage", Unit.Volt, 1, 1e4, null, required: true);
        DeviceFigure? resistance = Figure(reader, "base_resistance", Unit.Ohm, 0.01, 1e5, null, required: true);
        DeviceRating? rating = Limits(reader, inner => new DeviceRating(
            inner.Quantity("collector_volts", Unit.Volt, 0.1, 1e4, required: false),
            inner.Quantity("collector_current", Unit.Ampere, 1e-6, 1e3, required: false),
            inner.Quantity("dissipation", Unit.Watt, 1e-6, 1e4, required: false)));
        if (name is null || polarity is null || gain is null || transition is null || output is null || input is null
            || saturation is null || early is null || resistance is null)
        {
            return null;
        }

        return new BipolarModel(
            name, polarity == "npn" ? Polarity.Npn : Polarity.Pnp, gain, transition, output, input, saturation, early, resistance)
        {
            CurrentGainLow = gainLow,
            Rating = rating,
        };
    }

    private static DiodeModel? Diode(TableReader reader, string? name)
    {
        string? material = reader.Choice("material", ["silicon", "germanium", "schottky"], required: true);
        DeviceFigure? saturation = Figure(reader, "saturation_current", Unit.Ampere, 1e-20, 1e-3, null, required: true);
        DeviceFigure? emission = Figure(reader, "emission_coefficient", Unit.None, 1, 4, null, required: true);
        DeviceFigure? resistance = Figure(reader, "series_resistance", Unit.Ohm, 0.01, 1e5, null, required: true);
        DeviceFigure? capacitance = Figure(reader, "capacitance", Unit.Farad, 1e-15, 1e-8, Unit.Volt, required: true, atRequired: false);
        DiodeRating? rating = Limits(reader, inner => new DiodeRating(
            inner.Quantity("reverse_volts", Unit.Volt, 0.1, 1e4, required: false),
            inner.Quantity("forward_current", Unit.Ampere, 1e-6, 1e3, required: false)));
        if (name is null || material is null || saturation is null || emission is null || resistance is null || capacitance is null)
        {
            return null;
        }

        JunctionMaterial junction = material switch
        {
            "silicon" => JunctionMaterial.Silicon,
            "germanium" => JunctionMaterial.Germanium,
            _ => JunctionMaterial.Schottky,
        };
        return new DiodeModel(name, junction, saturation, emission, resistance, capacitance) { Rating = rating };
    }

    private static DeviceFigure? Figure(
        TableReader reader, string key, Unit unit, double minimum, double maximum, Unit? at, bool required, bool atRequired = true)
    {
        if (reader.Inner(key, required, "a table { typical = .., known = .., source = .. }") is not { } inner)
        {
            return null;
        }

        int before = reader.Faults.Count;
        double? low = inner.Quantity("min", unit, minimum, maximum, required: false);
        double? typical = inner.Quantity("typical", unit, minimum, maximum, required: false);
        double? high = inner.Quantity("max", unit, minimum, maximum, required: false);
        double? condition = at is { } atUnit ? inner.Quantity("at", atUnit, 1e-12, 1e6, required: atRequired) : null;
        string? known = inner.Choice("known", ["print", "memory", "typical"], required: true);
        string? source = inner.Text("source", required: known == "print", "where the figure is printed");
        inner.Finish();

        // Where a sheet prints limits only, the middle of two by ratio or the one there is stands for the typical device.
        double? middle = typical ?? (low is { } l && high is { } h ? Math.Sqrt(l * h) : low ?? high);
        if (middle is null && reader.Faults.Count == before)
        {
            inner.Refuse(inner.Table.At, $"no figure in {key}", "typical, min or max");
        }
        else if (low > middle || high < middle)
        {
            inner.Refuse(inner.Table.At, $"{key} out of order", "min, typical and max rising");
        }

        return reader.Faults.Count > before
            ? null
            : new DeviceFigure(
                low, middle!.Value, high, condition,
                known switch { "print" => KnownBy.Print, "memory" => KnownBy.Memory, _ => KnownBy.Typical }, source ?? "");
    }

    private static T? Limits<T>(TableReader reader, Func<TableReader, T> read)
        where T : class
    {
        if (reader.Inner("rating", required: false, "a table of limits") is not { } inner)
        {
            return null;
        }

        T limits = read(inner);
        inner.Finish();
        return limits;
    }
}
