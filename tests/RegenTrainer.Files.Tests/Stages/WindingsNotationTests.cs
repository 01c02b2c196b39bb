using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Coils;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Files.Tests.Stages;

/// <summary>Windings of every notation read as what they say, and read back from what is written.</summary>
public sealed class WindingsNotationTests
{
    private const string Frame = """
        format = "regentrainer.stage/1"
        title = "windings"
        circuit = "parts"
        dial = { low = "530k", high = "1700k", capacitor = { min = "12p", max = "365p" } }
        output.node = "top"
        [[part]]
        kind = "capacitor"
        name = "tuning"
        between = ["top", "earth"]
        role = "tuning"
        [[part]]
        kind = "windings"
        name = "coil"

        """;

    [Fact]
    public void Two_windings_on_one_form_read()
    {
        Windings part = Coil("""
            form_diameter = "50 mm"
            wire_diameter = "AWG 26"
            pitch = "0.6 mm"
            turns = 84
            taps = [4, 24]
            nodes = ["earth", "emitter tap", "base tap", "top"]
            winding = [{ turns = 10, pitch = "1 mm", start = "55 mm", nodes = ["earth", "link"] }]
            """);
        Coil coil = Assert.IsType<Coil>(part.Model);
        Assert.Equal([("earth", "emitter tap"), ("emitter tap", "base tap"), ("base tap", "top"), ("earth", "link")], part.SectionNodes);
        Assert.Equal(2, coil.Geometry.Count);
        Assert.Equal(0.055, coil.Geometry[1].StartMetre, 1e-15);

        // ASTM B258: number 26 is 0.4049 mm.
        Assert.Equal(0.4049e-3, coil.Geometry[1].Wire.BareDiameterMetre, 0.0001e-3);
        ReadsBack(part);
    }

    [Fact]
    public void Windings_under_headers_of_their_own_read()
    {
        Windings part = Coil("""
            radius = "25 mm"
            wire_diameter = "0.4 mm"
            turns = 84
            nodes = ["earth", "top"]
            form_loss_q = 400
            q = { value = 180, at = "1M" }
            [[part.winding]]
            radius = "30 mm"
            turns = 10
            nodes = ["earth", "link"]
            """);
        Coil coil = Assert.IsType<Coil>(part.Model);
        Assert.Equal([0.025, 0.03], coil.Geometry.Select(w => w.RadiusMetre));
        Assert.Equal(180, coil.Q(1e6, 20), 1e-9);
        ReadsBack(part);
    }

    [Fact]
    public void Sections_by_inductance_and_coupling_read()
    {
        Windings part = Coil("""
            sections = [
              { between = ["earth", "tap"], inductance = "10u", q = 100 },
              { between = ["tap", "top"], inductance = "160u", resistance = "2R2" },
            ]
            coupling = [[1, 2, 0.25]]
            self_capacitance = "3p"
            """);

        // M = k sqrt(L1 L2) = 0.25 sqrt(10 uH x 160 uH) = 10 uH.
        Assert.Equal(10e-6, part.Model.Henry(0, 1), 1e-18);
        Assert.Equal(2.2, part.Model.DcOhm(1, 20), 1e-12);
        Assert.Equal([3e-12], part.Model.SelfCapacitanceFarad);
        ReadsBack(part);
    }

    [Fact]
    public void A_winding_on_a_core_reads()
    {
        Windings part = Coil("""
            inductance_factor = "170n"
            turns = 108
            taps = [5, 30]
            nodes = ["earth", "emitter tap", "base tap", "top"]
            section_coupling = 0.99
            q = { value = 120, at = "200k" }
            self_capacitance = "6p"
            wire_diameter = "0.3 mm"
            turn_length = "40 mm"
            picks_up = { shares = [0.05, 0.25, 0.7], area = 0.5 }
            """);

        // L = A_L N^2 = 170 nH x 108^2 = 1.98288 mH.
        double henry = Enumerable.Range(0, 3).Sum(i => Enumerable.Range(0, 3).Sum(j => part.Model.Henry(i, j)));
        Assert.Equal(1.98288e-3, henry, 1e-14);
        Assert.Equal([("earth", "emitter tap"), ("emitter tap", "base tap"), ("base tap", "top")], part.SectionNodes);
        Assert.Equal([0.05, 0.25, 0.7], part.PickUp!.Shares);
        ReadsBack(part);
    }

