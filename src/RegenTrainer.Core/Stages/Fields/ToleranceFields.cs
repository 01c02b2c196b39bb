namespace RegenTrainer.Core.Stages.Fields;

/// <summary>The tolerance of each kind of part, where a value gives none of its own.</summary>
public static class ToleranceFields
{
    /// <summary>Tolerance of resistors.</summary>
    public const string Resistor = "tolerance.resistor";

    /// <summary>Tolerance of capacitors.</summary>
    public const string Capacitor = "tolerance.capacitor";

    /// <summary>Tolerance of a coil's dimensions.</summary>
    public const string Coil = "tolerance.coil";

    /// <summary>Tolerance of a coil's Q.</summary>
    public const string CoilQ = "tolerance.coil_q";

    /// <summary>Tolerance of the total resistance of a potentiometer.</summary>
    public const string Potentiometer = "tolerance.potentiometer";

    /// <summary>The fields, in the order of the documentation; the defaults are common practice.</summary>
    public static IReadOnlyList<Field> All { get; } =
    [
        FieldOf.Percent(Resistor, "tolerance of resistors", 0, 50) with { Default = 5 },
        FieldOf.Percent(Capacitor, "tolerance of capacitors", 0, 50) with { Default = 10 },
        FieldOf.Percent(Coil, "tolerance of a coil's dimensions", 0, 50) with { Default = 1 },
        FieldOf.Percent(CoilQ, "tolerance of a coil's Q", 0, 50) with { Default = 10 },
        FieldOf.Percent(Potentiometer, "tolerance of a potentiometer's total resistance", 0, 50) with { Default = 20 },
    ];

    /// <summary>The field that holds the default tolerance of a kind; null for a kind without one.</summary>
    public static string? KeyFor(ToleranceKind kind) => kind switch
    {
        ToleranceKind.Resistor => Resistor,
        ToleranceKind.Capacitor => Capacitor,
        ToleranceKind.Coil => Coil,
        ToleranceKind.CoilQ => CoilQ,
        _ => null,
    };
}
