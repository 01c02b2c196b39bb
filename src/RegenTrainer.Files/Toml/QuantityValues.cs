using RegenTrainer.Core.Quantities;

namespace RegenTrainer.Files.Toml;

/// <summary>Reads a quantity from a TOML value: a text as the trade writes it, or a plain number in SI units.</summary>
internal static class QuantityValues
{
    /// <summary>The number, or null with a fault noted.</summary>
    public static double? Read(TableReader reader, TomlValue value, Unit unit, double minimum, double maximum)
    {
        double number;
        switch (value)
        {
            case TomlNumber plain:
                number = plain.Number;
                break;
            case TomlText text:
                if (!QuantityText.TryRead(text.Text, unit, out number, out QuantityFault fault))
                {
                    reader.Refuse(text.PlaceOf(fault.Offset), fault.Found, fault.Expected);
                    return null;
                }

                break;
            default:
                reader.Refuse(value.At, value.Phrase, Expected(unit, minimum, maximum));
                return null;
        }

        if (!(number >= minimum && number <= maximum))
        {
            reader.Refuse(value.At, value.Phrase, Expected(unit, minimum, maximum));
            return null;
        }

        return number;
    }

    /// <summary>The interval as a phrase.</summary>
    public static string Expected(Unit unit, double minimum, double maximum) =>
        $"{QuantityText.Write(minimum, unit)} to {QuantityText.Write(maximum, unit)}";
}
