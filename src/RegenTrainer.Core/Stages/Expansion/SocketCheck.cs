using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages.Fields;

namespace RegenTrainer.Core.Stages.Expansion;

/// <summary>Whether every socket of a family holds a device of its kind.</summary>
internal static class SocketCheck
{
    /// <summary>Adds a fault for every device of another kind than its socket's.</summary>
    public static void Check(StageDesign design, FaultList faults)
    {
        foreach (Field field in design.Family.Fields)
        {
            if (field.Kind == FieldKind.Device && design.Devices.TryGetValue(field.Key, out DeviceModel? model) && model.Kind != field.Socket)
            {
                faults.Add(field.Key, $"{model.Name}, {DeviceModel.Phrase(model.Kind)}", DeviceModel.Phrase(field.Socket));
            }
        }
    }
}
