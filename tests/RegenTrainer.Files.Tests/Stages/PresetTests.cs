using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>What ships reads without faults, is kept by a save, and expands to parts that read back the same.</summary>
public sealed class PresetTests
{
    public static TheoryData<string> Names => [.. Presets.Names];

    [Fact]
    public void Presets_ship_for_every_antenna_core_and_output()
    {
        string[] ship =
        [
            "crystal-set", "ferrite-rod", "frame-loop", "long-wave-ring", "long-wire", "plain-tank", "short-wave-ring", "tapped-coil-follower-off",
            "tapped-coil-npn", "tapped-coil-pnp",
        ];
        Assert.Empty(ship.Except(Presets.Names));
        Assert.Contains(Presets.Default, Presets.Names);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void A_preset_reads_without_faults(string name)
    {
        StageReadResult result = StageText.Read(Presets.Text(name), name, DeviceShelf.Shipped);
        Assert.Empty(result.Faults);
        Assert.NotNull(result.Design);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Writing_what_was_read_changes_no_byte(string name)
    {
        string text = Presets.Text(name);
        Assert.Equal(text, StageText.Write(text, Presets.Read(name)));
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void The_expansion_reads_back_to_the_same_parts_to_the_last_bit(string name)
    {
        StageDesign design = Presets.Read(name);
        string text = PartsText.Write(design);
        StageReadResult back = StageText.Read(text, "parts.toml", DeviceShelf.Shipped);
        Assert.Empty(back.Faults);
        StageCircuit first = design.Family.Expand(design), second = back.Design!.Family.Expand(back.Design);
        Assert.Equal(first.Parts.Count, second.Parts.Count);
        Assert.All(first.Parts.Zip(second.Parts), p => Assert.Equal(PartsOf(p.First), PartsOf(p.Second)));
        Assert.Equal(first.OutputNode, second.OutputNode);
        Assert.Equal(first.Dial.LowHz, second.Dial.LowHz);
        Assert.Equal(first.Dial.Capacitor.MaximumFarad, second.Dial.Capacitor.MaximumFarad);
        Assert.Equal(first.Control!.Unit, second.Control!.Unit);
        for (double travel = 0; travel <= 100; travel += 2.5)
        {
            Assert.Equal(first.Control.Law.ValueAt(travel), second.Control.Law.ValueAt(travel));
        }

        Assert.Equal(first.SupplyVolt, second.SupplyVolt);
        Assert.Equal(text, PartsText.Write(back.Design));
    }

    [Fact]
    public void The_default_preset_has_the_values_of_its_file()
    {
        StageDesign design = Presets.Read(Presets.Default);
        Assert.Equal(84, design.Number("coil.turns"));
        Assert.Equal(0.4e-3, design.Number("coil.wire_diameter"), 1e-18);
        Assert.Equal(15, design.Number("regeneration.potentiometer.mid"));
        Assert.Equal("BC547B", design.Devices["devices.main"].Name);
        Assert.Equal(3.0, design.Number("bias.supply"));
    }

    private static string PartsOf(Part part) => part switch
    {
        // Records compare their figures; a coil compares by what it computes.
        Windings w => string.Join(';', Enumerable.Range(0, w.Model.SectionCount).SelectMany(i =>
            Enumerable.Range(0, w.Model.SectionCount).Select(j => w.Model.Henry(i, j).ToString("R", System.Globalization.CultureInfo.InvariantCulture)))
            .Concat(w.SectionNodes.Select(n => n.From + ">" + n.To))
            .Concat((w.PickUp?.Shares ?? []).Append(w.PickUp?.AreaSquareMetre ?? 0).Select(v => v.ToString("R", System.Globalization.CultureInfo.InvariantCulture)))),
        _ => part.ToString()!,
    };
}
