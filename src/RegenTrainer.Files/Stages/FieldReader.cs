using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads the value of one field, with a fault for everything it cannot be.</summary>
/// <param name="reader">Where faults go.</param>
/// <param name="devices">Where devices come from.</param>
internal sealed class FieldReader(TableReader reader, IDeviceSource devices)
{
    private const int MostPairs = 1000;

    /// <summary>The value; null with its faults noted.</summary>
    /// <param name="field">The field.</param>
    /// <param name="value">What stands there.</param>
    /// <param name="model">The device a device field names; null elsewhere.</param>
    public FieldValue? Read(Field field, TomlValue value, out DeviceModel? model)
    {
        model = null;
        switch (field.Kind)
        {
            case FieldKind.Quantity:
                return Quantity(field, value);
            case FieldKind.Count:
                return reader.Whole(value, (int)field.Minimum, (int)field.Maximum) is { } count ? FieldValue.Of(count) : null;
            case FieldKind.Choice:
                if (value is TomlText word && field.Choices.Contains(word.Text, StringComparer.Ordinal))
                {
                    return FieldValue.Of(word.Text);
                }

                reader.Refuse(value.At, value.Phrase, TableReader.Words(field.Choices));
                return null;
            case FieldKind.Device:
                return Device(field, value, out model);
            default:
                return Pairs(field, value);
        }
    }

    private FieldValue? Quantity(Field field, TomlValue value)
    {
        if (value is not TomlTable table)
        {
            return QuantityValues.Read(reader, value, field.Unit, field.Minimum, field.Maximum) is { } plain ? FieldValue.Of(plain) : null;
        }

        int before = reader.Faults.Count;
        TableReader inner = reader.Into(table);
        double? number = inner.Quantity("value", field.Unit, field.Minimum, field.Maximum, required: true);
        const string expected = "a tolerance such as \"5%\"";
        double tolerance = 0;
        switch (inner.Value("tolerance", required: true, expected))
        {
            case TomlText text when !QuantityText.TryReadTolerance(text.Text, out tolerance, out QuantityFault fault):
                reader.Refuse(text.PlaceOf(fault.Offset), fault.Found, fault.Expected);
                break;
            case TomlNumber percent when percent.Number is >= 0 and <= 100:
                tolerance = percent.Number;
                break;
            case TomlText or null:
                break;
            case { } other:
                reader.Refuse(other.At, other.Phrase, other is TomlNumber ? "a tolerance from 0% to 100%" : expected);
                break;
        }

        inner.Finish();
        return reader.Faults.Count == before ? new FieldValue(number, null, tolerance) : null;
    }

    private FieldValue? Device(Field field, TomlValue value, out DeviceModel? model)
    {
        model = null;
        if (value is not TomlText text)
        {
            reader.Refuse(value.At, value.Phrase, "the name of a device in quotes");
            return null;
        }

        return DeviceNames.TryFind(reader, devices, text, field.Socket, out model) ? FieldValue.Of(text.Text) : null;
    }

    private FieldValue? Pairs(Field field, TomlValue value)
    {
        if (value is not TomlList list)
        {
            reader.Refuse(value.At, value.Phrase, "a list of pairs [[a, b], ...]");
            return null;
        }

        if (list.Items.Count > MostPairs)
        {
            reader.Refuse(list.At, $"{list.Items.Count} pairs", $"at most {MostPairs}");
            return null;
        }

        int before = reader.Faults.Count;
        List<(double, double)> pairs = [];
        foreach (TomlValue item in list.Items)
        {
            if (item is TomlList { Items: [TomlNumber first, TomlNumber second] })
            {
                Within(field, first);
                Within(field, second);
                pairs.Add((first.Number, second.Number));
            }
            else
            {
                reader.Refuse(item.At, item.Phrase, "a pair of numbers [a, b]");
            }
        }

        return reader.Faults.Count == before ? new FieldValue(null, null, null) { Pairs = pairs } : null;
    }

    private void Within(Field field, TomlNumber number)
    {
        if (number.Number < field.Minimum || number.Number > field.Maximum)
        {
            reader.Refuse(number.At, number.Phrase, QuantityValues.Expected(Unit.None, field.Minimum, field.Maximum));
        }
    }
}
