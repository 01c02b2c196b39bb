using System.Globalization;

namespace RegenTrainer.Core.Quantities;

/// <summary>Writes quantities as the trade does: a prefix that leaves one to three figures before the point.</summary>
internal static class QuantityWriter
{
    private const string Micro = "\u00b5";

    /// <summary>The form for screens and reports.</summary>
    public static string Display(double value, Unit unit, int figures, string micro = Micro)
    {
        string sign = UnitSigns.Sign(unit);
        string gap = unit is Unit.None or Unit.Degree ? "" : " ";
        if (!double.IsFinite(value))
        {
            return double.IsNaN(value) ? "\u2014" : (value > 0 ? "\u221e" : "-\u221e") + gap + sign;
        }

        Decimals number = Decimals.Of(value, figures);
        int power = PowerFor(number, unit);
        return UnitSigns.Prefix(power, micro) is string prefix && (number.IsZero || Readable(number, unit))
            ? number.Plain(power) + gap + prefix + sign
            : number.Scientific() + gap + sign;
    }

    /// <summary>The letter code where the unit has one, the display form with a plain u for micro where not.</summary>
    public static string Code(double value, Unit unit, int figures)
    {
        Guard.Finite(value, nameof(value));
        if (unit == Unit.Metre || !UnitSigns.TakesPrefix(unit))
        {
            string shown = Display(value, unit, figures, "u");
            return unit == Unit.Percent ? shown.Replace(" ", "", StringComparison.Ordinal) : shown;
        }

        Decimals number = Decimals.Of(value, figures);
        int power = PowerFor(number, unit);
        if (number.IsZero || unit == Unit.None || UnitSigns.Prefix(power, "u") is not string prefix)
        {
            return Readable(number, unit) ? number.Plain(0) : number.Scientific();
        }

        string letter = power == 0 ? UnitSigns.PointLetter(unit)?.ToString() ?? "" : prefix;
        string plain = number.Plain(power);
        int point = plain.IndexOf('.', StringComparison.Ordinal);
        if (letter.Length == 0)
        {
            return plain;
        }

        if (point < 0)
        {
            return plain + letter;
        }

        // Below one ohm the letter leads: R47.
        string whole = letter == "R" && plain[..point].TrimStart('-') == "0" ? plain[..point].TrimEnd('0') : plain[..point];
        return whole + letter + plain[(point + 1)..];
    }

    private static bool Readable(Decimals number, Unit unit) =>
        number.IsZero || (UnitSigns.TakesPrefix(unit) && unit != Unit.None
            ? UnitSigns.Prefix(PowerFor(number, unit), Micro) is not null
            : number.Power is >= -4 and <= 14);

    /// <summary>The power of ten to write with: steps of a thousand, within what the trade uses for the unit.</summary>
    private static int PowerFor(Decimals number, Unit unit)
    {
        if (number.IsZero || unit == Unit.None || !UnitSigns.TakesPrefix(unit))
        {
            return 0;
        }

        int power = (int)Math.Floor(number.Power / 3.0) * 3;
        return unit switch
        {
            Unit.Ohm when number.Power is -1 or -2 => 0,
            Unit.Farad when number.Power is -13 or -14 => -12,
            Unit.Farad when number.Power is -3 or -2 => -6,
            Unit.Metre when number.Power is >= -5 and <= -1 => -3,
            _ => power,
        };
    }

    /// <summary>A number as figures d.ddd and a power of ten, rounded to so many figures, without trailing zeros.</summary>
    private readonly record struct Decimals(bool Negative, string Figures, int Power)
    {
        public bool IsZero => Figures == "0";

        public static Decimals Of(double value, int figures)
        {
            Guard.InRange(figures, 1, 17, nameof(figures));
            string format = "E" + (figures - 1).ToString(CultureInfo.InvariantCulture);
            string text = Math.Abs(value).ToString(format, CultureInfo.InvariantCulture);
            int mark = text.IndexOf('E', StringComparison.Ordinal);
            string digits = text[..mark].Replace(".", "", StringComparison.Ordinal).TrimEnd('0');
            return digits.Length == 0
                ? new Decimals(false, "0", 0)
                : new Decimals(value < 0, digits, int.Parse(text[(mark + 1)..], CultureInfo.InvariantCulture));
        }

        public string Plain(int scale)
        {
            int before = Power - scale + 1;
            string text = before <= 0
                ? "0." + new string('0', -before) + Figures
                : before >= Figures.Length
                    ? Figures.PadRight(before, '0')
                    : Figures[..before] + "." + Figures[before..];
            return IsZero ? "0" : (Negative ? "-" : "") + text;
        }

        public string Scientific() =>
            (Negative ? "-" : "") + Figures[..1] + (Figures.Length > 1 ? "." + Figures[1..] : "")
            + "e" + Power.ToString(CultureInfo.InvariantCulture);
    }
}
