using RegenTrainer.Core.Devices;
using RegenTrainer.Files.Devices;

namespace RegenTrainer.Files.Tests.Devices;

/// <summary>Device files of diodes, and the diodes that ship.</summary>
public sealed class DiodeTextTests
{
    private const string Good = """
        format = "regentrainer.device/1"
        name = "TEST2"
        kind = "diode"
        material = "schottky"
        saturation_current = { min = "9n", typical = "40n", max = "160n", known = "memory" }
        emission_coefficient = { typical = 1.05, known = "memory" }
        series_resistance = { typical = "2", known = "typical", source = "a sheet" }
        capacitance = { typical = "10p", max = "14p", known = "print", source = "a sheet" }
        rating = { reverse_volts = 100, forward_current = "150 mA" }
        """;

    public static TheoryData<string> Names => ["1N34A", "1N5711", "BAT46", "OA90"];

    [Fact]
    public void A_device_file_reads_as_it_says()
    {
        DiodeModel model = Assert.IsType<DiodeModel>(DeviceText.Read(Good, "d.toml").Model);
        Assert.Equal(("TEST2", JunctionMaterial.Schottky), (model.Name, model.Material));
        Assert.Equal((9e-9, 40e-9, 160e-9), (model.SaturationCurrent.Minimum, model.SaturationCurrent.Typical, model.SaturationCurrent.Maximum));
        Assert.Equal((1.05, 2.0, 10e-12), (model.EmissionCoefficient.Typical, model.SeriesResistance.Typical, model.Capacitance.Typical));
        Assert.Null(model.Capacitance.At);
        Assert.Equal((KnownBy.Print, "a sheet"), (model.Capacitance.Known, model.Capacitance.Source));
        Assert.Equal(new DiodeRating(100, 0.15), model.Rating);
    }

    [Theory]
    [InlineData("\"schottky\"", "\"galena\"", "4:12: found \"galena\", expected one of \"silicon\", \"germanium\", \"schottky\"")]
    [InlineData("material = \"schottky\"\n", "", "1:1: found no material, expected one of \"silicon\", \"germanium\", \"schottky\"")]
    [InlineData("typical = 1.05", "typical = 0.9", "6:36: found 0.9, expected 1 to 4")]
    [InlineData("typical = \"40n\"", "typical = \"40 nF\"", "5:51: found farad, expected ampere")]
    [InlineData("max = \"14p\"", "max = \"14p\", at = \"1 A\"", "8:55: found ampere, expected volt")]
    [InlineData("reverse_volts", "collector_volts", "9:12: found the unknown key \"collector_volts\", expected \"reverse_volts\"")]
    public void A_fault_is_told_with_its_place(string old, string now, string message)
    {
        Assert.Contains(old, Good, StringComparison.Ordinal);
        DeviceReadResult result = DeviceText.Read(Good.Replace(old, now, StringComparison.Ordinal), "d.toml");
        Assert.Null(result.Model);
        Assert.Equal("d.toml:" + message, Assert.Single(result.Faults).ToString());
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void The_diodes_that_ship_are_diodes(string name) => Assert.Equal(DeviceKind.Diode, DeviceShelf.Shipped.Find(name)!.Model!.Kind);

    // Points of the makers' sheets, from memory: 1N34A at least 5 mA at 1 V; OA90 typically 0.18 V at 0.1 mA and 1.05 V at 10 mA;
    // BAT46 at most 0.25 V at 0.1 mA and 0.45 V at 10 mA; 1N5711 at most 0.41 V at 1 mA.
    [Theory]
    [InlineData("1N34A", 5e-3, 0.3, 1.0)]
    [InlineData("OA90", 0.1e-3, 0.17, 0.20)]
    [InlineData("OA90", 10e-3, 0.95, 1.1)]
    [InlineData("BAT46", 0.1e-3, 0.17, 0.25)]
    [InlineData("BAT46", 10e-3, 0.25, 0.45)]
    [InlineData("1N5711", 1e-3, 0.3, 0.41)]
    public void They_pass_the_points_of_their_sheets(string name, double ampere, double least, double most)
    {
        var model = (DiodeModel)DeviceShelf.Shipped.Find(name)!.Model!;
        DiodeLaw law = model.LawAt(Grade.Typical, 25);
        (double low, double high) = (0, 2);
        for (int k = 0; k < 60; k++)
        {
            double middle = (low + high) / 2;
            (low, high) = law.Conduct(middle, 0).I1 < ampere ? (middle, high) : (low, middle);
        }

        Assert.InRange(low + (ampere * model.LeadOhm(Grade.Typical)), least, most);
    }

    /// <summary>Common practice: a germanium diode detects without bias at some ten kilohm, a Schottky type of small current does not.</summary>
    [Theory]
    [InlineData("1N34A", 5e3, 100e3)]
    [InlineData("OA90", 5e3, 200e3)]
    [InlineData("BAT46", 100e3, 2e6)]
    [InlineData("1N5711", 2e6, 100e6)]
    public void They_have_the_resistance_of_their_kind_without_bias(string name, double least, double most)
    {
        TwoPortPoint p = DeviceShelf.Shipped.Find(name)!.Model!.LawAt(Grade.Typical, 25).Evaluate(0, 0);
        Assert.InRange(1 / p.G11, least, most);
        Assert.InRange(p.C11, 0.5e-12, 12e-12);
    }
}
