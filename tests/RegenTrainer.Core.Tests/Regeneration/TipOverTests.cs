using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Controls;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Oracles;
using RegenTrainer.Core.Tests.Readings;
using RegenTrainer.Core.Tests.Stages;
using RegenTrainer.Core.Tuning;

namespace RegenTrainer.Core.Tests.Regeneration;

/// <summary>The threshold of oscillation against an identity, against the carrier-level truth, and as properties.</summary>
public sealed class TipOverTests
{
    // At the threshold the control is the negative of what the rest of the stage shows it at a real frequency (a driving-point
    // argument that knows nothing of eigenvalues; operating point and tuning frozen).
    [Theory]
    [InlineData(530e3)]
    [InlineData(1000e3)]
    [InlineData(1700e3)]
    public void The_control_equals_minus_the_impedance_the_rest_shows_it(double dialHz)
    {
        StageUnderTest stage = StageUnderTest.Default;
        Crossing tip = Tip(stage, dialHz);
        TankState state = stage.Tank(dialHz, tip.Value);
        Workspace w = stage.Workspace.Circuit;
        w.Values.SetPencil(tip.TuningFarad, double.PositiveInfinity, w.Linear, 1);
        PairStamp ends = w.Network.Control!.Pair!.Value;
        Assert.True(ResponseSolver.TryImpedance(w, ends.From, ends.To, new Complex(0, 2 * Math.PI * tip.FrequencyHz), out Complex z));
        Assert.True(state.Found);
        Assert.Equal(tip.Value, -z.Real, tip.Value * 1e-6);
        Assert.Equal(0, z.Imaginary, tip.Value * 1e-6);
        Assert.Equal(dialHz, tip.FrequencyHz, dialHz * 1e-9);
    }

    [Theory]
    [InlineData(530e3)]
    [InlineData(1000e3)]
    [InlineData(1700e3)]
    public void A_carrier_level_integration_decays_just_below_and_grows_just_above(double dialHz)
    {
        StageUnderTest stage = StageUnderTest.Default;
        Crossing tip = Tip(stage, dialHz);
        foreach (double factor in new[] { 1.002, 0.998 })   // more resistance is less regeneration
        {
            double ohm = tip.Value * factor;
            TankState state = stage.Tank(dialHz, ohm, tip.TuningFarad);
            RingReading truth = Ring(stage, dialHz, tip.TuningFarad, ohm, 4000, state.Mode.Hz);
            Assert.Equal(factor > 1, truth.GrowthPerS < 0);
            Assert.Equal(truth.GrowthPerS, state.Mode.S.Real, Math.Abs(truth.GrowthPerS) * 0.01);
            Assert.Equal(truth.Hz, state.Mode.Hz, truth.Hz * 1e-6);
        }
    }

    [Theory]
    [InlineData(10)]
    [InlineData(40)]
    [InlineData(50)]
    [InlineData(57)]
    public void Effective_q_equals_the_decay_of_a_carrier_level_integration(double travel)
    {
        StageUnderTest stage = StageUnderTest.Default;
        Reading reading = stage.Read(1e6, travel);
        RingReading truth = Ring(stage, 1e6, reading.TuningFarad!.Value, reading.ControlValue!.Value, 2000, 1e6);
        double q = 2 * Math.PI * truth.Hz / (-2 * truth.GrowthPerS);
        Assert.Equal(q, reading.EffectiveQ!.Value, q * 0.002);
    }

    [Fact]
    public void A_hundredth_of_a_percent_either_side_is_edge_and_oscillating()
    {
        StageUnderTest stage = StageUnderTest.Default;
        double tip = Tip(stage, 1e6).TravelPercent;
        Assert.Equal(Regime.Edge, stage.Read(1e6, tip - 0.01).Regime);
        Assert.Equal(Regime.Oscillating, stage.Read(1e6, tip + 0.01).Regime);
    }

    [Fact]
    public void Stages_that_never_and_always_oscillate_are_named()
    {
        Reading never = new StageUnderTest(DefaultStage.With("coil.taps.base", 6)).Read(1e6, 50);
        Assert.Equal(TipOverState.Never, never.TipOver!.State);
        Assert.Empty(never.TipOver.Crossings);
        Assert.Null(never.MarginPercent);
        StageDesign strong = DefaultStage.With("regeneration.potentiometer.total", 500).With("regeneration.series.value", FieldValue.Of(47));
        Reading always = new StageUnderTest(strong).Read(1.5e6, 0);
        Assert.Equal(TipOverState.Always, always.TipOver!.State);
        Assert.Equal(Regime.Oscillating, always.Regime);
        Assert.Null(always.EffectiveQ);
        Assert.Null(always.BandwidthHz);
        Assert.Null(always.MarginDb);
    }

