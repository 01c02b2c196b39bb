using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Core.Tests.Oracles;
using RegenTrainer.Core.Tuning;
using RegenTrainer.Files;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>The crystal set that ships: a stage its builder can use along the whole dial, with any device.</summary>
public sealed class CrystalSetReadingTests
{
    private const string Preset = "crystal-set";

    public static TheoryData<double, Grade> Corners => new MatrixTheoryData<double, Grade>(
        [530e3, 950e3, 1700e3], [Grade.Weak, Grade.Typical, Grade.Strong]);

    [Theory]
    [MemberData(nameof(Corners))]
    public void It_tips_over_once_well_inside_its_travel(double dialHz, Grade grade)
    {
        var stage = new StageUnderTest(Presets.Read(Preset));
        Reading reading = stage.Read(new Setting(dialHz, 10) { Grade = grade });
        Assert.True(reading.Reachable);
        Assert.Equal(TipOverState.Once, reading.TipOver!.State);
        Assert.InRange(reading.TipOver.Crossings[0].TravelPercent, 10, 90);
        Assert.Empty(reading.Cautions);
        foreach (double travel in new[] { 0.0, 50, 100 })
        {
            Reading at = stage.Read(new Setting(dialHz, travel) { Grade = grade });
            Assert.False(at.Parasitic, $"{travel} %");
            Assert.DoesNotContain(at.Cautions, c => c.Code != "oscillating");
        }
    }

    // Regeneration makes up for what the diode takes: the same stage without a detector has the higher Q with regeneration off.
    [Fact]
    public void The_diode_costs_Q_and_regeneration_brings_it_back()
    {
        StageDesign crystal = Presets.Read(Preset);
        double loaded = new StageUnderTest(crystal).Read(950e3, 10).QRegenerationOff!.Value;
        double bare = new StageUnderTest(crystal.With("output.kind", FieldValue.Of("load"))).Read(950e3, 10).QRegenerationOff!.Value;
        Assert.InRange(loaded / bare, 0.5, 0.9);
        Reading near = new StageUnderTest(crystal).Read(950e3, 65);
        Assert.True(near.EffectiveQ > 3 * bare, $"{near.EffectiveQ}");
    }

    /// <summary>The tank's mode with the diode in the pencil against the ring of the same parts integrated in time.</summary>
    [Theory]
    [InlineData(530e3, 30)]
    [InlineData(950e3, 60)]
    [InlineData(1700e3, 90)]
    public void It_rings_as_its_mode_says(double dialHz, double travel)
    {
        var stage = new StageUnderTest(Presets.Read(Preset));
        double ohm = stage.Law.ValueAt(travel);
        TankState state = stage.Tank(dialHz, ohm);
        Assert.True(state.Found);
        var oracle = new CarrierLevelOracle(stage.PartsAt(state.Mode.TuningFarad, ohm), Grade.Typical, 20, dialHz);
        double q = Math.Abs(state.Mode.Q);
        RingReading ring = oracle.SmallSignalRing(stage.Model.Circuit.OutputNode, dialHz, (int)Math.Clamp(10 * q, 400, 6000), 120);
        Assert.Equal(ring.GrowthPerS, state.Mode.S.Real, 1e-7 * Math.Abs(ring.GrowthPerS));
        Assert.Equal(ring.Hz, state.Mode.Hz, 1e-9 * ring.Hz);
    }
}
