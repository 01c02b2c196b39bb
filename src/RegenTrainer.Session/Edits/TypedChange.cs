using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Stages;

namespace RegenTrainer.Session.Edits;

/// <summary>What a builder types, as changes of values, and values as they are typed.</summary>
internal static class TypedChange
{
    private const string At = " at ";

    /// <summary>Reads the changes that a typed text asks of a field: one, or two where a condition stands behind the value.</summary>
    public static bool TryRead(
        StageDesign design, Field field, string text, DeviceShelf shelf, out IReadOnlyList<(string Key, FieldValue? Value)> changes, out string refusal)
    {
        changes = [];
        int at = text.IndexOf(At, StringComparison.OrdinalIgnoreCase);
        Field? condition = at > 0 ? Condition(design, field.Key) : null;
        FieldValue? held = null;
        if (condition is not null && !TypedValue.TryRead(condition, text[(at + At.Length)..], shelf, out held, out refusal))
        {
            refusal = $"behind \"at\", {refusal}";
            return false;
        }

        if (!TypedValue.TryRead(field, condition is null ? text : text[..at], shelf, out FieldValue? value, out refusal))
        {
            return false;
        }

        FieldValue kept = WithTolerance(design, field, value!);
        changes = condition is null ? [(field.Key, kept)] : [(field.Key, kept), (condition.Key, held)];
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

    /// <summary>The field of the condition a value holds at: <c>coil.q.at</c> for <c>coil.q.value</c>; null where there is none.</summary>
    public static Field? Condition(StageDesign design, string key) =>
        key.EndsWith(".value", StringComparison.Ordinal) ? design.Family.FieldFor(key[..^"value".Length] + "at") : null;
}