    public static TheoryData<string, string> WrongOnCores { get; } = new()
    {
        { "section_coupling = 1", "17:20: found 1, expected 0 to 0.999" },
        { "section_coupling = 0.9\nself_capacitance = -1", "18:20: found -1, expected 0 F to 1 µF" },
        { "section_coupling = 0.9\npicks_up = { shares = [1, 0] }", "18:23: found 2 shares, expected 1: one for each section" },
        { "section_coupling = 0.9\npicks_up = { shares = [2] }", "18:24: found 2, expected a share from -1 to 1" },
        {
            "section_coupling = 0.9\nwire_diameter = \"0.01 mm\"\nturn_length = \"1 m\"",
            "16:5: found a measured Q above what the wire alone leaves, expected a lower Q, or thicker wire"
        },
    };

    [Theory]
    [MemberData(nameof(WrongOnCores))]
    public void Windings_on_cores_that_cannot_be_are_told_at_their_value(string lines, string message)
    {
        string text = $"{Frame}inductance_factor = \"170n\"\nturns = 108\nq = {{ value = 120, at = \"200k\" }}\n{lines}\nnodes = [\"earth\", \"top\"]\n";
        FileFault fault = Assert.Single(StageText.Read(text, "w.toml", DeviceShelf.Shipped).Faults);
        Assert.Equal("w.toml:" + message, fault.ToString());
    }

    [Theory]
    [InlineData("length = 25, height = 30, diameter = 0.002", "13:32: found 30, expected at most the length of the wire")]
    [InlineData("length = 25, height = 8, diameter = 0.9", "13:46: found 0.9, expected 0.01 mm to 100 mm")]
    public void A_wire_that_cannot_hang_is_told_at_its_value(string wire, string message)
    {
        string text = Frame.Replace("kind = \"windings\"", $"kind = \"antenna\"\nwire = {{ {wire} }}", StringComparison.Ordinal) + "between = [\"top\", \"earth\"]\n";
        FileFault fault = Assert.Single(StageText.Read(text, "w.toml", DeviceShelf.Shipped).Faults);
        Assert.Equal("w.toml:" + message, fault.ToString());
    }

    public static TheoryData<string, string> Wrong { get; } = new()
    {
        { "turns = 5001\nnodes = [\"earth\", \"top\"]", "16:9: found 5001, expected a whole number from 1 to 5000" },
        { "turns = 20\ntaps = [4, 20]\nnodes = [\"earth\", \"a\", \"b\", \"top\"]", "17:12: found 20, expected a whole number from 1 to 19" },
        { "turns = 20\ntaps = [8, 4]\nnodes = [\"earth\", \"a\", \"b\", \"top\"]", "17:12: found a tap at 4 behind one at 8, expected taps in rising order" },
        { "turns = 20\npitch = \"0.2 mm\"\nnodes = [\"earth\", \"top\"]", "17:9: found \"0.2 mm\", expected at least 0.44 mm, the wire over its insulation" },
        { "turns = 20\nwire_over_insulation = \"0.3 mm\"\nnodes = [\"earth\", \"top\"]", "17:24: found \"0.3 mm\", expected at least 0.4 mm, the bare copper" },
        { "turns = 20\nradius = \"20 mm\"\nnodes = [\"earth\", \"top\"]", "17:1: found a radius beside a form diameter, expected one of the two" },
        { "turns = 20\nnodes = [\"earth\", 3]", "17:19: found 3, expected the name of a node in quotes" },
        { "turns = 20\nnodes = [\"earth\", \"\"]", "17:19: found an empty text, expected a name of 1 to 100 characters" },
        {
            "turns = 20\nnodes = [\"earth\", \"top\"]\nwinding = [{ turns = 3, nodes = [\"earth\", \"link\"] }]",
            "18:12: found two windings with turns in the same place, expected windings beside or around each other"
        },
    };

