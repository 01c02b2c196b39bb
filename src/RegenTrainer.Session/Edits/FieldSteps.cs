using System.Globalization;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;

namespace RegenTrainer.Session.Edits;

/// <summary>The values next to the present one of a field.</summary>
internal static class FieldSteps
{
    /// <summary>What a value without a preferred series steps by, as a share of itself.</summary>
    private const double Share = 0.01;

    /// <summary>From nothing, a value begins at this share of its range, if no series says where.</summary>
    private const double FirstShare = 1e-3;

    /// <summary>The values a step leads to, the nearest first: one of a number, all others of a word or device.</summary>
    /// <param name="design">The design.</param>
    /// <param name="field">The field.</param>
    /// <param name="up">Upward, or to the next; downward, or to the one before.</param>
    /// <param name="shelf">Where devices are.</param>
    /// <param name="none">Why there is no step, where there is none.</param>
    public static IEnumerable<FieldValue> From(StageDesign design, Field field, bool up, DeviceShelf shelf, out string none)
    {
        none = "there is no other to step to";
        switch (field.Kind)
        {
            case FieldKind.Choice:
                return Words(field.Choices, design.WordOrNull(field.Key), up).Select(FieldValue.Of);
            case FieldKind.Device:
                return Words(shelf.Names, design.WordOrNull(field.Key), up).Select(FieldValue.Of);
            case FieldKind.Pairs:
                none = "a table of pairs has no steps: type it";
                return [];
            default:
                break;
        }

        if (design.NumberOrNull(field.Key) is not { } number)
        {
            none = "nothing is given to step from: type a value";
            return [];
        }

        none = $"no step {(up ? "above" : "below")} {Shown(field, number)} within {Shown(field, field.Minimum)} to {Shown(field, field.Maximum)}";
        return Number(field, number, up) is { } next ? [FieldValue.Of(next)] : [];
    }

    /// <summary>The number after one step up or down, kept in the field's range; null where there is none further.</summary>
    private static double? Number(Field field, double number, bool up)
    {
        double next = field switch
        {
            { Kind: FieldKind.Count } => number + (up ? 1 : -1),
            { Unit: Unit.Celsius } => up ? Math.Floor(number) + 1 : Math.Ceiling(number) - 1,
            _ when number <= 0 => up ? First(field) : double.NegativeInfinity,
            _ when !up && field.Minimum <= 0 && number <= First(field) => 0,
            { Series: { } series } => up ? series.Above(number) : series.Below(number),
            _ => ThreeFigures(number * (up ? 1 + Share : 1 - Share)),
        };
        double kept = Math.Clamp(next, field.Minimum, field.Maximum);

        // A preferred value beyond the range is no step: what stands at the end of the range is none of the series.
        bool beyond = field.Series is not null && kept != next;
        return beyond || kept == number ? null : kept;
    }

    /// <summary>The words next to the present one, nearest first, all the way round.</summary>
    private static IEnumerable<string> Words(IReadOnlyList<string> words, string? present, bool up)
    {
        int found = words.ToList().FindIndex(w => string.Equals(w, present, StringComparison.OrdinalIgnoreCase));
        int at = found < 0 && !up ? words.Count : found;
        for (int k = 1; k <= words.Count; k++)
        {
            string word = words[(at + (up ? k : words.Count - k) + words.Count) % words.Count];
            if (!string.Equals(word, present, StringComparison.OrdinalIgnoreCase))
            {
                yield return word;
            }
        }
    }

    /// <summary>The smallest value above 0 that a step reaches: one of the unit where a series says what is offered.</summary>
    private static double First(Field field) => field.Series is null ? ThreeFigures(field.Maximum * FirstShare) : Math.Min(1, field.Maximum);

    private static string Shown(Field field, double number) => QuantityText.Write(number, field.Unit, 6);

    private static double ThreeFigures(double number) =>
        double.Parse(number.ToString("E2", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture);
}
