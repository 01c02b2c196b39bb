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
    private static readonly (double Dial, double Travel)[] _settings = [(560e3, 25), (1e6, 45), (1.6e6, 20)];

    public static TheoryData<string> Names => [.. Presets.Names];

    [Theory]
    [MemberData(nameof(Names))]
    public void The_expansion_saved_and_opened_gives_every_figure_again(string name)
    {
        StageDesign design = Presets.Read(name);
        StageDesign expanded = StageText.Read(PartsText.Write(design), "parts.toml", DeviceShelf.Shipped).Design!;
        var (first, second) = (new StageUnderTest(design), new StageUnderTest(expanded));
        foreach ((double dial, double travel) in _settings)
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
        foreach (double dial in new[] { 530e3, 950e3, 1700e3 })
        {
            Reading reading = stage.Read(dial, 10);
            Assert.True(reading.Reachable);
            Assert.Equal(TipOverState.Once, reading.TipOver!.State);
            Assert.False(reading.Parasitic);
            Assert.Empty(reading.Cautions);
        }
    }
}