    // The control feeds the base: little current gives no gain, much of it saturates the collector, in between it oscillates.
    [Fact]
    public void A_stage_that_tips_over_twice_is_named_with_both_directions()
    {
        IReadOnlyList<Part> parts =
        [
            .. StageUnderTest.Default.Model.Network.Parts.Select(p => p.Name switch
            {
                "regeneration control" => ((Resistor)p) with { Ohm = 600, Role = PartRole.None },
                "base resistor" => new Resistor("base resistor", "supply rail", "base feed", 1e6) { Role = PartRole.Regeneration },
                "collector resistor" => ((Resistor)p) with { Ohm = 1500 },
                _ => p,
            }),
        ];
        var stage = new StageUnderTest(FreeFamily.Design(
            parts, "output", new VariableCapacitor(12e-12, 365e-12), new Potentiometer(20e6, Taper.ReverseLogarithmic, 5, 20e3)));
        TipOver tip = stage.Read(1e6, 0).TipOver!;
        Assert.Equal(TipOverState.Several, tip.State);
        Assert.Equal([true, false], tip.Crossings.Select(c => c.Upward));
        double between = 0.5 * (tip.Crossings[0].TravelPercent + tip.Crossings[1].TravelPercent);
        Assert.Equal(Regime.Oscillating, stage.Read(1e6, between).Regime);
        Assert.True(stage.Read(1e6, tip.Crossings[0].TravelPercent - 0.01).GrowthPerSecond < 0);
        Assert.True(stage.Read(1e6, tip.Crossings[1].TravelPercent + 0.01).GrowthPerSecond < 0);
    }

    // The feedback sits on a second circuit tuned 30 % higher: that one tips over, and the tuned one goes on decaying.
    [Fact]
    public void A_second_tuned_circuit_that_tips_over_counts()
    {
        const double farad = 100e-12;
        double first = 1 / (Math.Pow(2 * Math.PI * 1e6, 2) * farad), second = 1 / (Math.Pow(2 * Math.PI * 1.3e6, 2) * farad);
        IReadOnlyList<Part> Parts(double factor) =>
        [
            new Antenna("source", "source", Part.Earth), new Resistor("feed", "source", "first", 1e7),
            new Windings("coils", [("first", Part.Earth), ("second", Part.Earth)], new CoupledSections(
                [new InductiveSection(first, 100), new InductiveSection(second, 100)], [new SectionCoupling(0, 1, 0.02)])),
            new Capacitor("tuning", "first", Part.Earth, farad) { Role = PartRole.Tuning },
            new Capacitor("fixed", "second", Part.Earth, farad),
            new Feedback("feedback", "second", Part.Earth, Part.Earth, "second", 1e-3, factor) { Role = PartRole.Regeneration },
        ];
        var stage = new StageUnderTest(FreeFamily.Design(Parts(0), "first", new VariableCapacitor(10e-12, 500e-12), new LinearControl(0, 0.02), Unit.None));
        Setting At(double travel) => new(1e6, travel) { DialMode = DialMode.Locked, LockedFarad = farad };
        TipOver tip = stage.Read(At(0)).TipOver!;
        Assert.Equal(TipOverState.Once, tip.State);
        Crossing crossing = tip.First!.Value;
        Reading above = stage.Read(At(crossing.TravelPercent + 0.5));
        Assert.Equal(Regime.Oscillating, above.Regime);
        Assert.Null(above.EffectiveQ);
        Assert.Contains(above.Cautions, c => c.Code == "other-circuit-oscillates");
        foreach (double factor in new[] { 0.99, 1.01 })
        {
            RingReading truth = new CarrierLevelOracle(Parts(crossing.Value * factor), Grade.Typical, 20, 1e6).SmallSignalRing("second", 1.3e6, 2000, 240, "second");
            Assert.Equal(factor > 1, truth.GrowthPerS > 0);
        }
    }

    // Landon and Jarvis: T = 1 - Q/Q_eff is the loop gain, so a device 1/T stronger tips the stage where the loop is a plain
    // transconductance.
    [Fact]
    public void For_a_plain_tank_both_margins_are_the_classical_loop_gain()
    {
        Reading reading = new StageUnderTest(PlainStage.Design).Read(1e6, 20);
        Assert.NotNull(reading.MarginDb);
        double loopGain = 1 - (reading.QRegenerationOff!.Value / reading.EffectiveQ!.Value);
        Assert.Equal(-20 * Math.Log10(loopGain), reading.MarginDb!.Value, 1e-9);
        Assert.Equal(reading.MarginDb.Value, reading.DeviceMarginDb!.Value, 0.01);
    }

    [Fact]
    public void Margin_falls_to_zero_at_the_threshold_and_is_one_decibel_at_nine_times_the_q()
    {
        Assert.Equal(1.0, Margin.LoopGainDb(9.2, 1)!.Value, 0.01);   // the definition's own example
        Assert.Equal(6.0, Margin.LoopGainDb(2, 1)!.Value, 0.03);
        Assert.Null(Margin.LoopGainDb(0.9, 1));
        StageUnderTest stage = StageUnderTest.Default;
        double tip = Tip(stage, 1e6).TravelPercent;
        double before = double.PositiveInfinity;
        for (double travel = tip - 20; travel < tip; travel += 1)
        {
            double margin = stage.Read(1e6, travel).MarginDb!.Value;
            Assert.True(margin < before);
            before = margin;
        }

        Assert.True(stage.Read(1e6, tip - 0.001).MarginDb < 0.001);
    }

    internal static Crossing Tip(StageUnderTest stage, double dialHz)
    {
        TipOver tip = stage.Read(dialHz, 0).TipOver!;
        Assert.Equal(TipOverState.Once, tip.State);
        return tip.First!.Value;
    }

    private static RingReading Ring(StageUnderTest stage, double lossHz, double farad, double ohm, int cycles, double startHz) =>
        new CarrierLevelOracle(stage.PartsAt(farad, ohm), Grade.Typical, 20, lossHz).SmallSignalRing("tank top", startHz, cycles, 240);
}
