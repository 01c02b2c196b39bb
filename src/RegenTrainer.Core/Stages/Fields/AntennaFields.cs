using RegenTrainer.Core.Antennas;
using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Quantities;
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

    /// <summary>Length of a long wire.</summary>
    public const string WireLength = "antenna.wire.length";

    /// <summary>Height of a long wire over ground.</summary>
    public const string WireHeight = "antenna.wire.height";

    /// <summary>Diameter of a long wire.</summary>
    public const string WireDiameter = "antenna.wire.diameter";

    /// <summary>A wire short against the wavelength: a capacitance and the resistance of the earth.</summary>
    public const string ShortWire = "short-wire";

    /// <summary>The standard dummy antenna of the broadcast bands.</summary>
    public const string Dummy = "dummy";

    /// <summary>A wire of a length and height over ground, up to a quarter wave.</summary>
    public const string LongWire = "long-wire";

    private const string Emf = "antenna EMF";
    private const string Lead = "antenna";

    private static readonly FieldCondition _withLongWire = new(Kind, [LongWire]);
    private static readonly FieldCondition _withStatedCapacitance = new(Kind, [ShortWire, Dummy]);
    private static readonly FieldCondition _withWire = new(Kind, [ShortWire, Dummy, LongWire]);

    /// <summary>The antennas that any tank can have, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> All { get; } = With();

    /// <summary>The fields, in the order of the documentation; the defaults are common practice for some metres of wire.</summary>
    /// <param name="more">Further kinds of antenna the stage can have.</param>
    internal static IReadOnlyList<Field> With(params string[] more) =>
    [
        FieldOf.Choice(Kind, "kind of antenna", ShortWire, [ShortWire, Dummy, LongWire, .. more]),
        FieldOf.Capacitance(Capacitance, "capacitance of a short wire") with
        {
            Default = 60e-12,
            Maximum = 10e-9,
            OnlyWith = _withStatedCapacitance,
        },
        FieldOf.SeriesResistance(EarthResistance, "resistance of the earth behind a wire") with
        {
            Default = 50,
            Maximum = 100e3,
            OnlyWith = _withWire,
        },
        FieldOf.Capacitance(Coupling, "capacitor from the antenna to the tank; a long wire goes straight to it where not given") with
        {
            Required = true,
            OnlyWith = _withWire,
            RequiredWith = _withStatedCapacitance,
        },
        FieldOf.Length(WireLength, "length of a long wire, from the earth to its far end", 0.5, 300) with { Required = true, OnlyWith = _withLongWire },
        FieldOf.Length(WireHeight, "height of a long wire over ground: it leads up to it and on level from there", 0.5, 100) with
        {
            Required = true,
            OnlyWith = _withLongWire,
        },
        FieldOf.Length(WireDiameter, "diameter of a long wire", 0.1e-3, 20e-3) with { Default = 2e-3, OnlyWith = _withLongWire },
    ];

    /// <summary>Adds the antenna from its electromotive force to the tank; nothing where the coil itself is the antenna.</summary>
    internal static void AddParts(StageDesign design, PartList parts, string tankTop)
    {
        switch (design.Word(Kind))
        {
            case ShortWire:
                parts.Add(new Antenna("antenna", Emf, Part.Earth));
                string wire = parts.ThroughResistor("earth resistance", Emf, design.Number(EarthResistance), "antenna wire");
                parts.Add(new Capacitor("antenna capacitance", wire, Lead, design.Number(Capacitance)));
                break;
            case Dummy:
                parts.Add(new Antenna("antenna", Emf, Part.Earth));
                AddDummy(parts, Emf, Lead);
                break;
            case LongWire:
                AddLongWire(design, parts, design.Gives(Coupling) ? Lead : tankTop);
                break;
            default:
                return;
        }

        parts.AddCapacitor("antenna coupling", Lead, tankTop, design.NumberOrNull(Coupling));
    }

    /// <summary>Adds a fault for a long wire that does not reach its height.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        if (design.Word(Kind) == LongWire && design.Number(WireHeight) > design.Number(WireLength))
        {
            faults.Add(
                WireHeight,
                FaultList.Quantity(design.Number(WireHeight), Unit.Metre),
                $"at most {FaultList.Quantity(design.Number(WireLength), Unit.Metre)}, the length of the wire that leads up to it");
        }
    }

    /// <summary>
    /// Adds a long wire: the resistances of radiation, at the geometric middle of the band, and of the earth; then the branch of
    /// its first resonance with the capacitance of the others across it.
    /// </summary>
    private static void AddLongWire(StageDesign design, PartList parts, string lead)
    {
        const string foot = "antenna foot";
        const string inside = "antenna branch";
        WireOverGround wire = new(design.Number(WireLength), design.Number(WireHeight), design.Number(WireDiameter));
        double middle = Math.Sqrt(design.Number(DialFields.Low) * design.Number(DialFields.High));
        parts.Add(new Antenna("antenna", Emf, Part.Earth) { Wire = wire });
        string earthed = parts.ThroughResistor("earth resistance", Emf, design.Number(EarthResistance), "antenna earth");
        parts.Add(new Resistor("radiation resistance", earthed, foot, wire.RadiationOhm(middle)));
        parts.Add(new Inductor("antenna inductance", foot, inside, wire.BranchHenry));
        parts.Add(new Capacitor("antenna capacitance", inside, lead, wire.BranchFarad));
        parts.Add(new Capacitor("antenna end capacitance", foot, lead, wire.ShuntFarad));
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
