using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Files.Devices;

/// <summary>
/// The devices of a design by name. Any other name gets a device of that name with figures of its own: enough to see which
/// names a text holds, without a look at any shelf.
/// </summary>
internal sealed class DesignDevices : IDeviceSource
{
    private readonly Dictionary<string, DeviceModel> _models = new(StringComparer.OrdinalIgnoreCase);

    public DesignDevices(StageDesign design)
    {
        IEnumerable<DeviceModel> ofParts = design.ExtraParts.Select(p => p switch
        {
            Bipolar q => q.Model,
            Diode d => (DeviceModel)d.Model,
            _ => null,
        }).OfType<DeviceModel>();
        foreach (DeviceModel model in design.Devices.Values.Concat(ofParts))
        {
            _models.TryAdd(model.Name, model);
        }
    }

    public IReadOnlyList<string> Names => [.. _models.Keys];

    public DeviceReadResult Find(string name, DeviceKind wanted)
    {
        if (!_models.TryGetValue(name, out DeviceModel? model) || model.Kind != wanted)
        {
            DeviceFigure figure = new(null, 1, null, null, KnownBy.Typical, "");
            model = wanted == DeviceKind.Diode
                ? new DiodeModel(name, JunctionMaterial.Germanium, figure, figure, figure, figure)
                : new BipolarModel(name, Polarity.Npn, figure, figure, figure, figure, figure, figure, figure);
            _models.TryAdd(name, model);
        }

        return new DeviceReadResult(model, []);
    }
}
