using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;

namespace RegenTrainer.Core.Tests.Oracles;

public sealed class BiasTests
{
    /// <summary>
    /// By hand, at 20 °C (V_T 25.261712458 mV), I_S 1e-15 A, gain 100, wanted 1 mA: V_BE = V_T ln(1e12) = 0.698006910 V; the emitter
    /// stands at 1.01 mA x 1 kohm = 1.01 V, the collector at 9 - 2 = 7 V; 10 uA through 200 ohm of base lead and the rest of
    /// (9 - 1.708006910)/10 uA = 729 199.309 ohm outside.
    /// </summary>
    [Fact]
    public void A_stage_with_emitter_resistor_stands_where_the_hand_puts_it()
    {
        Part[] parts =
        [
            new Supply("battery", "plus", Part.Earth, 9, 0),
            new Resistor("rb", "plus", "base", 728999.30896490784),
            new Resistor("re", "emitter", Part.Earth, 1000),
            new Resistor("rc", "plus", "choke", 1900),
            new Inductor("choke", "choke", "collector", 2.5e-3, 100, 50),
            new Capacitor("bypass", "emitter", Part.Earth, 10e-9, 1000),
            new Capacitor("coupling", "collector", "floating", 1e-9),
            new Capacitor("c", "floating", Part.Earth, 1e-9),
        ];
        OracleDevice device = new("q", "base", "collector", "emitter", 200, new ExponentialLaw(1e-15, 0.025261712457978588, 100, 10e-12));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        Assert.Equal(1.01, oracle.OperatingVolt("emitter"), 1e-7);
        Assert.Equal(7.0, oracle.OperatingVolt("collector"), 1e-6);
        Assert.Equal(1e-3, oracle.OperatingAmpere("choke"), 1e-9);
        Assert.Equal(-1.01e-3, oracle.OperatingAmpere("battery"), 1e-9);
        Assert.Equal(0.69800691035092162, oracle.OperatingPorts("q").Control, 1e-8);
    }

    /// <summary>
    /// V_CE = V_T ln{[1 + (I_C/I_B)(1 - a_R)] / (a_R [1 - (I_C/I_B)(1 - a_F)/a_F])} [Ebers and Moll 1954] at I_C/I_B = 11.64752,
    /// V_T 25 mV, a_F 200/201, a_R 4/5.
    /// </summary>
    [Fact]
    public void A_saturated_transistor_leaves_the_voltage_of_Ebers_and_Moll()
    {
        Part[] parts =
        [
            new Supply("battery", "plus", Part.Earth, 5, 0),
            new Resistor("rb", "plus", "base", 10e3),
            new Resistor("rc", "plus", "collector", 1e3),
        ];
        OracleDevice device = new("q", "base", "collector", Part.Earth, 0, new TwoJunctionLaw());
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        Assert.Equal(0.03714923656, oracle.OperatingVolt("collector"), 1e-9);
        double ratio = (5 - oracle.OperatingVolt("collector")) / (5 - oracle.OperatingVolt("base")) * 10;
        Assert.Equal(11.6475246, ratio, 1e-6);
    }

    [Fact]
    public void A_stage_left_alone_stays_where_it_stands()
    {
        Part[] parts =
        [
            new Supply("battery", "plus", Part.Earth, 9, 10),
            new Resistor("rb", "plus", "base", 500e3),
            new Resistor("re", "emitter", Part.Earth, 1000),
            new Inductor("choke", "plus", "collector", 2.5e-3, 100, 50),
            new Capacitor("bypass", "emitter", Part.Earth, 10e-9, 1000),
        ];
        OracleDevice device = new("q", "base", "collector", "emitter", 0, new ExponentialLaw(1e-15, 0.025, 100, 10e-12));
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6, [device]);
        double[] volt = oracle.Run(new OracleRun(1e-6 / 120, 12_000) { Nodes = ["emitter"] }).Volt["emitter"];
        Assert.All(volt, v => Assert.Equal(oracle.OperatingVolt("emitter"), v, 1e-10));
    }

    [Fact]
    public void A_floating_node_is_refused_by_a_run()
    {
        Part[] parts = [new Resistor("r", "a", "b", 1000), new Antenna("emf", "c", Part.Earth)];
        var oracle = new CarrierLevelOracle(parts, Grade.Typical, 20, 1e6);
        Assert.Throws<InvalidOperationException>(() => oracle.Run(new OracleRun(1e-8, 10) { Nodes = ["a"] }));
    }
}
