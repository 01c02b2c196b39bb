using RegenTrainer.Core.Quantities;
using RegenTrainer.Core.Stages;
using RegenTrainer.Files.Devices;
using RegenTrainer.Files.Toml;

namespace RegenTrainer.Files.Stages;

/// <summary>Reads the value of a field as a builder types it, by the rules and in the words of stage files.</summary>
public static class TypedValue
{
    /// <summary>Reads a value: a quantity such as <c>4k7</c> or <c>4k7 5%</c>, a whole number, a word, a device's name, or pairs.</summary>
    /// <param name="field">The field.</param>
    /// <param name="text">What was typed.</param>
    /// <param name="shelf">Where devices are looked up.</param>
    /// <param name="value">The value; null on a refusal.</param>
    /// <param name="character">The first wrong character, counted from 1; null on success.</param>
    /// <param name="refusal">The character, what was found there and what is expected; empty on success.</param>
    public static bool TryRead(Field field, string text, DeviceShelf shelf, out FieldValue? value, out int? character, out string refusal)
    {
        ArgumentNullException.ThrowIfNull(text);
        (value, character) = (null, null);
        (string plain, string? tolerance) = Split(field, text);
        double percent = 0;
        if (tolerance is not null && !QuantityText.TryReadTolerance(tolerance, out percent, out QuantityFault fault))
        {
            character = plain.Length + fault.Offset + 1;
            refusal = Words(character.Value, fault.Found, fault.Expected);
            return false;
        }

        List<FileFault> faults = [];
        if (Parse(field, plain, faults) is { } typed)
        {
            var reader = new FieldReader(new TableReader("", new TomlTable(TomlPlace.Start, default), faults), shelf);
            value = reader.Read(field, typed, out _);
        }

        if (faults.Count > 0 || value is null)
        {
            value = null;
            character = faults.Count == 0 ? null : Math.Max(faults[0].Column, 1);
            refusal = character is { } at ? Words(at, faults[0].Found, faults[0].Expected) : "";
            return false;
        }

        value = tolerance is null ? value : value with { TolerancePercent = percent };
        refusal = "";
        return true;
    }

    /// <summary>A value as it is typed: the text that <see cref="TryRead"/> reads as it again.</summary>
    public static string Write(Field field, FieldValue value)
    {
        string plain = ValueNotation.Of(field, value with { TolerancePercent = null });
        string bare = plain.StartsWith('"') ? value.Text ?? plain[1..^1] : plain;
        return value.TolerancePercent is { } percent ? $"{bare} {Notation.Number(percent)}%" : bare;
    }

    /// <summary>The typed text as the value of a stage file would stand there.</summary>
    private static TomlValue? Parse(Field field, string text, List<FileFault> faults)
    {
        // In single quotes every character counts as it is, so that places in the text stay places in what was typed.
        var at = new TomlPlace(1, 0);
        switch (field.Kind)
        {
            case FieldKind.Count:
                if (QuantityText.TryRead(text, Unit.None, out double number, out QuantityFault fault))
                {
                    return new TomlNumber(TomlPlace.Start, default, number, double.IsInteger(number), text.Trim());
                }

                faults.Add(new FileFault("", 1, fault.Offset + 1, fault.Found, fault.Expected));
                return null;
            case FieldKind.Quantity:
                return new TomlText(at, default, text, $"'{text}'");
            case FieldKind.Choice:
                string word = text.Trim();
                return new TomlText(at, default, field.Choices.FirstOrDefault(c => Alike(c, word)) ?? word, $"'{word}'");
            case FieldKind.Device:
                return new TomlText(at, default, text.Trim(), $"'{text.Trim()}'");
            default:
                return Pairs(text, faults);
        }
    }

    private static TomlValue? Pairs(string text, List<FileFault> faults)
    {
        const string start = "pairs = ";
        if (text.AsSpan().IndexOfAny('\n', '\r') >= 0)
        {
            faults.Add(new FileFault("", 1, text.IndexOfAny(['\n', '\r']) + 1, "the end of a line", "pairs on one line"));
            return null;
        }

        List<FileFault> found = [];
        TomlValue? value = TomlReader.TryRead("", start + text, found)?.Find("pairs")?.Value;
        if (value is TomlList list && found.Count == 0)
        {
            return Moved(list, start.Length);
        }

        faults.Add(found.Count > 0
            ? found[0] with { Column = Math.Max(found[0].Column - start.Length, 1) }
            : new FileFault("", 1, 1, value?.Phrase ?? "nothing", "a list of pairs [[a, b], ...]"));
        return null;
    }

    /// <summary>A list with the places of its values so many columns further left.</summary>
    private static TomlList Moved(TomlList list, int columns) => list with
    {
        At = Left(list.At, columns),
        Items =
        [
            .. list.Items.Select(i => i is TomlList inner ? Moved(inner, columns) : i with { At = Left(i.At, columns) }),
        ],
    };

    private static TomlPlace Left(TomlPlace at, int columns) => at with { Column = at.Column - columns };

    /// <summary>
    /// A quantity and the tolerance behind it: from a plus-minus sign on, or a last word in percent where the field itself has
    /// another unit.
    /// </summary>
    private static (string Plain, string? Tolerance) Split(Field field, string text)
    {
        if (field.Kind != FieldKind.Quantity)
        {
            return (text, null);
        }

        int sign = text.IndexOf('\u00b1', StringComparison.Ordinal);
        string trimmed = text.TrimEnd();
        if (sign < 0 && field.Unit != Unit.Percent && trimmed.EndsWith('%'))
        {
            sign = trimmed[..^1].TrimEnd().LastIndexOf(' ');
        }

        return sign > 0 ? (text[..sign], text[sign..]) : (text, null);
    }

    private static bool Alike(string a, string b) => string.Equals(a, b, StringComparison.OrdinalIgnoreCase);

    private static string Words(int character, string found, string expected) =>
        $"at character {character}: found {Printable.Text(found)}, expected {Printable.Text(expected)}";
}
