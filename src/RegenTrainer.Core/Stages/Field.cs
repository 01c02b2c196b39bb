using RegenTrainer.Core.Devices;
using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Core.Stages;

/// <summary>What kind of value a field takes.</summary>
public enum FieldKind
{
    /// <summary>A quantity with a unit.</summary>
    Quantity,

    /// <summary>A whole number, of turns for instance.</summary>
    Count,

    /// <summary>One of a fixed list of words.</summary>
    Choice,

    /// <summary>The name of a device on the shelf.</summary>
    Device,

    /// <summary>A table of measured pairs, numbers only.</summary>
    Pairs,
}

/// <summary>Which default tolerance of the stage's <c>[tolerance]</c> table applies to a field.</summary>
public enum ToleranceKind
{
    /// <summary>No tolerance is meaningful.</summary>
    None,

    /// <summary>A resistor.</summary>
    Resistor,

    /// <summary>A capacitor.</summary>
    Capacitor,

    /// <summary>A dimension or turns of a coil.</summary>
    Coil,

    /// <summary>A coil's Q.</summary>
    CoilQ,
}

/// <summary>
/// One value a family declares: reading, error texts, the documentation and every later walk over a design's values use this table.
/// </summary>
/// <param name="Key">Dotted key in the stage file, e.g. <c>coil.taps.base</c>.</param>
/// <param name="Meaning">A phrase in trade words.</param>
/// <param name="Kind">The kind of value.</param>
/// <param name="Unit">Unit of a quantity; <see cref="Unit.None"/> otherwise.</param>
/// <param name="Minimum">Smallest allowed number, inclusive.</param>
/// <param name="Maximum">Largest allowed number, inclusive.</param>
public sealed record Field(string Key, string Meaning, FieldKind Kind, Unit Unit, double Minimum, double Maximum)
{
    /// <summary>Whether a stage file must give the value, where the conditions below hold.</summary>
    public bool Required { get; init; }

    /// <summary>The choice without which the value has no meaning and may not be given; null where it always has one.</summary>
    public FieldCondition? OnlyWith { get; init; }

    /// <summary>The choice with which a required value must be given; null where that is <see cref="OnlyWith"/>.</summary>
    public FieldCondition? RequiredWith { get; init; }

    /// <summary>The number in force where the file gives none; null where there is none.</summary>
    public double? Default { get; init; }

    /// <summary>The word in force where the file gives none.</summary>
    public string? DefaultText { get; init; }

    /// <summary>The allowed words of a choice.</summary>
    public IReadOnlyList<string> Choices { get; init; } = [];

    /// <summary>The kind of device a socket takes; without meaning for other fields.</summary>
    public DeviceKind Socket { get; init; }

    /// <summary>Which default tolerance applies.</summary>
    public ToleranceKind Tolerance { get; init; }

    /// <summary>The series the trade offers such values in; null where values are continuous.</summary>
    public PreferredSeries? Series { get; init; }

    /// <summary>Whether the value must be given with the choices made.</summary>
    /// <param name="word">The word in force for a key, or null where it is not known.</param>
    public bool IsRequired(Func<string, string?> word) => Required && (RequiredWith ?? OnlyWith)?.Holds(word) != false;

    /// <summary>What should stand where the value is missing, a phrase.</summary>
    /// <param name="word">The word in force for a key, or null where it is not known.</param>
    public string ExpectedWith(Func<string, string?> word)
    {
        string value = Kind == FieldKind.Quantity ? $"{Meaning}, {QuantityText.Write(Minimum, Unit)} to {QuantityText.Write(Maximum, Unit)}" : Meaning;
        return (RequiredWith ?? OnlyWith) is { } condition ? $"{value}, with {condition.Key} = \"{word(condition.Key)}\"" : value;
    }
}
