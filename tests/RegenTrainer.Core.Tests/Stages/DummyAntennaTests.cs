using System.Numerics;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Core.Tests.Stages;

public sealed class DummyAntennaTests
{
    /// <summary>
    /// Impedance of the dummy antenna of the IRE Standards on Radio Receivers (1938, 1948), 200 pF with 20 uH beside 400 ohm and
    /// 400 pF; values computed apart from this program.
    /// </summary>
    [Theory]
    [InlineData(530e3, 2.825, -1430.028)]
    [InlineData(1000e3, 26.982, -651.748)]
    [InlineData(1600e3, 99.653, -284.434)]
    public void The_dummy_antenna_has_the_impedance_of_the_standard(double hz, double ohm, double reactance)
    {
        StageCircuit circuit = Circuit();
        Complex jw = new(0, 2 * Math.PI * hz);
        Capacitor series = Find<Capacitor>(circuit, "dummy series capacitor");
        Inductor coil = Find<Inductor>(circuit, "dummy coil");
        Resistor resistor = Find<Resistor>(circuit, "dummy resistor");
        Capacitor branch = Find<Capacitor>(circuit, "dummy branch capacitor");
        Complex beside = resistor.Ohm + (1 / (jw * branch.Farad));
        Complex impedance = (1 / (jw * series.Farad)) + (1 / ((1 / (jw * coil.Henry)) + (1 / beside)));
        Assert.Equal(ohm, impedance.Real, 0.001);
        Assert.Equal(reactance, impedance.Imaginary, 0.001);
    }

    [Fact]
    public void The_dummy_antenna_is_wired_as_in_the_standard()
    {
        StageCircuit circuit = Circuit();
        string emf = Find<Antenna>(circuit, "antenna").From;
        Capacitor series = Find<Capacitor>(circuit, "dummy series capacitor");
        Inductor coil = Find<Inductor>(circuit, "dummy coil");
        Resistor resistor = Find<Resistor>(circuit, "dummy resistor");
        Capacitor branch = Find<Capacitor>(circuit, "dummy branch capacitor");
        Capacitor coupling = Find<Capacitor>(circuit, "antenna coupling");
        Assert.Equal(emf, series.From);
        Assert.Equal(series.To, coil.From);
        Assert.Equal((coil.From, coil.To), (resistor.From, branch.To));
        Assert.Equal(resistor.To, branch.From);
        Assert.Equal((coil.To, "tank top"), (coupling.From, coupling.To));
        Assert.DoesNotContain(circuit.Parts, p => p.Name is "antenna capacitance" or "earth resistance");
    }

    private static StageCircuit Circuit()
    {
        StageDesign design = DefaultStage.With("antenna.kind", "dummy");
        Assert.Empty(design.Family.Check(design));
        return design.Family.Expand(design);
    }

    private static T Find<T>(StageCircuit circuit, string name)
        where T : Part => circuit.Parts.OfType<T>().Single(p => p.Name == name);
}
