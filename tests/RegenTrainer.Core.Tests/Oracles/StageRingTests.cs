using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Tests.Oracles;

/// <summary>The program's tank mode and operating point against the ring of the same stage integrated in time.</summary>
public sealed class StageRingTests
{
    private static readonly StageModel _model = StageModel.Compile(DefaultStage.Design);

    [Theory]
    [InlineData(530e3, 0, 20, Grade.Typical)]
    [InlineData(1000e3, 0, 20, Grade.Typical)]
    [InlineData(1000e3, 50, 20, Grade.Typical)]
    [InlineData(1000e3, 55, 20, Grade.Typical)]
    [InlineData(1000e3, 58, 20, Grade.Typical)]
    [InlineData(1000e3, 80, 20, Grade.Weak)]
    [InlineData(1000e3, 80, 20, Grade.Strong)]
    [InlineData(1000e3, 100, -10, Grade.Typical)]
    [InlineData(1700e3, 90, 40, Grade.Typical)]
    [InlineData(1700e3, 100, 20, Grade.Strong)]
    public void The_tank_rings_as_its_mode_says(double dialHz, double travelPercent, double celsius, Grade grade)
    {
        IControlLaw law = _model.ControlLaw!;
        Check(new TankQuery(dialHz, DialMode.Follows, 0, law.ValueAt(travelPercent), celsius, grade, null, null));
    }

    [Theory]
    [InlineData(600e3)]
    [InlineData(1500e3)]
    public void So_it_does_with_the_device_out_of_its_socket(double dialHz) =>
        Check(new TankQuery(dialHz, DialMode.Follows, 0, 1000, 20, Grade.Typical, null, null, Removed: true));

    [Fact]
    public void A_weak_kick_of_the_stage_with_its_devices_full_law_grows_alike()
    {
        var query = new TankQuery(1000e3, DialMode.Follows, 0, _model.ControlLaw!.ValueAt(80), 20, Grade.Typical, null, null);
        TankState state = TankSolver.Solve(new StageWorkspace(_model), query, TankHint.None);
        var oracle = new CarrierLevelOracle(PartsAt(query, state), query.Grade, query.TemperatureCelsius, query.DialHz);
        OracleSamples samples = oracle.Run(new OracleRun(1 / (query.DialHz * 120), 240 * 120)
        {
            KickAmpere = CarrierLevelOracle.Burst(query.DialHz, 1e-8),
            Nodes = [_model.Circuit.OutputNode],
        });
        DecayReading reading = DecayFit.Fit(samples.Volt[_model.Circuit.OutputNode].AsSpan(120 * 120), query.DialHz, 120);
        Assert.Equal(state.Mode.S.Real, reading.GrowthPerS, 1e-4 * state.Mode.S.Real);
        Assert.Equal(state.Mode.Hz, reading.Hz, 5.0);   // a loss tangent in series instead of across: growth/(w Q) = 1.6e-6
    }

    private static void Check(in TankQuery query)
    {
        var workspace = new StageWorkspace(_model);
        TankState state = TankSolver.Solve(workspace, query, TankHint.None);
        Assert.True(state.Found);
        var oracle = new CarrierLevelOracle(PartsAt(query, state), query.Grade, query.TemperatureCelsius, query.DialHz);
        foreach (string node in _model.Network.NodeNames)
        {
            double volt = workspace.Circuit.Voltages[_model.Network.NodeIndex(node)];
            Assert.True(Math.Abs(volt - oracle.OperatingVolt(node)) < 1e-7, $"{node}: {volt:R} V, in truth {oracle.OperatingVolt(node):R} V");
        }

        double q = Math.Abs(state.Mode.Q);
        RingReading ring = oracle.SmallSignalRing(_model.Circuit.OutputNode, query.DialHz, (int)Math.Clamp(10 * q, 400, 6000), 120);
        Assert.True(Math.Abs(state.Mode.S.Real - ring.GrowthPerS) <= 1e-7 * Math.Abs(ring.GrowthPerS), $"{state.Mode.S.Real:R}, in truth {ring.GrowthPerS:R}");
        Assert.True(Math.Abs(state.Mode.Hz - ring.Hz) <= 1e-9 * ring.Hz, $"{state.Mode.Hz:R}, in truth {ring.Hz:R}");
    }

    /// <summary>The stage's parts with dial and control written into them.</summary>
    private static IReadOnlyList<Part> PartsAt(in TankQuery query, in TankState state)
    {
        (double control, double farad, bool removed) = (query.ControlValue, state.Mode.TuningFarad, query.Removed);
        return
        [
            .. _model.Circuit.Parts.Where(p => !removed || p.Role != PartRole.Regenerating).Select(p => p switch
            {
                Capacitor { Role: PartRole.Tuning } c => c with { Farad = farad },
                Resistor { Role: PartRole.Regeneration } r => r with { Ohm = control },
                _ => p,
            }),
        ];
    }
}
