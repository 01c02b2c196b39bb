namespace RegenTrainer.Core.Stages;

/// <summary>The value of one field of a design, in SI units (percent and degrees stay as such).</summary>
/// <param name="Number">The number of a quantity or count; null for words.</param>
/// <param name="Text">The word of a choice or device; null for numbers.</param>
/// <param name="TolerancePercent">Tolerance in percent where the builder gave one.</param>
public sealed record FieldValue(double? Number, string? Text, double? TolerancePercent)
{
    /// <summary>The rows of a table of pairs; empty otherwise.</summary>
    public IReadOnlyList<(double First, double Second)> Pairs { get; init; } = [];

    /// <summary>A number without a tolerance of its own.</summary>
    public static FieldValue Of(double number) => new(number, null, null);

    /// <summary>A word.</summary>
    public static FieldValue Of(string text) => new(null, text, null);
}
