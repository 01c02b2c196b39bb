using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>
/// A crystal detector on the tank: a diode, behind it the load with a capacitor that keeps the radio frequency out of it. The
/// response is counted to the detector's input, the radio-frequency voltage across diode and bypassed load.
/// </summary>
public static class DetectorFields
{
    /// <summary>The diode.</summary>
    public const string Device = "devices.detector";

    /// <summary>Where on the coil the detector is fed from.</summary>
    public const string Tap = "output.tap";

    /// <summary>Capacitor across the detector's load.</summary>
    public const string Bypass = "output.bypass";

    /// <summary>Resistor from the supply that passes a small current through the diode.</summary>
    public const string BiasResistor = "output.bias_resistor";

    private const string EmitterTap = "emitter";
    private const string BaseTap = "base";
    private const string TankTop = "top";
    private const string Behind = "detector load";

    /// <summary>The socket of the diode.</summary>
    public static Field Socket { get; } = FieldOf.Device(Device, "diode of a crystal detector", DeviceKind.Diode);

    /// <summary>The detector of a stage with a tapped coil and a supply, beside the choice of an output.</summary>
    public static IReadOnlyList<Field> OnCoil { get; } =
    [
        FieldOf.Choice(Tap, "where on the coil a crystal detector is fed from", BaseTap, EmitterTap, BaseTap, TankTop),
        BypassField,
        FieldOf.Resistance(BiasResistor, "resistor from the supply that passes a small forward current through the diode; none where not given"),
    ];

    /// <summary>The choice of an output and the detector of a tank without taps or supply.</summary>
    public static IReadOnlyList<Field> OnTank { get; } =
    [
        FieldOf.Choice(
            OutputFields.Kind, "the load through its coupling capacitor, or a crystal detector on the tank", OutputFields.Load,
            OutputFields.Load, OutputFields.CrystalSet),
        BypassField,
    ];

    // 220 pF with 100 kohm, or 470 pF with 47 kohm, follow an envelope of 5 kHz at a depth of 80 %: Terman's limit of 23.9 us.
    private static Field BypassField => FieldOf.Capacitance(Bypass, "capacitor across the load of a crystal detector") with { Default = 470e-12 };

    /// <summary>Adds the detector on a tap of the coil, with its wiring and its bias.</summary>
    /// <returns>The node a response is counted to.</returns>
    internal static string AddOnCoil(
        StageDesign design, PartList parts, string emitterTap, string baseTap, string tankTop, string rail, bool negative)
    {
        string source = design.Word(Tap) switch
        {
            EmitterTap => emitterTap,
            BaseTap => baseTap,
            _ => tankTop,
        };
        double? bias = design.NumberOrNull(BiasResistor);
        parts.AddCapacitor("detector wiring", source, Part.Earth, design.Number(LayoutFields.DetectorLead));

        // The current of the bias resistor runs over the diode and the coil to earth: the diode points along it.
        AddDiode(design, parts, source, reversed: bias is not null && !negative);
        parts.AddResistor("detector bias resistor", rail, Behind, bias);
        return source;
    }

    /// <summary>Adds the detector at a node of the tank that carries no direct voltage.</summary>
    /// <returns>The node a response is counted to.</returns>
    internal static string AddParts(StageDesign design, PartList parts, string source)
    {
        AddDiode(design, parts, source, reversed: false);
        return source;
    }

    /// <summary>Adds a fault for a crystal detector without a diode.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        if (design.Word(OutputFields.Kind) == OutputFields.CrystalSet && !design.Devices.ContainsKey(Device))
        {
            faults.Missing(Device, $"a diode for the detector, or another word than \"{OutputFields.CrystalSet}\" as {OutputFields.Kind}");
        }
    }

    private static void AddDiode(StageDesign design, PartList parts, string source, bool reversed)
    {
        (string anode, string cathode) = reversed ? (Behind, source) : (source, Behind);
        parts.Add(new Diode("detector", anode, cathode, design.Device<DiodeModel>(Device)));
        parts.AddCapacitor("detector bypass", Behind, Part.Earth, design.Number(Bypass));
        parts.AddResistor("load", Behind, Part.Earth, design.Number(OutputFields.LoadResistance));
        parts.AddCapacitor("load capacitance", Behind, Part.Earth, design.Number(OutputFields.LoadCapacitance));
    }
}