    [Theory]
    [MemberData(nameof(Wrong))]
    public void Windings_that_cannot_be_wound_are_told_at_their_value(string lines, string message)
    {
        string text = $"{Frame}form_diameter = \"50 mm\"\nwire_diameter = \"0.4 mm\"\n{lines}\n";
        FileFault fault = Assert.Single(StageText.Read(text, "w.toml", DeviceShelf.Shipped).Faults);
        Assert.Equal("w.toml:" + message, fault.ToString());
    }

    public static TheoryData<string, string> WrongCouplings { get; } = new()
    {
        { "[[1, 1, 0.5]]", "15:17: found a section coupled to itself, expected a coupling [section, section, factor]" },
        { "[[1, 2, 0.5], [2, 1, 0.5]]", "15:26: found sections 2 and 1 a second time, expected each pair once" },
        { "[[1, 4, 0.5]]", "15:17: found 4, expected a whole number from 1 to 3" },
        { "[[1, 2, -1]]", "15:20: found -1, expected a factor between -1 and 1, neither itself" },
        {
            "[[1, 2, 0.9], [2, 3, 0.9], [1, 3, -0.9]]",
            "15:12: found couplings that no windings have together, expected lower factors between sections that are coupled to the same third one"
        },
    };

    [Theory]
    [MemberData(nameof(WrongCouplings))]
    public void Couplings_that_cannot_be_are_told_at_their_number(string couplings, string message)
    {
        const string rest = "], inductance = \"100u\" }";
        const string sections = $"{{ between = [\"earth\", \"a\"{rest}, {{ between = [\"earth\", \"b\"{rest}, {{ between = [\"earth\", \"top\"{rest}";
        string text = $"{Frame}sections = [{sections}]\ncoupling = {couplings}\n";
        FileFault fault = Assert.Single(StageText.Read(text, "w.toml", DeviceShelf.Shipped).Faults);
        Assert.Equal("w.toml:" + message, fault.ToString());
    }

    private static Windings Coil(string lines)
    {
        StageReadResult result = StageText.Read(Frame + lines, "w.toml", DeviceShelf.Shipped);
        Assert.True(result.Design is not null, string.Join('\n', result.Faults));
        return result.Design.ExtraParts.OfType<Windings>().Single();
    }

    private static void ReadsBack(Windings part)
    {
        StageDesign design = StageText.Read(Frame + "sections = [{ between = [\"top\", \"earth\"], inductance = \"1u\" }]", "w", DeviceShelf.Shipped).Design!;
        string text = PartsText.Write(design with { ExtraParts = [design.ExtraParts[0], part] });
        Windings back = StageText.Read(text, "w", DeviceShelf.Shipped).Design!.ExtraParts.OfType<Windings>().Single();
        Assert.Equal(part.SectionNodes, back.SectionNodes);
        Assert.Equal(part.PickUp?.Shares ?? [], back.PickUp?.Shares ?? []);
        Assert.Equal(part.PickUp?.AreaSquareMetre, back.PickUp?.AreaSquareMetre);
        int count = part.Model.SectionCount;
        double[] first = new double[count * count], second = new double[count * count];
        part.Model.SeriesOhm(1e6, 20, first);
        back.Model.SeriesOhm(1e6, 20, second);
        Assert.Equal(first, second);
        Assert.Equal(part.Model.SelfCapacitanceFarad, back.Model.SelfCapacitanceFarad);
        for (int i = 0; i < count; i++)
        {
            Assert.Equal(part.Model.DcOhm(i, 20), back.Model.DcOhm(i, 20));
            for (int j = 0; j < count; j++)
            {
                Assert.Equal(part.Model.Henry(i, j), back.Model.Henry(i, j));
            }
        }
    }
}
