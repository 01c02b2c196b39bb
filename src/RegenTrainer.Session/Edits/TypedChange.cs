using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Session.Edits;

/// <summary>What a builder's typing changes in a design.</summary>
internal static class TypedChange
{
    private const string At = " at ";

    /// <summary>Reads what was typed for a field: a value, perhaps with its condition behind "at"; nothing is the default again.</summary>
    /// <param name="design">The design it was typed for.</param>
    /// <param name="key">The field.</param>
    /// <param name="text">What was typed.</param>
    /// <param name="shelf">Where devices are looked up.</param>
    /// <param name="changes">Fields and their values; empty on a refusal.</param>
    /// <param name="character">The first wrong character, counted from 1; null where no single one is wrong.</param>
    /// <param name="refusal">The character, what was found there and what is expected; empty on success.</param>
    public static bool TryRead(
        StageDesign design, string key, string text, DeviceShelf shelf, out IReadOnlyList<(string Key, FieldValue? Value)> changes, out int? character, out string refusal)
    {
        (changes, character, refusal) = ([], null, "");
        if (design.Family.FieldFor(key) is not { } field || text.AsSpan().Trim().IsEmpty)
        {
            changes = [(key, null)];
            return true;
        }

        List<(string, FieldValue?)> read = [];
        int at = text.IndexOf(At, StringComparison.OrdinalIgnoreCase);
        if (Condition(design, key) is { } condition && at > 0)
        {
            int behind = at + At.Length;
            if (!TypedValue.TryRead(condition, text[behind..], shelf, out FieldValue? typed, out character, out refusal))
            {
                (character, refusal) = (character + behind, $"behind \"at\", {refusal}");
                return false;
            }

            read.Add((condition.Key, typed));
            text = text[..at];
        }

        if (!TypedValue.TryRead(field, text, shelf, out FieldValue? value, out character, out refusal))
        {
            return false;
        }

        changes = [(key, WithTolerance(design, field, value!)), .. read];
        return true;
    }

    /// <summary>The value in force as it is typed; empty where there is none.</summary>
    public static string Write(StageDesign design, Field field)
    {
        FieldValue? value = design.Values.GetValueOrDefault(field.Key)
            ?? (field.Default is { } number ? FieldValue.Of(number) : field.DefaultText is { } word ? FieldValue.Of(word) : null);
        return value is null ? "" : TypedValue.Write(field, value);
    }

    /// <summary>A value with the tolerance its field has been given, unless it brings one of its own.</summary>
    public static FieldValue WithTolerance(StageDesign design, Field field, FieldValue value) =>
        field.Kind == FieldKind.Quantity && value.TolerancePercent is null && design.Values.TryGetValue(field.Key, out FieldValue? given)
            ? value with { TolerancePercent = given.TolerancePercent }
            : value;

    /// <summary>The field of the condition a value holds at: <c>coil.q.at</c> for <c>coil.q.value</c>.</summary>
    public static Field? Condition(StageDesign design, string key) =>
        key.EndsWith(".value", StringComparison.Ordinal) ? design.Family.FieldFor(key[..^"value".Length] + "at") : null;
}
