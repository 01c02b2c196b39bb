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
    private readonly Dictionary<string, BipolarModel> _models = new(StringComparer.OrdinalIgnoreCase);

    public DesignDevices(StageDesign design)
    {
        foreach (BipolarModel model in design.Devices.Values.Concat(design.ExtraParts.OfType<Bipolar>().Select(p => p.Model)))
        {
            _models.TryAdd(model.Name, model);
        }
    }

    public IReadOnlyList<string> Names => [.. _models.Keys];

    public DeviceReadResult Find(string name)
    {
        if (!_models.TryGetValue(name, out BipolarModel? model))
        {
            DeviceFigure figure = new(null, 1, null, null, KnownBy.Typical, "");
            model = new BipolarModel(name, Polarity.Npn, figure, figure, figure, figure, figure, figure, figure);
            _models.Add(name, model);
        }

        return new DeviceReadResult(model, []);
    }
}
