using System.Globalization;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Writes the values of fields in the notation their place in a text had before.</summary>
internal static class ValueNotation
{
    /// <summary>Whether two values say the same.</summary>
    public static bool Same(FieldValue a, FieldValue b) =>
        a.Number == b.Number && a.Text == b.Text && a.TolerancePercent == b.TolerancePercent && a.Pairs.SequenceEqual(b.Pairs);

    /// <summary>A value where none stood before.</summary>
    public static string Of(Field field, FieldValue value) => WithTolerance(Plain(field, value, null), value.TolerancePercent);

    /// <summary>Puts one value in the place of another.</summary>
    public static void Change(TextEdits edits, string text, Field field, TomlValue there, FieldValue was, FieldValue now)
    {
        if (there is TomlTable table && now.TolerancePercent is { } percent)
        {
            ChangeInside(edits, field, table, was, now, percent);
            return;
        }

        TomlValue value = there is TomlTable whole ? whole.Find("value")!.Value : there;
        bool kept = field.Kind == FieldKind.Quantity && was.Number == now.Number;
        string plain = kept ? text.Substring(value.Span.Offset, value.Span.Length) : Plain(field, now, value);
        edits.Replace(there.Span, WithTolerance(plain, now.TolerancePercent));
    }

    private static void ChangeInside(TextEdits edits, Field field, TomlTable table, FieldValue was, FieldValue now, double percent)
    {
        if (was.Number != now.Number)
        {
            TomlValue value = table.Find("value")!.Value;
            edits.Replace(value.Span, Plain(field, now, value));
        }

        if (was.TolerancePercent != percent)
        {
            TomlValue tolerance = table.Find("tolerance")!.Value;
            edits.Replace(tolerance.Span, tolerance is TomlNumber ? Notation.Number(percent) : Tolerance(percent));
        }
    }

    private static string WithTolerance(string plain, double? percent) =>
        percent is { } given ? $"{{ value = {plain}, tolerance = {Tolerance(given)} }}" : plain;

    private static string Tolerance(double percent) => $"\"{Notation.Number(percent)}%\"";

    private static string Plain(Field field, FieldValue value, TomlValue? old) => field.Kind switch
    {
        FieldKind.Quantity when old is TomlNumber => Notation.Number(value.Number!.Value),
        FieldKind.Quantity => Notation.Trade(value.Number!.Value, field.Unit, (old as TomlText)?.Text),
        FieldKind.Count => ((int)value.Number!.Value).ToString(CultureInfo.InvariantCulture),
        FieldKind.Pairs => "[" + string.Join(", ", value.Pairs.Select(p => $"[{Notation.Number(p.First)}, {Notation.Number(p.Second)}]")) + "]",
        _ => Notation.Quoted(value.Text!),
    };
}
