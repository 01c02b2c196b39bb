using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>A stage ready for reading, and what tests want to know of it.</summary>
internal sealed class StageUnderTest
{
    public StageUnderTest(StageDesign design)
    {
        Model = StageModel.Compile(design);
        Workspace = new StageWorkspace(Model);
    }

    public static StageUnderTest Default => new(DefaultStage.Design);

    public StageModel Model { get; }

    public StageWorkspace Workspace { get; }

    public IControlLaw Law => Model.ControlLaw!;

    public Reading Read(Setting setting, params double[] audioHz) => StageReader.Read(Workspace, setting, audioHz);

    public Reading Read(double dialHz, double travel) => Read(new Setting(dialHz, travel));

    /// <summary>The tank at a control value with the tuning held, without a hint.</summary>
    public TankState Tank(double dialHz, double controlValue, double? lockedFarad = null) => TankSolver.Solve(
        Workspace,
        new TankQuery(
            dialHz, lockedFarad is null ? DialMode.Follows : DialMode.Locked, lockedFarad ?? 0, controlValue, 20, Grade.Typical, null, null),
        TankHint.None);

    /// <summary>The parts with tuning and control written into them, for the carrier-level truth.</summary>
    public IReadOnlyList<Part> PartsAt(double tuningFarad, double controlOhm) =>
    [
        .. Model.Network.Parts.Select(p => p switch
        {
            Capacitor { Role: PartRole.Tuning } c => c with { Farad = tuningFarad },
            Resistor { Role: PartRole.Regeneration } r => r with { Ohm = controlOhm },
            _ => p,
        }),
    ];
}
