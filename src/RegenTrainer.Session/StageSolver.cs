using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Selectivity;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Session;

/// <summary>Answers from the physics, on the calling thread, with buffers of its own.</summary>
/// <param name="model">The stage.</param>
/// <param name="audioHz">Audio frequencies of a reading's sidebands in Hz, above 0.</param>
public sealed class StageSolver(StageModel model, IReadOnlyList<double> audioHz) : IStageSolver
{
    private readonly StageWorkspace _workspace = new(model);

    /// <inheritdoc/>
    public string Title => model.Design.Title;

    /// <inheritdoc/>
    public Dial Dial => model.Circuit.Dial;

    /// <inheritdoc/>
    public RegenerationControl? Control => model.Circuit.Control;

    /// <inheritdoc/>
    public double? SupplyVolt => model.Circuit.SupplyVolt;

    /// <inheritdoc/>
    public bool HasGrades => model.RegeneratingType is not null;

    /// <inheritdoc/>
    public IStageSolver Fork() => new StageSolver(model, audioHz);

    /// <inheritdoc/>
    public IReadOnlyList<DialPoint> AlongDial(Setting setting, IReadOnlyList<double> dialHz) => StageReader.AlongDial(_workspace, setting, dialHz);

    /// <inheritdoc/>
    public IReadOnlyList<Sideband> Sidebands(Setting setting, IReadOnlyList<double> audioHz) => StageReader.AudioCurve(_workspace, setting, audioHz);

    /// <inheritdoc/>
    public Interaction Interaction(Setting setting) => InteractionReader.Read(_workspace, setting, audioHz);

    /// <inheritdoc/>
    public BiasReading Bias(Setting setting) => BiasReader.Read(_workspace, setting);

    /// <inheritdoc/>
    public HeadroomReading Headroom(Setting setting) => HeadroomReader.Read(_workspace, setting);

    /// <inheritdoc/>
    public Setting Fit(Setting setting)
    {
        BipolarModel? socket = model.Network.Devices.FirstOrDefault(d => d.Regenerating)?.Model as BipolarModel;
        return setting with
        {
            Device = setting.Device is { } device && device.Polarity == socket?.Polarity ? device : null,
            SupplyVolt = SupplyVolt is null ? null : setting.SupplyVolt,
        };
    }

    /// <inheritdoc/>
    public Reading Read(Setting setting) => StageReader.Read(_workspace, setting, audioHz);

    /// <inheritdoc/>
    public IReadOnlyList<ResponsePoint> Response(Setting setting, IReadOnlyList<double> hz) => StageReader.Response(_workspace, setting, hz);

    /// <inheritdoc/>
    public IReadOnlyList<Neighbour> Neighbours(Setting setting) => StageReader.Neighbours(_workspace, setting);

    /// <inheritdoc/>
    public IReadOnlyList<RegimeSpan> RegimesAlongTravel(Setting setting) => TravelRegimes.Find(_workspace, setting);
}
