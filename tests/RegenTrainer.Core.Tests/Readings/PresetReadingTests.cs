using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Readings;
using RegenTrainer.Core.Regeneration;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Core.Tests.Readings;

/// <summary>The presets as their builder opens them, and their expansion as he would save and open it.</summary>
public sealed class PresetReadingTests
{
    public static TheoryData<string> Names => [.. Presets.Names];

    [Theory]
    [MemberData(nameof(Names))]
    public void The_expansion_saved_and_opened_gives_every_figure_again(string name)
    {
        StageDesign design = Presets.Read(name);
        StageDesign expanded = StageText.Read(PartsText.Write(design), "parts.toml", DeviceShelf.Shipped).Design!;
        var (first, second) = (new StageUnderTest(design), new StageUnderTest(expanded));
        foreach ((double dial, double travel) in Dials(first, 0.03, 0.4, 0.91).Zip([25.0, 45.0, 20.0]))
        {
            Reading a = first.Read(new Setting(dial, travel), 400, 1000, 3000), b = second.Read(new Setting(dial, travel), 400, 1000, 3000);
            Assert.NotNull(a.TankHz);
            ReadingComparison.AssertSame(a, b);
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Every_preset_tips_over_inside_its_travel_along_its_dial(string name)
    {
        var stage = new StageUnderTest(Presets.Read(name));
        foreach (double dial in Dials(stage, 0, 0.36, 1))
        {
            Reading reading = stage.Read(dial, 10);
            Assert.True(reading.Reachable);
            Assert.Equal(TipOverState.Once, reading.TipOver!.State);
            Assert.InRange(reading.TipOver.Crossings[0].TravelPercent, 10, 90);
            Assert.False(reading.Parasitic);
            Assert.Empty(reading.Cautions);
        }
    }

    /// <summary>No stray mode grows anywhere on the travel, tip-over or not, and just below it the stage works as one should.</summary>
    [Theory]
    [MemberData(nameof(Names))]
    public void Every_preset_works_below_its_tip_over_and_has_no_stray_oscillation(string name)
    {
        var stage = new StageUnderTest(Presets.Read(name));
        foreach (double dial in Dials(stage, 0, 0.36, 1))
        {
            double tip = stage.Read(dial, 10).TipOver!.Crossings[0].TravelPercent;
            Reading below = stage.Read(new Setting(dial, tip - 1.5), 400, 1000, 3000);
            Assert.True(below.EffectiveQ > below.QRegenerationOff);
            Assert.NotNull(below.BandwidthHz);
            Assert.All(below.Sidebands, sideband => Assert.True(sideband.AudioDb <= 0.01, $"{name} {dial}: {sideband.AudioDb}"));
            foreach (double travel in new[] { 0, tip - 1, tip + 5, 100 })
            {
                Assert.False(stage.Read(dial, travel).Parasitic, $"{name} at {dial} Hz, {travel} %");
            }
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void No_device_of_a_preset_is_saturated(string name)
    {
        var stage = new StageUnderTest(Presets.Read(name));
        BiasReading bias = BiasReader.Read(stage.Workspace, new Setting(Dials(stage, 0.5).Single(), 50));
        Assert.All(bias.Devices, device => Assert.False(device.Saturated, $"{name}: {device.Name}"));
    }

    /// <summary>A stage with a device can transmit, and wire outdoors can be struck: whoever opens the file reads so.</summary>
    [Theory]
    [MemberData(nameof(Names))]
    public void Every_preset_says_its_cautions(string name)
    {
        StageDesign design = Presets.Read(name);
        IReadOnlyList<Part> parts = design.Family.Expand(design).Parts;
        Assert.NotEmpty(design.Note);
        if (parts.Any(part => part is Bipolar { Role: PartRole.Regenerating }))
        {
            Assert.Contains("transmits", design.Note, StringComparison.Ordinal);
        }

        if (parts.OfType<Antenna>().Any())
        {
            Assert.Contains("lightning", Presets.Text(name), StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Every_antenna_and_every_core_has_a_preset()
    {
        StageDesign[] designs = [.. Presets.Names.Select(Presets.Read)];
        string?[] antennas = [.. designs.Select(design => design.WordOrNull("antenna.kind"))];
        string?[] cores = [.. designs.Select(design => design.WordOrNull("coil.core"))];
        Assert.Superset(new HashSet<string?>(["short-wire", "long-wire", "loop", "rod"]), antennas.ToHashSet());
        Assert.Superset(new HashSet<string?>(["air", "rod", "ring"]), cores.ToHashSet());
    }

    /// <summary>Places on a stage's dial, as shares of its band.</summary>
    private static double[] Dials(StageUnderTest stage, params double[] shares)
    {
        Dial dial = stage.Model.Circuit.Dial;
        return [.. shares.Select(share => dial.LowHz + (share * (dial.HighHz - dial.LowHz)))];
    }
}
