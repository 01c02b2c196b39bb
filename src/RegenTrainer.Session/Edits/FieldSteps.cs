using System.Globalization;
using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;

namespace RegenTrainer.Session.Edits;

/// <summary>The values next to the present one of a field.</summary>
internal static class FieldSteps
{
    /// <summary>What a value without a preferred series steps by, as a share of itself.</summary>
    private const double Share = 0.01;

    /// <summary>From nothing, a value begins at this share of its range, if no series says where.</summary>
    private const double FirstShare = 1e-3;

    /// <summary>The number after one step up or down, kept in the field's range; null where there is none further.</summary>
    /// <param name="field">A quantity or a count.</param>
    /// <param name="number">The number in force.</param>
    /// <param name="up">Upward or downward.</param>
    public static double? Number(Field field, double number, bool up)
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
    public static IEnumerable<string> Words(IReadOnlyList<string> words, string? present, bool up)
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

    private static double ThreeFigures(double number) =>
        double.Parse(number.ToString("E2", CultureInfo.InvariantCulture), NumberStyles.Float, CultureInfo.InvariantCulture);
}
