using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session.Edits;

/// <summary>Whether a value can stand in a field at all, whatever the other fields say.</summary>
internal static class FieldCheck
{
    /// <summary>
    /// Why a value cannot stand in a field; null where it can. A null value means the field is not given; whether one must be that
    /// only some choices ask for is no question of the field alone.
    /// </summary>
    public static string? Refusal(Field field, FieldValue? value)
    {
        if (value is null)
        {
            return field is { Required: true, RequiredWith: null, OnlyWith: null } ? $"found nothing, expected {field.Meaning}" : null;
        }

        if (value.TolerancePercent is { } percent && (field.Kind != FieldKind.Quantity || percent is not (>= 0 and <= 100)))
        {
            return field.Kind == FieldKind.Quantity
                ? $"found a tolerance of {QuantityText.Write(percent, Unit.Percent, 6)}, expected 0 % to 100 %"
                : "found a tolerance, expected none: only quantities have one";
        }

        return field.Kind switch
        {
            FieldKind.Quantity => Number(field, value.Number),
            FieldKind.Count when value.Number is { } count && !double.IsInteger(count) => $"found {Shown(field, count)}, expected a whole number",
            FieldKind.Count => Number(field, value.Number),
            FieldKind.Choice => field.Choices.Contains(value.Text ?? "", StringComparer.Ordinal)
                ? null
                : $"found {Word(value.Text)}, expected one of {string.Join(", ", field.Choices.Select(Word))}",
            FieldKind.Device => string.IsNullOrEmpty(value.Text) ? "found nothing, expected the name of a device" : null,
            _ => value.Pairs.SelectMany(p => new[] { p.First, p.Second }).Select(n => Number(field, n)).FirstOrDefault(r => r is not null),
        };
    }

    private static string? Number(Field field, double? number) =>
        number >= field.Minimum && number <= field.Maximum
            ? null
            : $"found {(number is { } given ? Shown(field, given) : "no number")}, expected {Shown(field, field.Minimum)} to {Shown(field, field.Maximum)}";

    private static string Shown(Field field, double number) => QuantityText.Write(number, field.Unit, 6);

    private static string Word(string? text) => text is null ? "nothing" : $"\"{Printable.Text(text)}\"";
}
