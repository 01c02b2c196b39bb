using RegenTrainer.Core.Circuits;
using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages.Expansion;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The devices of a stage and what feeds them.</summary>
public static class BiasFields
{
    /// <summary>The regenerating device.</summary>
    public const string MainDevice = "devices.main";

    /// <summary>The device of the output follower.</summary>
    public const string FollowerDevice = "devices.follower";

    /// <summary>Supply voltage.</summary>
    public const string Supply = "bias.supply";

    /// <summary>Internal resistance of the supply.</summary>
    public const string SupplyResistance = "bias.supply_resistance";

    /// <summary>Charge of the battery.</summary>
    public const string BatteryCapacity = "bias.battery_capacity";

    /// <summary>Capacitor across the supply.</summary>
    public const string Decoupling = "bias.decoupling";

    /// <summary>Resistor from the supply to the collector.</summary>
    public const string CollectorResistor = "bias.collector_resistor";

    /// <summary>Resistor from the collector to the base.</summary>
    public const string BaseResistor = "bias.base_resistor";

    /// <summary>Capacitor from the base tap to the base.</summary>
    public const string BaseCoupling = "bias.base_coupling";

    /// <summary>Resistor right at the base.</summary>
    public const string BaseStopper = "bias.base_stopper";

    /// <summary>The sockets.</summary>
    public static IReadOnlyList<Field> Devices { get; } =
    [
        FieldOf.Device(MainDevice, "regenerating device", DeviceKind.Bipolar) with { Required = true },
        FieldOf.Device(FollowerDevice, "device of the output follower", DeviceKind.Bipolar),
        DetectorFields.Socket,
    ];

    /// <summary>The battery behind the supply.</summary>
    public static Field Battery { get; } =
        new(BatteryCapacity, "charge of the battery; its life is told where it is given", FieldKind.Quantity, Unit.AmpereHour, 1e-3, 1e3);

    /// <summary>The feed, in the order of the documentation.</summary>
    public static IReadOnlyList<Field> Feed { get; } =
    [
        FieldOf.Voltage(Supply, "supply voltage, without sign") with { Required = true },
        FieldOf.SeriesResistance(SupplyResistance, "internal resistance of the supply") with { Default = 0 },
        Battery,
        FieldOf.Capacitance(Decoupling, "capacitor across the supply; none where not given"),
        FieldOf.Resistance(CollectorResistor, "resistor from the supply to the collector") with { Required = true },
        FieldOf.Resistance(BaseResistor, "resistor from the collector to the base") with { Required = true },
        FieldOf.Capacitance(BaseCoupling, "capacitor from the base tap to the base") with { Required = true },
        FieldOf.SeriesResistance(BaseStopper, "resistor right at the base, 0 for none") with { Default = 0 },
    ];

    /// <summary>
    /// Adds the supply and its decoupling. For a PNP device the rail is negative and everything else stays as it is.
    /// </summary>
    internal static void AddSupply(StageDesign design, PartList parts, string rail, bool negative)
    {
        double volt = design.Number(Supply);
        parts.Add(new Supply("battery", rail, Part.Earth, negative ? -volt : volt, design.Number(SupplyResistance)));
        parts.AddCapacitor("decoupling", rail, Part.Earth, design.NumberOrNull(Decoupling));
    }

    /// <summary>Adds the regenerating device with its collector resistor, base feed and wiring.</summary>
    internal static void AddMain(StageDesign design, PartList parts, string rail, string collector, string emitter, string baseTap)
    {
        const string feed = "base feed";
        parts.Add(new Capacitor("base coupling", baseTap, feed, design.Number(BaseCoupling)));
        parts.Add(new Resistor("base resistor", collector, feed, design.Number(BaseResistor)));
        string @base = parts.ThroughResistor("base stopper", feed, design.Number(BaseStopper), "base");
        parts.AddCapacitor("base wiring", @base, Part.Earth, design.Number(LayoutFields.BaseLead));
        parts.Add(new Bipolar("main", @base, collector, emitter, design.Device<BipolarModel>(MainDevice)) { Role = PartRole.Regenerating });
        parts.Add(new Resistor("collector resistor", rail, collector, design.Number(CollectorResistor)));
    }

    /// <summary>Adds a fault for a stage without its regenerating device.</summary>
    internal static void Check(StageDesign design, FaultList faults)
    {
        if (!design.Devices.ContainsKey(MainDevice))
        {
            faults.Missing(MainDevice, "the regenerating device");
        }
    }
}
