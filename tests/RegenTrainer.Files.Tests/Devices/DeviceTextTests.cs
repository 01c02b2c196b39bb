using RegenTrainer.Core.Devices;
using RegenTrainer.Files.Devices;

namespace RegenTrainer.Files.Tests.Devices;

public sealed class DeviceTextTests
{
    private const string Good = """
        format = "regentrainer.device/1"
        name = "TEST1"
        kind = "bipolar"
        polarity = "pnp"
        current_gain = { min = 200, typical = 290, max = 450, at = "2 mA", known = "print", source = "a sheet" }
        transition_frequency = { typical = "300M", at = "10 mA", known = "memory" }
        output_capacitance = { min = "1p", max = "4p", at = "10 V", known = "print", source = "a sheet" }
        input_capacitance = { typical = "9p", at = "0.5 V", known = "memory" }
        saturation_current = { typical = "18f", known = "typical", source = "usual" }
        early_voltage = { typical = 70, known = "memory" }
        base_resistance = { typical = "120", known = "memory" }
        rating = { collector_volts = 45, collector_current = "100 mA" }
        """;

    [Fact]
    public void A_device_file_reads_as_it_says()
    {
        BipolarModel model = Read(Good);
        Assert.Equal("TEST1", model.Name);
        Assert.Equal(Polarity.Pnp, model.Polarity);
        Assert.Equal((200.0, 290.0, 450.0, 2e-3), (model.CurrentGain.Minimum, model.CurrentGain.Typical, model.CurrentGain.Maximum, model.CurrentGain.At));
        Assert.Equal((KnownBy.Print, "a sheet"), (model.CurrentGain.Known, model.CurrentGain.Source));
        Assert.Equal(18e-15, model.SaturationCurrent.Typical);
        Assert.Null(model.CurrentGainLow);
        Assert.Equal(new DeviceRating(45, 0.1, null), model.Rating);
    }

    /// <summary>Between two limits the typical device has their middle by ratio: 1 to 4 pF, 2 pF.</summary>
    [Fact]
    public void Limits_alone_give_the_middle_by_ratio() => Assert.Equal(2e-12, Read(Good).OutputCapacitance.Typical, 1e-24);

    [Theory]
    [InlineData("device/1", "device/2", "1:10: found \"regentrainer.device/2\", expected \"regentrainer.device/1\"")]
    [InlineData("\"pnp\"", "\"both\"", "4:12: found \"both\", expected one of \"npn\", \"pnp\"")]
    [InlineData("kind = \"bipolar\"", "kind = \"triode\"", "3:8: found \"triode\", expected one of \"bipolar\", \"diode\"")]
    [InlineData("at = \"2 mA\"", "at = \"2 mV\"", "5:64: found volt, expected ampere")]
    [InlineData("min = 200", "min = 300", "5:16: found current_gain out of order, expected min, typical and max rising")]
    [InlineData(", source = \"usual\"", ", sourse = \"usual\"", "9:60: found the unknown key \"sourse\", expected \"source\"")]
    [InlineData("known = \"print\", source = \"a sheet\" }\ntrans", "known = \"print\" }\ntrans", "5:16: found no source, expected where the figure is printed")]
    [InlineData("early_voltage = { typical = 70", "early_voltage = { typical = -70", "10:29: found -70, expected 1 V to 10 kV")]
    [InlineData("early_voltage = { typical = 70, known = \"memory\" }\n", "", "1:1: found no early_voltage, expected a table { typical = .., known = .., source = .. }")]
    public void A_fault_is_told_with_its_place(string old, string now, string message)
    {
        Assert.Contains(old, Good, StringComparison.Ordinal);
        DeviceReadResult result = DeviceText.Read(Good.Replace(old, now, StringComparison.Ordinal), "d.toml");
        Assert.Null(result.Model);
        Assert.Equal("d.toml:" + message, Assert.Single(result.Faults).ToString());
    }

    /// <summary>What data sheets print, typed from them again: BC547B and 2N4401 (Fairchild), BF799 (Infineon), BFS19 (Diotec).</summary>
    [Theory]
    [InlineData("BC547B", 200, 450, 2e-3)]
    [InlineData("BF799", 35, 250, 5e-3)]
    [InlineData("BFS19", 65, 225, 1e-3)]
    [InlineData("2N5088", 350, 900, 1e-3)]
    [InlineData("2N4401", 80, 300, 10e-3)]
    public void A_device_that_ships_has_the_gain_of_its_sheet(string name, double least, double most, double at)
    {
        DeviceFigure gain = Shipped(name).CurrentGain;
        Assert.Equal((least, most, at), (gain.Minimum, gain.Maximum, gain.At));
    }

    [Fact]
    public void The_pnp_of_the_pair_mirrors_the_npn()
    {
        BipolarModel npn = Shipped("BC547B"), pnp = Shipped("BC557B");
        Assert.Equal(Figures(npn), Figures(pnp));
        Assert.Equal((Polarity.Npn, Polarity.Pnp), (npn.Polarity, pnp.Polarity));
        Assert.Equal(npn.Rating, pnp.Rating);
    }

    private static (double?, double, double?, double?)[] Figures(BipolarModel m) =>
    [
        .. new[]
        {
            m.CurrentGain, m.CurrentGainLow!, m.TransitionFrequency, m.OutputCapacitance, m.InputCapacitance, m.SaturationCurrent,
            m.EarlyVoltage, m.BaseResistance,
        }.Select(f => (f.Minimum, f.Typical, f.Maximum, f.At)),
    ];

    private static BipolarModel Shipped(string name) => (BipolarModel)DeviceShelf.Shipped.Find(name)!.Model!;

    private static BipolarModel Read(string text)
    {
        DeviceReadResult result = DeviceText.Read(text, "d.toml");
        Assert.Empty(result.Faults);
        return (BipolarModel)result.Model!;
    }
}
