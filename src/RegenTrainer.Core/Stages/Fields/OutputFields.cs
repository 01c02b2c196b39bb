using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The output of a stage and what hangs on it.</summary>
public static class OutputFields
{
    /// <summary>Kind of output.</summary>
    public const string Kind = "output.kind";

    /// <summary>Resistor from the follower's emitter to earth.</summary>
    public const string EmitterResistor = "output.emitter_resistor";

    /// <summary>Capacitor to the load.</summary>
    public const string Coupling = "output.coupling";

    /// <summary>Resistance of the load.</summary>
    public const string LoadResistance = "output.load.resistance";

    /// <summary>Capacitance of the load.</summary>
    public const string LoadCapacitance = "output.load.capacitance";

    /// <summary>An emitter follower between collector and load.</summary>
    public const string Follower = "follower";

    /// <summary>The load straight on the collector.</summary>
    public const string Load = "load";

    /// <summary>A crystal detector on the tank.</summary>
    public const string CrystalSet = "crystal-set";

    /// <summary>The node a response is counted to where the output has one of its own.</summary>
    internal const string Node = "output";

    /// <summary>The output of a stage with a device, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        FieldOf.Choice(
            Kind, "an emitter follower, the load straight on the collector, or a crystal detector on the coil", Follower, Follower, Load, CrystalSet),
        FieldOf.Resistance(EmitterResistor, "resistor from the follower's emitter to earth") with { Default = 2.2e3 },
        .. LoadBehind(10e-9, 10e3),
        .. DetectorFields.OnCoil,
    ];

    /// <summary>The load with the capacitor to it.</summary>
    public static IReadOnlyList<Field> LoadBehind(double couplingFarad, double loadOhm) =>
    [
        FieldOf.Capacitance(Coupling, "capacitor to the load; a crystal detector has none") with { Default = couplingFarad },
        FieldOf.Resistance(LoadResistance, "resistance of the load") with { Default = loadOhm },
        new(LoadCapacitance, "capacitance of the load, 0 for none", FieldKind.Quantity, Unit.Farad, 0, 1e-6)
        {
            Default = 30e-12,
            Tolerance = ToleranceKind.Capacitor,
        },
    ];

    /// <summary>Adds the follower, where there is one, and the load.</summary>
    /// <returns>The node a response is counted to.</returns>
    internal static string AddParts(StageDesign design, PartList parts, string rail, string collector)
    {
        string source = collector;
        if (design.Word(Kind) == Follower)
        {
            source = "follower emitter";
            parts.Add(new Bipolar("follower", collector, rail, source, design.Device<BipolarModel>(BiasFields.FollowerDevice)));
            parts.Add(new Resistor("follower resistor", source, Part.Earth, design.Number(EmitterResistor)));
        }

        return AddLoad(design, parts, source);
    }

    /// <summary>Adds the load behind its coupling capacitor.</summary>
    /// <returns>The node a response is counted to.</returns>
    internal static string AddLoad(StageDesign design, PartList parts, string source)
    {
        parts.Add(new Capacitor("output coupling", source, Node, design.Number(Coupling)));
        parts.AddResistor("load", Node, Part.Earth, design.Number(LoadResistance));
        parts.AddCapacitor("load capacitance", Node, Part.Earth, design.Number(LoadCapacitance));
        return Node;
    }

    /// <summary>Adds a fault for a follower without a device or with one of the other polarity, and for a detector without a diode.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        DetectorFields.Check(design, faults);
        if (design.Word(Kind) != Follower)
        {
            return;
        }

        if (!design.Devices.ContainsKey(BiasFields.FollowerDevice))
        {
            faults.Missing(BiasFields.FollowerDevice, $"a device for the follower, or \"{Load}\" as {Kind}");
        }
        else if (design.DeviceOrNull<BipolarModel>(BiasFields.FollowerDevice) is { } follower
            && design.DeviceOrNull<BipolarModel>(BiasFields.MainDevice) is { } main && follower.Polarity != main.Polarity)
        {
            faults.Add(
                BiasFields.FollowerDevice,
                $"{follower.Name}, {Word(follower)}",
                $"a device of the polarity of {main.Name}, {Word(main)}");
        }
    }

    private static string Word(BipolarModel model) => model.Polarity.ToString().ToUpperInvariant();
}
