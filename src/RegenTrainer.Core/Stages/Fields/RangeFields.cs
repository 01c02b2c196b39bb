using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages.Fields;

/// <summary>What a stage must work over.</summary>
public static class RangeFields
{
    /// <summary>Supply when fresh.</summary>
    public const string SupplyFresh = "range.supply.fresh";

    /// <summary>Supply at the end of its life.</summary>
    public const string SupplyTired = "range.supply.tired";

    /// <summary>Lowest temperature.</summary>
    public const string TemperatureLow = "range.temperature.low";

    /// <summary>Highest temperature.</summary>
    public const string TemperatureHigh = "range.temperature.high";

    /// <summary>The range of the supply.</summary>
    public static IReadOnlyList<Field> Supply { get; } =
    [
        FieldOf.Voltage(SupplyFresh, "supply when fresh; the nominal supply where not given"),
        FieldOf.Voltage(SupplyTired, "supply at the end of its life; the nominal supply where not given"),
    ];

    /// <summary>The range of the temperature.</summary>
    public static IReadOnlyList<Field> Temperature { get; } =
    [
        FieldOf.Temperature(TemperatureLow, "lowest temperature of the room", 0),
        FieldOf.Temperature(TemperatureHigh, "highest temperature of the room", 40),
    ];

    /// <summary>Adds a fault for every range that is upside down.</summary>
    /// <param name="design">The design.</param>
    /// <param name="nominalVolt">The nominal supply in volt; null where there is none.</param>
    /// <param name="faults">Where the faults go.</param>
    internal static void Check(StageDesign design, double? nominalVolt, FaultList faults)
    {
        double? fresh = design.NumberOrNull(SupplyFresh) ?? nominalVolt;
        double? tired = design.NumberOrNull(SupplyTired) ?? nominalVolt;
        if (fresh < tired)
        {
            string key = design.Gives(SupplyTired) ? SupplyTired : SupplyFresh;
            double found = key == SupplyTired ? tired.Value : fresh.Value;
            string expected = key == SupplyTired
                ? $"at most {FaultList.Quantity(fresh.Value, Unit.Volt)}, the fresh supply"
                : $"at least {FaultList.Quantity(tired.Value, Unit.Volt)}, the tired supply";
            faults.Add(key, FaultList.Quantity(found, Unit.Volt), expected);
        }

        faults.Ascending(design, TemperatureLow, TemperatureHigh, Unit.Celsius, "the highest temperature");
    }
}
