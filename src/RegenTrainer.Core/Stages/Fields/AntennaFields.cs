using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The antenna and how it is coupled to the tank.</summary>
public static class AntennaFields
{
    /// <summary>Kind of antenna.</summary>
    public const string Kind = "antenna.kind";

    /// <summary>Capacitance of the wire.</summary>
    public const string Capacitance = "antenna.capacitance";

    /// <summary>Resistance of the earth.</summary>
    public const string EarthResistance = "antenna.earth_resistance";

    /// <summary>Capacitor from the antenna to the tank.</summary>
    public const string Coupling = "antenna.coupling";

    /// <summary>A wire short against the wavelength: a capacitance and the resistance of the earth.</summary>
    public const string ShortWire = "short-wire";

    /// <summary>The standard dummy antenna of the broadcast bands.</summary>
    public const string Dummy = "dummy";

    /// <summary>The fields, in the order of the documentation; the defaults are common practice for some metres of wire.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        FieldOf.Choice(Kind, "kind of antenna", ShortWire, ShortWire, Dummy),
        FieldOf.Capacitance(Capacitance, "capacitance of a short wire") with { Default = 60e-12, Maximum = 10e-9 },
        FieldOf.SeriesResistance(EarthResistance, "resistance of the earth behind a short wire") with { Default = 50, Maximum = 100e3 },
        FieldOf.Capacitance(Coupling, "capacitor from the antenna to the tank") with { Required = true },
    ];

    /// <summary>Adds the antenna from its electromotive force to the tank.</summary>
    internal static void AddParts(StageDesign design, PartList parts, string tankTop)
    {
        const string emf = "antenna EMF";
        const string lead = "antenna";
        parts.Add(new Antenna("antenna", emf, Part.Earth));
        if (design.Word(Kind) == Dummy)
        {
            AddDummy(parts, emf, lead);
        }
        else
        {
            string wire = parts.ThroughResistor("earth resistance", emf, design.Number(EarthResistance), "antenna wire");
            parts.Add(new Capacitor("antenna capacitance", wire, lead, design.Number(Capacitance)));
        }

        parts.Add(new Capacitor("antenna coupling", lead, tankTop, design.Number(Coupling)));
    }

    /// <summary>
    /// The dummy antenna for receivers from 540 kHz to 23 MHz: 200 pF, then 20 uH beside 400 ohm with 400 pF [IRE 1948].
    /// </summary>
    private static void AddDummy(PartList parts, string emf, string lead)
    {
        const string coil = "dummy coil";
        const string branch = "dummy branch";
        parts.Add(new Capacitor("dummy series capacitor", emf, coil, 200e-12));
        parts.Add(new Inductor("dummy coil", coil, lead, 20e-6));
        parts.Add(new Resistor("dummy resistor", coil, branch, 400));
        parts.Add(new Capacitor("dummy branch capacitor", branch, lead, 400e-12));
    }
}
