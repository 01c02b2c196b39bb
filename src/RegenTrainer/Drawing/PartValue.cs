using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Drawing;

/// <summary>How the value of a field is written.</summary>
internal static class PartValue
{
    private const int Figures = 6;

    /// <summary>The value in force; a dash where there is none, or where it has no meaning with the choices made.</summary>
    public static string Shown(Field field, StageDesign design) => field.Kind switch
    {
        _ when field.OnlyWith?.Holds(design.WordOrNull) == false => Drawing.Figures.None,
        FieldKind.Choice or FieldKind.Device => design.WordOrNull(field.Key) ?? Drawing.Figures.None,
        FieldKind.Pairs => design.Values.TryGetValue(field.Key, out FieldValue? table) ? $"{table.Pairs.Count} pairs" : Drawing.Figures.None,
        _ => design.NumberOrNull(field.Key) is { } number ? Number(field, number) : Drawing.Figures.None,
    };

    /// <summary>A number of a field: resistors in letter code, everything else with its unit.</summary>
    public static string Number(Field field, double number) =>
        field.Unit == Unit.Ohm && number > 0
            ? QuantityText.WriteCode(number, field.Unit, Figures)
            : Drawing.Figures.Quantity(number, field.Unit, Figures);

    /// <summary>What may stand in a field.</summary>
    public static string Range(Field field) => field.Kind switch
    {
        FieldKind.Choice => string.Join(", ", field.Choices),
        FieldKind.Device => "a device of the shelf",
        FieldKind.Pairs => "a table, edited in the file",
        _ => $"{Number(field, field.Minimum)} to {Number(field, field.Maximum)}",
    };

    /// <summary>How the keys step the value; empty where they do not.</summary>
    public static string Step(Field field) => field switch
    {
        { Kind: FieldKind.Pairs } => "",
        { Kind: FieldKind.Count } => "by ones",
        { Series: { } series } => "steps of " + series.Name,
        { Kind: FieldKind.Quantity, Unit: Unit.Celsius } => "by degrees",
        { Kind: FieldKind.Quantity } => "steps of 1 %",
        _ => "",
    };
}
