using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;

namespace RegenTrainer.Session.Edits;

/// <summary>Makes one design from another, checked to the last: fields, what they say together, and that it compiles.</summary>
internal static class DesignEdit
{
    /// <summary>Tries to change values.</summary>
    /// <param name="design">The design they are changed in.</param>
    /// <param name="changes">Keys with their values; null for the field's default again.</param>
    /// <param name="shelf">Where devices are looked up.</param>
    /// <param name="model">The changed design, compiled; null where it is refused or the same as before.</param>
    /// <param name="refusal">Why it is refused; empty otherwise.</param>
    /// <returns>Whether the changes can stand.</returns>
    public static bool TryMake(
        StageDesign design, IReadOnlyList<(string Key, FieldValue? Value)> changes, DeviceShelf shelf, out StageModel? model, out string refusal)
    {
        (model, refusal) = (null, "");
        StageDesign changed = design;
        foreach ((string key, FieldValue? value) in changes)
        {
            if (design.Family.FieldFor(key) is not { } field)
            {
                refusal = $"found the key \"{Printable.Text(key)}\", which a stage of the kind {design.Family.Name} has not";
                return false;
            }

            if (FieldCheck.Refusal(field, value) is { } why)
            {
                refusal = changes.Count > 1 ? $"{key}: {why}" : why;
                return false;
            }

            if (!TryPut(ref changed, field, value, shelf, out refusal))
            {
                return false;
            }
        }

        return DesignComparison.Same(changed, design) || TryCompile(changed, changes[0].Key, out model, out refusal);
    }

    private static bool TryPut(ref StageDesign design, Field field, FieldValue? value, DeviceShelf shelf, out string refusal)
    {
        refusal = "";
        if (field.Kind != FieldKind.Device || value is null)
        {
            design = design with
            {
                Values = value is null ? design.Values.Remove(field.Key) : design.Values.SetItem(field.Key, value),
                Devices = value is null ? design.Devices.Remove(field.Key) : design.Devices,
            };
            return true;
        }

        if (design.Devices.TryGetValue(field.Key, out var there) && there.Name == value.Text)
        {
            return true;   // the device in the socket, whatever the shelf has of that name by now
        }

        DeviceReadResult? found = shelf.Find(value.Text!);
        if (found?.Model is { } device)
        {
            design = design with
            {
                Values = design.Values.SetItem(field.Key, FieldValue.Of(device.Name)),
                Devices = design.Devices.SetItem(field.Key, device),
            };
            return true;
        }

        string name = $"\"{Printable.Text(value.Text!)}\"";
        refusal = found is null
            ? $"found {name}, expected a device from the shelf: {Printable.Text(string.Join(", ", shelf.Names.Take(12)))}"
            : $"found {name}, whose device file has faults: {found.Faults[0]}";
        return false;
    }

    private static bool TryCompile(StageDesign design, string key, out StageModel? model, out string refusal)
    {
        (model, refusal) = (null, "");
        try
        {
            if (design.Family.Check(design) is { Count: > 0 } faults)
            {
                FieldFault fault = faults.FirstOrDefault(f => f.Key == key) ?? faults[0];
                string where = fault.Key == key ? "" : $"{Printable.Text(fault.Key)}: ";
                refusal = $"{where}found {Printable.Text(fault.Found)}, expected {Printable.Text(fault.Expected)}";
                return false;
            }

            model = StageModel.Compile(design);
            return true;
        }
        catch (Exception e) when (e is ArgumentException or InvalidOperationException or ArithmeticException)
        {
            refusal = $"the stage cannot be built like that: {Printable.Text(e.Message)}";
            return false;
        }
    }
}
